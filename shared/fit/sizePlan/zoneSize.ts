import { negativeEaseLimitPercent, wearingShare } from '../../sizes/knitStretch.ts'
import { minimumEaseMm } from '../../sizes/wearingEase.ts'
import { tidyMm } from '../../units/unit.ts'
import { isKnit, levelWord } from './garmentZones.ts'
import { type Column } from './nearestSize.ts'
import { type PlanInput, type ZoneSize } from './types.ts'

/** A difference smaller than this is the noise of a tape. Our own limit. */
export const noiseMm = 5

/**
 * Least ease at a place, mm: of woven cloth by the table; of a knit as negative as half of what its stretch could span, 0 where the
 * stretch is not known. Null where nothing is known about the place.
 */
export function leastEaseMm(input: PlanInput, code: string, bodyMm: number): number | null {
  const woven = minimumEaseMm(code, input.garment.kind, input.body)
  if (woven === null || !isKnit(input)) return woven
  const stretch = input.options.stretchPercent ?? 0
  return tidyMm(-Math.round((bodyMm * negativeEaseLimitPercent(stretch) * wearingShare.top[1]) / 100)) || 0
}

/** What cutting a size would mean at a zone, for a body of `bodyMm` whose front gains `addedMm`. */
export function zoneSize(input: PlanInput, code: string, one: Column[number], bodyMm: number, leadMm: number, addedMm = 0): ZoneSize {
  const row = input.chart[one.index]!
  const finishedMm = row.finished?.[code] ?? null
  const drafted = row.body[code] ?? null
  const easeMm = finishedMm === null ? null : tidyMm(finishedMm + addedMm - bodyMm)
  const designEaseMm = finishedMm === null || drafted === null ? null : tidyMm(finishedMm - drafted)
  const least = leastEaseMm(input, code, bodyMm)
  const bodyOverMm = tidyMm(leadMm - one.mm)
  const size: ZoneSize = {
    size: one.label, index: one.index, chartMm: one.mm, bodyOverMm, finishedMm, easeMm, designEaseMm,
    enough: easeMm === null || least === null ? null : easeMm >= least - 0.5, toChange: '',
  }
  return { ...size, toChange: changeText(size, levelWord(code)) }
}

/** What to do to the paper of this size so that it has the ease the pattern means. */
function changeText({ size, easeMm, bodyOverMm }: ZoneSize, level: string): string {
  const leaves = easeMm === null ? '' : easeMm < 0 ? `It is {mm:${-easeMm}} smaller than the body. ` : `It leaves {mm:${easeMm}} of ease. `
  if (Math.abs(bodyOverMm) < noiseMm) return `${leaves}Size ${size} fits the ${level} as it is drafted.`
  return bodyOverMm > 0
    ? `${leaves}Size ${size} is drafted {mm:${bodyOverMm}} smaller at the ${level}: let that much out for the ease the pattern means.`
    : `${leaves}Size ${size} is drafted {mm:${-bodyOverMm}} larger at the ${level}: take that much in for the ease the pattern means.`
}
