import { findMeasurement, measurementName } from '../measurements/findMeasurement.ts'
import { mmPerCm, mmPerInch, type Unit } from '../units/unit.ts'
import { bodyColumn, chartCodes, type SizeChart } from './sizeChart.ts'

/**
 * What looks odd in a chart, as sentences: a value that does not grow with the sizes, a missing value, inches read as centimetres.
 * @param unit - the unit it was entered in, for the last of these
 */
export function checkChart(chart: SizeChart, unit: Unit): string[] {
  const notes: string[] = []
  if (chart.length === 1) notes.push('This chart has one size. With two, the plan can say how far you are between them.')
  for (const code of chartCodes(chart)) {
    const column = bodyColumn(chart, code)
    column.slice(1).forEach(({ mm, label }, i) => {
      const before = column[i]!
      if (mm < before.mm) notes.push(`${measurementName(code)} of size ${label} ({mm:${mm}}) is smaller than of size ${before.label} ({mm:${before.mm}}). Check for a swapped figure.`)
    })
    const jump = column.slice(1).map(({ mm }, i) => mm - column[i]!.mm)
    const usual = jump.toSorted((a, b) => a - b)[Math.floor(jump.length / 2)] ?? 0
    const wild = jump.findIndex((step) => usual > 0 && step > usual * 3)
    if (wild >= 0 && jump.length > 2) notes.push(`${measurementName(code)} jumps by {mm:${Math.round(jump[wild]! * 10) / 10}} from size ${column[wild]!.label} to ${column[wild + 1]!.label}, where the sizes usually grow by {mm:${Math.round(usual * 10) / 10}}. Check the figures.`)
  }
  const other = unitSlip(chart, unit)
  return other ? [other, ...notes] : notes
}

/** Every girth far below any adult and child body, and sensible in the other unit: the chart is in that unit. */
function unitSlip(chart: SizeChart, unit: Unit): string | null {
  const girths = chart.flatMap(({ body }) => ['bust', 'chest', 'waist', 'hip'].flatMap((code) => (body[code] ? [{ code, mm: body[code] }] : [])))
  if (!girths.length) return null
  const factor = unit === 'cm' ? mmPerInch / mmPerCm : mmPerCm / mmPerInch
  const slips = girths.every(({ code, mm }) => {
    const range = findMeasurement(code)!.measurement.plausible
    const fits = (value: number) => value > range.leastMm * 0.6 && value < range.mostMm * 1.6
    return !fits(mm) && fits(mm * factor)
  })
  if (!slips) return null
  return unit === 'cm' ? 'These figures look like inches, and were read as centimetres. Switch the unit and paste again.' : 'These figures look like centimetres, and were read as inches. Switch the unit and paste again.'
}
