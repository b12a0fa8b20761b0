import { type PieceRole } from '../types.ts'
import { levelWord, pieceLevels } from './garmentZones.ts'
import { type PlanInput, type SizePlan, type ZonePlan } from './types.ts'

type Level = Pick<ZonePlan, 'code' | 'size' | 'index'>

/** Neighbouring levels of one size joined. */
export function sizeRuns(levels: readonly Level[]): { size: string; index: number; from: string }[] {
  return levels.filter((level, i) => i === 0 || level.index !== levels[i - 1]!.index).map(({ size, index, code }) => ({ size, index, from: code }))
}

/** "14", "14→16 from waist to hip", "12→14→16 from bust over waist to hip". Empty without a level. */
export function runningLabel(levels: readonly Level[]): string {
  const runs = sizeRuns(levels)
  const sizes = runs.map(({ size }) => size).join('→')
  if (runs.length < 2) return sizes
  const firstChange = levels.findIndex(({ code }) => code === runs[1]!.from)
  const over = runs.slice(1, -1).map(({ from }) => levelWord(from))
  return `${sizes} from ${[levelWord(levels[firstChange - 1]!.code), ...over].join(' over ')} to ${levelWord(runs.at(-1)!.from)}`
}

/** The size label of every piece a garment of this kind may have. */
export function pieceLabels(input: PlanInput, zones: readonly ZonePlan[]): SizePlan['pieceLabels'] {
  const lead = zones.find(({ governing }) => governing) ?? zones[0]
  const labels: Partial<Record<PieceRole, string>> = {}
  for (const { roles, levels } of pieceLevels(input)) {
    const known = levels.flatMap((code) => zones.find((zone) => zone.code === code) ?? [])
    const label = runningLabel(known.length ? known : lead ? [lead] : [])
    for (const role of roles) if (label && !labels[role]) labels[role] = label
  }
  return labels
}
