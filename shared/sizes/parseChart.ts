import { measurementName } from '../measurements/findMeasurement.ts'
import { parseLength } from '../units/parseLength.ts'
import { mmPerInch, type Unit } from '../units/unit.ts'
import { checkChart } from './checkChart.ts'
import { headingUnit, isFinished, isSizeWord, readHeading, type Heading } from './parseChart/readHeading.ts'
import { splitCells, type CellLine } from './parseChart/splitCells.ts'
import { type SizeRow } from './sizeChart.ts'

export type ChartProblem = {
  /** `stop`: something was not read; `note`: read, and worth a look */
  severity: 'stop' | 'note'
  /** pasted line and cell, counted from 1; null where the whole paste is meant */
  row: number | null
  column: number | null
  message: string
}
export type ParsedChart = { chart: SizeRow[]; problems: ChartProblem[]; laidOut: 'sizes across' | 'sizes down' | null }

const mostSizes = 40
const longestLabel = 12

/** One series of values of one measurement, with where each value stood in the paste. */
type Place = { row: number; column: number }
type Series = { heading: Heading; place: Place; values: { text: string; place: Place }[] }

/**
 * Reads a size chart pasted from a spreadsheet, a web page or an e-mail: sizes across or down, tabs, semicolons, commas, bars or spaces;
 * centimetres with point or comma, inches with fractions; headings by code or by any common name, with or without a unit.
 * @param unit - the unit where neither heading nor cell names one
 * @returns every size that could be read, and a sentence with row and column for everything that could not. Nothing is thrown away
 * silently and nothing thrown as an error.
 */
export function parseChart(text: string, unit: Unit): ParsedChart {
  const { lines, delimiter } = splitCells(text)
  const problems: ChartProblem[] = []
  if (!lines.length) return { chart: [], laidOut: null, problems: [stop(null, null, 'There is nothing to read yet. Paste the chart with its headings, or type two sizes.')] }
  const across = lines.filter(({ cells }) => readHeading(cells[0] ?? '')).length
  const headRow = lines.findIndex(({ cells }) => cells.filter((cell) => readHeading(cell)).length > 0 && (isSizeWord(cells[0] ?? '') || !readHeading(cells[0] ?? '') || cells.filter((cell) => readHeading(cell)).length > 1))
  const down = headRow < 0 ? 0 : lines[headRow]!.cells.filter((cell) => readHeading(cell)).length
  if (!across && !down) {
    return { chart: [], laidOut: null, problems: [stop(lines[0]!.line, 1, 'No measurement was recognised. Name the rows or columns bust, waist, hip or back waist length, and paste again.')] }
  }
  const sizesAcross = across >= down
  const { labels, series } = sizesAcross ? readAcross(lines, problems) : readDown(lines, headRow, problems)
  if (delimiter === ',' && lines.some(({ cells }) => cells.length > labels.length + 4)) {
    problems.push(stop(null, null, 'Some lines have more cells than there are sizes. If the commas are decimal marks, separate the columns with tabs or semicolons.'))
  }
  const chart = fill(labels, series, unit, problems)
  return { chart, laidOut: sizesAcross ? 'sizes across' : 'sizes down', problems: [...problems, ...checkChart(chart, unit).map((message): ChartProblem => ({ severity: 'note', row: null, column: null, message }))] }
}

const stop = (row: number | null, column: number | null, message: string): ChartProblem => ({ severity: 'stop', row, column, message })

/** Each line a measurement, each column a size. */
function readAcross(lines: readonly CellLine[], problems: ChartProblem[]): { labels: Label[]; series: Series[] } {
  const widest = Math.max(...lines.map(({ cells }) => cells.length))
  let labels: Label[] | null = null
  let section = { unit: null as Heading['unit'], finished: false }
  const series: Series[] = []
  for (const { line, cells } of lines) {
    const name = cells[0] ?? ''
    const heading = readHeading(name)
    const filled = cells.slice(1).some(Boolean)
    if (heading && filled) {
      const values = cells.slice(1).map((text, i) => ({ text, place: { row: line, column: i + 2 } }))
      series.push({ heading: { ...heading, unit: heading.unit ?? section.unit, finished: heading.finished || section.finished }, place: { row: line, column: 1 }, values })
    } else if (!filled) {
      section = { unit: headingUnit(name) ?? section.unit, finished: isFinished(name) }
    } else if (!labels && !series.length) {
      labels = cells.slice(1).map((text, i) => ({ text, place: { row: line, column: i + 2 } }))
      section = { ...section, unit: headingUnit(name) ?? section.unit }
    } else if (!isSizeWord(name)) {
      problems.push(stop(line, 1, `Row ${line} ("${name}") is no measurement known here and was left out. Rename it, or enter it by hand.`))
    }
  }
  if (!labels) {
    problems.push({ severity: 'note', row: null, column: null, message: 'No row of size labels was found, so the sizes are numbered. Give them the labels printed on the pattern.' })
    labels = Array.from({ length: widest - 1 }, (_, i) => ({ text: String(i + 1), place: { row: lines[0]!.line, column: i + 2 } }))
  }
  return { labels, series }
}
type Label = { text: string; place: Place }

/** Each line a size, each column a measurement. */
function readDown(lines: readonly CellLine[], headRow: number, problems: ChartProblem[]): { labels: Label[]; series: Series[] } {
  const head = lines[headRow]!
  const sizes = lines.slice(headRow + 1)
  const titles = lines.slice(0, headRow).map(({ cells }) => cells.join(' ')).join(' ')
  const labelColumn = Math.max(0, head.cells.findIndex((cell) => !readHeading(cell)))
  const unit = headingUnit(titles) ?? headingUnit(head.cells[labelColumn] ?? '')
  const series = head.cells.flatMap((cell, i): Series[] => {
    if (i === labelColumn) return []
    const heading = readHeading(cell)
    if (!heading) {
      if (cell) problems.push(stop(head.line, i + 1, `Column ${i + 1} ("${cell}") is no measurement known here and was left out. Rename it, or enter it by hand.`))
      return []
    }
    return [{ heading: { ...heading, unit: heading.unit ?? unit }, place: { row: head.line, column: i + 1 }, values: sizes.map(({ line, cells }) => ({ text: cells[i] ?? '', place: { row: line, column: i + 1 } })) }]
  })
  return { labels: sizes.map(({ line, cells }) => ({ text: cells[labelColumn] ?? '', place: { row: line, column: labelColumn + 1 } })), series }
}

function fill(labels: readonly Label[], series: readonly Series[], unit: Unit, problems: ChartProblem[]): SizeRow[] {
  const rows = labels.map(({ text, place }, i) => ({ i, place, row: { label: text.slice(0, longestLabel), body: {} as Record<string, number>, finished: {} as Record<string, number> }, wanted: Boolean(text) }))
  const seen = new Map<string, Place>()
  for (const { i, place, row, wanted } of rows) {
    const twin = seen.get(row.label)
    if (!wanted) {
      const orphan = series.some(({ values }) => values[i]?.text)
      if (orphan) problems.push(stop(place.row, place.column, `Row ${place.row}, column ${place.column}: this size has no label and was left out.`))
    } else if (twin) {
      problems.push(stop(place.row, place.column, `Row ${place.row}, column ${place.column}: size "${row.label}" stands there twice. The first was kept; give the second a label of its own.`))
      rows[i]!.wanted = false
    } else if (labels[i]!.text.length > longestLabel) {
      problems.push({ severity: 'note', row: place.row, column: place.column, message: `Row ${place.row}, column ${place.column}: the label "${labels[i]!.text}" was shortened to "${row.label}".` })
    }
    if (wanted) seen.set(row.label, place)
  }
  for (const one of chooseSeries(series, unit, problems)) fillSeries(one, rows, unit, problems)
  const kept = rows.filter(({ row, wanted }) => wanted && (Object.keys(row.body).length || Object.keys(row.finished).length))
  if (kept.length > mostSizes) problems.push(stop(null, null, `A chart holds ${mostSizes} sizes; the first ${mostSizes} of ${kept.length} were kept.`))
  return kept.slice(0, mostSizes).map(({ row: { label, body, finished } }) => ({ label, body, ...(Object.keys(finished).length && { finished }) }))
}

/** A chart that prints each measurement in inches and centimetres is read once, in the unit asked for. */
function chooseSeries(series: readonly Series[], unit: Unit, problems: ChartProblem[]): Series[] {
  const chosen = new Map<string, Series>()
  for (const one of series) {
    const id = `${one.heading.finished}/${one.heading.code}`
    const before = chosen.get(id)
    if (!before || (before.heading.unit !== one.heading.unit && one.heading.unit === unit)) chosen.set(id, one)
    else if (before.heading.unit === one.heading.unit) problems.push(stop(one.place.row, one.place.column, `Row ${one.place.row}, column ${one.place.column}: ${measurementName(one.heading.code)} stands there twice. The first was kept.`))
  }
  return [...chosen.values()]
}

type FilledRow = { wanted: boolean; row: { label: string; body: Record<string, number>; finished: Record<string, number> } }
function fillSeries({ heading, values }: Series, rows: readonly FilledRow[], unit: Unit, problems: ChartProblem[]): void {
  const anyValue = values.some(({ text }) => text)
  values.forEach(({ text, place }, i) => {
    const target = rows[i]
    const where = `Row ${place.row}, column ${place.column} (${measurementName(heading.code)}${target?.row.label ? `, size ${target.row.label}` : ''})`
    if (/^[-–—./]*$/.test(text)) {
      if (anyValue && target?.wanted) problems.push({ severity: 'note', row: place.row, column: place.column, message: `${where} is empty.` })
      return
    }
    if (!target) return void problems.push(stop(place.row, place.column, `${where} stands under no size. "${text}" was left out.`))
    if (!target.wanted) return
    const read = readCell(text, heading.unit, unit)
    if ('message' in read) return void problems.push(stop(place.row, place.column, `${where}: ${read.message}`))
    if (read.range) problems.push({ severity: 'note', row: place.row, column: place.column, message: `${where}: "${text}" is a range; the middle was taken.` })
    target.row[heading.finished ? 'finished' : 'body'][heading.code] = read.mm
  })
}

function readCell(text: string, headed: Heading['unit'], unit: Unit): { mm: number; range: boolean } | { message: string } {
  const readOne = (cell: string) => parseLength(headed === 'mm' && !/[a-z"″]/i.test(cell) ? `${cell} mm` : cell, headed === 'inch' || headed === 'cm' ? headed : unit)
  // 34–36, but not the 38-1/4 of a dressmaker.
  const range = /^([\d.,]+)\s*(?:-|–|—|to)\s*([\d.,]+)\s*([a-z"″]*)$/i.exec(text)
  if (range && !/\//.test(text)) {
    const [low, high] = [readOne(`${range[1]}${range[3]}`), readOne(`${range[2]}${range[3]}`)]
    if (low.ok && high.ok && low.mm < high.mm) return { mm: (low.mm + high.mm) / 2, range: true }
  }
  const read = readOne(text)
  if (!read.ok) return { message: read.message }
  // lower than any body measure; a shoulder of a child has more than an inch
  return read.mm < mmPerInch ? { message: `${text} is too small for a measurement. Check the number and the unit.` } : { mm: read.mm, range: false }
}
