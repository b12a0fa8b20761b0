import { type Body } from '../fit/types.ts'
import { findMeasurement } from './findMeasurement.ts'

/** A change larger than this since the last set is asked about. */
export const movedLimitMm = 30

/** Whether a value moved more than 30 mm since the last set. */
export const movedMuch = (beforeMm: number, nowMm: number): boolean => Math.abs(nowMm - beforeMm) > movedLimitMm + 1e-6

export type EntryQuestion = { code: string; kind: 'moved' | 'unusual' | 'order'; text: string }

/** Pairs where the first is not larger than the second on an adult body, apart from the noise of a tape. */
const order: readonly (readonly [string, string, string])[] = [
  ['underbust', 'bust', 'The underbust is larger than the full bust. Check that both tapes were level.'],
  ['high-bust', 'bust', 'The high bust is larger than the full bust. That can be so; check the tape, which is easily pulled low at the back.'],
  ['wrist', 'upper-arm', 'The wrist is larger than the upper arm. Check which is which.'],
  ['knee', 'thigh', 'The knee is larger than the thigh. Check which is which.'],
  ['ankle', 'calf', 'The ankle is larger than the calf. Check which is which.'],
  ['inside-leg', 'outside-leg', 'The inseam is longer than the side length. Check which is which.'],
  ['bust-depth', 'front-waist-length', 'The bust point lies below the waist. Check the bust depth.'],
]
const noiseMm = 5

/**
 * What to ask back about a set as it is typed. Nothing is refused: bodies differ, slips of the keyboard are what these catch.
 * @param adult - the survey ranges say nothing about children
 */
export function checkEntries(now: Body, before: Body = {}, { adult = true } = {}): EntryQuestion[] {
  const questions: EntryQuestion[] = []
  for (const [code, mm] of Object.entries(now)) {
    const earlier = before[code]
    if (earlier !== undefined && movedMuch(earlier, mm)) {
      const moved = Math.round((mm - earlier) * 10) / 10
      questions.push({ code, kind: 'moved', text: `This moved {+mm:${moved}} since the last set. Measured again, or typed by mistake?` })
    }
    const range = findMeasurement(code)?.measurement.plausible
    if (adult && range && (mm < range.leastMm || mm > range.mostMm)) {
      const wide = range.women || range.men ? `Nine in ten adults surveyed lie between {mm:${range.leastMm}} and {mm:${range.mostMm}}` : `Most adults lie between {mm:${range.leastMm}} and {mm:${range.mostMm}}`
      questions.push({ code, kind: 'unusual', text: `${wide}. Check the number and the unit; keep it if the tape says so.` })
    }
  }
  for (const [smaller, larger, text] of order) {
    const [a, b] = [now[smaller], now[larger]]
    if (a !== undefined && b !== undefined && a > b + noiseMm) questions.push({ code: smaller, kind: 'order', text })
  }
  return questions
}
