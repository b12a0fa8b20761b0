import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'
import { finished } from 'node:stream/promises'
import { type Writable } from 'node:stream'
import PDFDocument from 'pdfkit'
import { type Unit } from '#shared/contracts/common.ts'
import { cautionsFor } from '#shared/cutting/cautions.ts'
import { shrinkageOf } from '#shared/cutting/testSquare.ts'
import { fillAmounts } from '#shared/fit/amountText.ts'
import { formatLength } from '#shared/units/formatLength.ts'
import { type CuttingSheetFacts } from './cuttingSheetFacts.ts'

const fonts = join(dirname(createRequire(import.meta.url).resolve('@fontsource/work-sans/package.json')), 'files')
const regular = join(fonts, 'work-sans-latin-400-normal.woff')
const bold = join(fonts, 'work-sans-latin-600-normal.woff')

const ptPerMm = 72 / 25.4
const margin = 14 * ptPerMm
const grey = '#555555'

/**
 * Writes the cutting sheet as PDF, black on white, a test square at true size on the first page; the stream is ended.
 * @param out - where the pages go while they are made
 */
export async function writeCuttingSheet(facts: CuttingSheetFacts, { paper, units }: { paper: 'a4' | 'letter'; units: Unit }, out: Writable): Promise<void> {
  const pdf = new PDFDocument({ size: paper === 'a4' ? 'A4' : 'LETTER', margin, info: { Title: `${facts.project.name}, cutting sheet`, Creator: 'Proofcloth' }, lang: 'en', bufferPages: true })
  const done = finished(pdf.pipe(out))
  pdf.registerFont('regular', regular).registerFont('bold', bold)
  const sheet = new Sheet(pdf, units)
  sheet.head(facts)
  sheet.facts(facts)
  sheet.testSquare()
  sheet.pieces(facts)
  sheet.beforeTheScissors(facts)
  sheet.feet(facts.project.name)
  pdf.end()
  await done
}

/** Draws the parts one below the other; all places in PDF points. */
class Sheet {
  private readonly left = margin
  private readonly right: number
  private readonly foot: number
  constructor(private readonly pdf: PDFKit.PDFDocument, private readonly unit: Unit) {
    this.right = pdf.page.width - margin
    this.foot = pdf.page.height - margin - 24
  }
  private get width() { return this.right - this.left }
  private length(mm: number, signed = false) { return plain(formatLength(mm, this.unit, { signed })) }
  private fill(text: string) { return plain(fillAmounts(text, (mm, signed) => this.length(mm, signed))) }
  private rule(y: number, width: number, dotted = false) {
    if (dotted) this.pdf.dash(1, { space: 2 })
    this.pdf.lineWidth(width).moveTo(this.left, y).lineTo(this.right, y).stroke('#000000').undash()
  }
  private title(text: string) {
    this.roomFor(40)
    this.pdf.moveDown(0.9).font('bold').fontSize(11.5).fillColor('#000000').text(text, this.left).moveDown(0.25)
  }
  private roomFor(height: number) {
    if (this.pdf.y + height > this.foot) this.pdf.addPage()
  }
  private box(x: number, y: number, ticked = false) {
    this.pdf.lineWidth(0.8).rect(x, y, 9, 9).stroke('#000000')
    if (ticked) this.pdf.lineWidth(1.3).moveTo(x + 1.8, y + 4.8).lineTo(x + 3.9, y + 7).lineTo(x + 7.6, y + 1.8).stroke('#000000')
  }

  head({ project, madeOn }: CuttingSheetFacts) {
    this.pdf.font('bold').fontSize(20).text(plain(project.name), this.left, margin, { width: this.width - 90 })
    const sample = project.samples.at(-1)
    const day = madeOn.toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric' })
    this.pdf.font('regular').fontSize(10).fillColor('#000000').text(plain(`for ${project.wearer.name}${sample ? ` · after sample ${sample.number}` : ''} · ${day}`))
    this.pdf.font('bold').fontSize(11).text('Proofcloth', this.right - 80, margin + 4, { width: 80, align: 'right' })
    this.pdf.x = this.left
    this.pdf.y = margin + 48
    this.rule(this.pdf.y, 1.4)
  }

  facts({ pieces, finalCut: { cloth } }: CuttingSheetFacts) {
    const y = this.pdf.y + 8
    const sizes = [...new Set(pieces.map(({ sizeLabel }) => sizeLabel).filter(Boolean))].join(', ')
    const allowances = [...new Set(pieces.map(({ allowanceMm }) => (allowanceMm ? this.length(allowanceMm) : 'net')))].join(', ')
    const about = [cloth.name, cloth.widthMm && `${this.length(cloth.widthMm)} wide`, cloth.lengthMm && this.length(cloth.lengthMm)].filter(Boolean).join(', ')
    const columns = [['Size', sizes || 'not kept yet'], ['Cloth', about || 'not described'], ['Lay', [cloth.oneWay ? 'one way' : 'either way', cloth.matching && 'matched'].filter(Boolean).join(', ')], ['Allowances', allowances || 'none']]
    const width = this.width / columns.length
    let bottom = y
    columns.forEach(([name, value], i) => {
      this.pdf.font('regular').fontSize(9).fillColor(grey).text(name!, this.left + i * width, y, { width: width - 10 })
      this.pdf.font('bold').fontSize(10).fillColor('#000000').text(plain(value!), { width: width - 10 })
      bottom = Math.max(bottom, this.pdf.y)
    })
    this.pdf.x = this.left
    this.pdf.y = bottom + 6
    this.rule(this.pdf.y, 0.8)
  }

  testSquare() {
    const mm = this.unit === 'inch' ? 50.8 : 50
    const side = mm * ptPerMm
    const y = this.pdf.y + 14
    this.pdf.lineWidth(1).rect(this.left, y, side, side).stroke('#000000')
    this.pdf.font('regular').fontSize(9.5).text(plain(`Test square\nMeasure me: ${this.length(mm)} each way`), this.left + 8, y + side / 2 - 14, { width: side - 16, align: 'center' })
    this.pdf.font('regular').fontSize(9.5).text('Print at actual size, 100 %. If the square is not true, print again without scaling. Measure it before the first cut.', this.left + side + 16, y + 4, { width: this.width - side - 16 })
    this.pdf.x = this.left
    this.pdf.y = y + side
  }

  pieces({ pieces }: CuttingSheetFacts) {
    this.title('Pieces')
    const columns = [{ text: '', at: 0, width: 16 }, { text: 'Piece', at: 18, width: 120 }, { text: 'Size', at: 142, width: 76 }, { text: 'Cut', at: 222, width: 56 }, { text: 'Grain', at: 282, width: 62 }, { text: 'Changed since the paper', at: 348, width: this.width - 348 }]
    const row = (cells: readonly string[], font: string, tick: boolean) => {
      this.pdf.font(font).fontSize(9.5)
      const height = Math.max(...cells.map((cell, i) => this.pdf.heightOfString(cell || ' ', { width: columns[i]!.width }))) + 7
      this.roomFor(height)
      const y = this.pdf.y + 3
      if (tick) this.box(this.left, y + 1)
      cells.forEach((cell, i) => { this.pdf.font(i === 1 ? 'bold' : font).fillColor('#000000').text(cell, this.left + columns[i]!.at, y, { width: columns[i]!.width }) })
      this.pdf.x = this.left
      this.pdf.y = y + height - 4
      this.rule(this.pdf.y, tick ? 0.5 : 0.9, tick)
    }
    row(columns.map(({ text }) => text), 'regular', false)
    for (const piece of pieces) {
      const changes = piece.changes.map(({ title, amountMm, transferred }) => `${title}${amountMm ? ` ${this.length(amountMm, true)}` : ''}${transferred ? '' : ' (not drawn)'}`).join('; ')
      row(['', `${piece.number} ${plain(piece.name)}`, plain(piece.sizeLabel), `${piece.cutCount}${piece.onFold ? ' on fold' : ''}`, piece.marks.grainline === 'marked' ? (piece.onFold ? 'along fold' : 'along') : 'draw by hand', plain(changes) || 'As paper'], 'regular', true)
    }
  }

  beforeTheScissors({ project, finalCut }: CuttingSheetFacts) {
    this.title('Before the scissors')
    const shrinkage = shrinkageOf(finalCut.shrinkage)
    const lines = [
      ...finalCut.items.filter(({ group }) => group === 'cloth').map(({ title, ticked }) => ({ title, ticked })),
      ...cautionsFor(project.garment, 'layout').slice(0, 3).map(({ text }) => ({ title: text, ticked: false })),
    ]
    for (const { title, ticked } of lines) {
      this.pdf.font('regular').fontSize(9.5)
      this.roomFor(this.pdf.heightOfString(title, { width: this.width - 18 }) + 4)
      const { y } = this.pdf
      this.box(this.left, y + 1, ticked)
      this.pdf.fillColor('#000000').text(plain(title), this.left + 18, y, { width: this.width - 18 })
      this.pdf.x = this.left
      this.pdf.y += 4
    }
    const said = [shrinkage ? this.fill(shrinkage.text) : '', finalCut.note].filter(Boolean)
    if (said.length) {
      this.title('Notes')
      this.pdf.font('regular').fontSize(9.5).text(plain(said.join('\n')), { width: this.width })
    }
    this.title('Mind this')
    const cautions = [...cautionsFor(project.garment, 'children'), ...cautionsFor(project.garment, 'cutting'), ...cautionsFor(project.garment, 'pressing')]
    for (const { text } of cautions) {
      this.pdf.font('regular').fontSize(8.5)
      this.roomFor(this.pdf.heightOfString(text, { width: this.width }) + 3)
      this.pdf.fillColor('#222222').text(plain(text), this.left, this.pdf.y, { width: this.width })
      this.pdf.y += 2
    }
  }

  /** Page numbers, when it is known how many there are. */
  feet(name: string) {
    const { start, count } = this.pdf.bufferedPageRange()
    for (let page = start; page < start + count; page++) {
      this.pdf.switchToPage(page)
      const y = this.pdf.page.height - margin - 10
      // Below the margin, where a line of text would otherwise begin a new page.
      this.pdf.page.margins.bottom = 0
      this.rule(y - 6, 0.5, true)
      this.pdf.font('regular').fontSize(8.5).fillColor(grey).text(plain(`${name}, cutting sheet`), this.left, y, { lineBreak: false })
      this.pdf.text(`Page ${page + 1} of ${count}`, this.right - 80, y, { width: 80, align: 'right', lineBreak: false })
    }
  }
}

/** The font file holds Latin letters; what it does not know would print as an empty box. */
const plain = (text: string): string => text.replaceAll('\u00a0', ' ').replaceAll('−', '-').replaceAll('→', ' to ')
