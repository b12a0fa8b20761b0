import { type lineStyles, type SizeRow } from '../contracts/pattern.ts'

/** One size of a pattern: its printed label and line, the body it is drafted for, the garment's finished measures where given. */
export type { SizeRow }
export type LineStyle = (typeof lineStyles)[number]
/** Smallest size first. */
export type SizeChart = readonly SizeRow[]

export const lineStyleWords: Readonly<Record<LineStyle, string>> = {
  solid: 'solid line', 'long-dash': 'long dashes', 'short-dash': 'short dashes', dotted: 'dots', 'dash-dot': 'dash and dot', 'dash-dot-dot': 'dash and two dots', heavy: 'heavy line', double: 'double line',
}

/** The sizes that have a value for a body measurement, with their place in the chart. */
export function bodyColumn(chart: SizeChart, code: string): { index: number; label: string; mm: number }[] {
  return chart.flatMap((row, index) => (row.body[code] ? [{ index, label: row.label, mm: row.body[code] }] : []))
}

/**
 * How much the sizes grow from one to the next, mm.
 * @returns one number fewer than the sizes that have this measurement; empty for fewer than two
 */
export function gradeSteps(chart: SizeChart, code: string): number[] {
  const column = bodyColumn(chart, code)
  return column.slice(1).map(({ mm }, i) => mm - column[i]!.mm)
}

/** Every body measurement the chart gives for at least one size, in the chart's order. */
export const chartCodes = (chart: SizeChart): string[] => [...new Set(chart.flatMap((row) => Object.keys(row.body)))]
