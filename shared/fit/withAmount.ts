import { splitAmount } from '../units/splitAmount.ts'
import { type ChangeStep, type PaperChange, type PieceRole } from './types.ts'

/** The tokens of a step's text that stand for its own amount and for the whole, written anew. */
const retell = (text: string, from: ChangeStep, toMm: number, wholeFrom: number, wholeTo: number): string =>
  text.replace(/\{(\+?)mm:(-?\d+(?:\.\d+)?)\}/g, (token, sign: string, mm: string) => {
    const value = Number(mm)
    if (Math.abs(value) === Math.abs(from.amountMm)) return `{${sign}mm:${Math.sign(value) * Math.abs(toMm)}}`
    if (Math.abs(value) === Math.abs(wholeFrom)) return `{${sign}mm:${Math.sign(value) * Math.abs(wholeTo)}}`
    if (Math.abs(value) === Math.abs(wholeFrom) / 2) return `{${sign}mm:${Math.sign(value) * Math.abs(wholeTo) / 2}}`
    return token
  })

/**
 * The same change with another whole amount: every step keeps its share, in whole steps of the tape, and steps that added up to the
 * whole add up to the new whole.
 * @param wholeMm - signed as the change is; a turned sign turns every step
 * @param keep - piece roles that stay in the change; left out: all of them
 * @param stepMm - what is drawn, 1 mm or 1/16 in
 */
export function withAmount(change: PaperChange, wholeMm: number, { keep, stepMm = 1 }: { keep?: readonly PieceRole[]; stepMm?: number } = {}): PaperChange {
  const factor = change.amountMm === 0 ? 0 : wholeMm / change.amountMm
  const moving = change.steps.filter(({ amountMm }) => amountMm !== 0)
  const edgeSum = (steps: readonly ChangeStep[]) => steps.reduce((sum, { amountMm, edges }) => sum + Math.abs(amountMm) * edges, 0)
  // Widths are divided over edges and add up to the whole; lengths stand whole on every piece and do not.
  const isDivided = moving.length > 0 && Math.abs(edgeSum(moving) - Math.abs(change.amountMm)) < 0.5
  const divided = isDivided ? divideOver(moving, wholeMm, factor, stepMm) : new Map<ChangeStep, number>()
  const scaled = (mm: number) => Math.round((mm * factor) / stepMm) * stepMm || 0
  const steps = change.steps.map((step) => {
    const amountMm = divided.get(step) ?? scaled(step.amountMm)
    return { ...step, amountMm, text: retell(step.text, step, amountMm, change.amountMm, wholeMm) }
  })
  const kept = keep ? steps.filter(({ pieceRole }) => keep.includes(pieceRole)) : steps
  return {
    ...change, amountMm: wholeMm, steps: kept,
    companions: change.companions
      .filter(({ pieceRole }) => !keep || keep.includes(pieceRole))
      .map((one) => (one.amountMm === undefined ? one : { ...one, amountMm: scaled(one.amountMm), text: one.text.replaceAll(`mm:${one.amountMm}}`, `mm:${scaled(one.amountMm)}}`) })),
  }
}

/** Shares the whole over the steps by what each edge took before; a step whose edges cannot all be alike takes the nearest that keeps the sum. */
function divideOver(steps: readonly ChangeStep[], wholeMm: number, factor: number, stepMm: number): Map<ChangeStep, number> {
  const parts = splitAmount(Math.abs(wholeMm), steps.map(({ amountMm, edges }) => Math.abs(amountMm) * edges), stepMm)
  return new Map(steps.map((step, i) => [step, (Math.sign(step.amountMm) * Math.sign(factor) * parts[i]!) / step.edges]))
}
