import { bodyValue, measurementName } from '../../measurements/findMeasurement.ts'
import { crotchDepthEaseMm } from '../../sizes/wearingEase.ts'
import { tidyMm } from '../../units/unit.ts'
import { lengthsOf } from './garmentZones.ts'
import { type LengthPlan, type PlanInput, type ZonePlan } from './types.ts'
import { noiseMm } from './zoneSize.ts'

/**
 * What to lengthen or shorten on the paper before any blend is drawn. Each length is compared with the size cut at its level; a rise
 * the pattern gives only finished is compared with the body and its ease.
 */
export function lengthPlans(input: PlanInput, zones: readonly ZonePlan[]): LengthPlan[] {
  return lengthsOf(input).flatMap(({ code, zone }) => {
    const bodyMm = bodyValue(input.body, code)
    const level = zones.find((one) => one.code === zone) ?? zones.find(({ governing }) => governing)
    if (bodyMm === null || !level) return []
    const row = input.chart[level.index]!
    const ease = code === 'crotch-depth' ? crotchDepthEaseMm(input.body.hip ?? 940) : 0
    const chartMm = row.body[code] ?? (code === 'crotch-depth' && row.finished?.[code] ? tidyMm(row.finished[code] - ease) : undefined)
    if (chartMm === undefined) return []
    const amountMm = tidyMm(bodyMm - chartMm)
    const leave = Math.abs(amountMm) < noiseMm
    return [{ code, name: measurementName(code), bodyMm, chartMm, size: level.size, amountMm, leave, text: lengthText(measurementName(code), amountMm, leave, level.size) }]
  })
}

function lengthText(name: string, amountMm: number, leave: boolean, size: string): string {
  if (Math.abs(amountMm) < 0.05) return `${name} is that of size ${size}.`
  const compared = `${name} is {mm:${Math.abs(amountMm)}} ${amountMm < 0 ? 'shorter' : 'longer'} than size ${size}.`
  if (leave) return `${compared} Leave it.`
  return `${compared} ${amountMm < 0 ? 'Fold it out' : 'Spread it'} at the lengthen line before tracing, or wait for the first sample to show it.`
}
