import { describe, expect, it } from 'vitest'
import { rules } from '#shared/fit/catalogue.ts'
import { operations, pieceRoles } from '#shared/fit/types.ts'
import { pieceShapes } from '../../../src/components/figure/pieceShapes.ts'
import { drawnLength, edgeOf, redrawPiece } from '../../../src/components/figure/redrawPiece.ts'
import { figureOf, marksOn } from '../../../src/components/figure/ruleDrawings.ts'

const corners = (path: string) => path.slice(1, -1).split('L').map((p) => p.split(' ').map(Number) as [number, number])
const xs = (path: string) => corners(path).map(([x]) => x)
const ys = (path: string) => corners(path).map(([, y]) => y)

describe('plain pieces', () => {
  it('are closed runs: every edge begins where the one before ended', () => {
    for (const role of pieceRoles) {
      const { edges } = pieceShapes[role]
      edges.forEach((edge, i) => expect(edge.points[0], `${role}, ${edge.name}`).toEqual(edges.at(i - 1)!.points.at(-1)))
    }
  })
  it('are redrawn by every operation without a broken number', () => {
    for (const role of pieceRoles) for (const operation of operations) for (const amountMm of [12, -12]) {
      const drawn = redrawPiece(pieceShapes[role], operation, { edge: 'side seam', amountMm, taper: 'to nothing at the waist' })
      expect(JSON.stringify(drawn), `${role} ${operation}`).not.toMatch(/null|NaN/)
    }
  })
})

describe('old line and new line', () => {
  it('move only what lies below the line that is lengthened', () => {
    const { old, next } = redrawPiece(pieceShapes['skirt-front'], 'lengthen', { edge: 'lengthen line', amountMm: 20 })
    expect(Math.min(...ys(next))).toBe(Math.min(...ys(old)))
    expect(Math.max(...ys(next))).toBeCloseTo(Math.max(...ys(old)) + drawnLength(20), 0)
    expect(Math.max(...xs(next))).toBe(Math.max(...xs(old)))
  })
  it('let a side seam out to the outside and to nothing where it tapers', () => {
    const { old, next } = redrawPiece(pieceShapes['skirt-back'], 'seam-shift', { edge: 'side seam', amountMm: 10, taper: 'to nothing at the waist' })
    expect(Math.max(...xs(next))).toBeGreaterThan(Math.max(...xs(old)) + 5)
    expect(next.split('L')[16]).toBe(old.split('L')[16]) // the corner at the waist stays
  })
  it('lower the top edge at the centre back and leave the side seam', () => {
    const { old, next } = redrawPiece(pieceShapes['skirt-back'], 'seam-shift', { edge: 'top edge at the centre back', amountMm: -16, taper: 'to nothing at the side seam' })
    expect(corners(next)[0]![1]).toBeGreaterThan(corners(old)[0]![1])
    expect(Math.min(...ys(next))).toBe(Math.min(...ys(old)))
  })
  it('take cloth away where the amount is below zero', () => {
    const grown = redrawPiece(pieceShapes['bodice-front'], 'full-bust', { edge: 'bust line', amountMm: 25 })
    const shrunk = redrawPiece(pieceShapes['bodice-front'], 'full-bust', { edge: 'bust line', amountMm: -25 })
    expect(Math.max(...xs(grown.next))).toBeGreaterThan(Math.max(...xs(grown.old)))
    expect(Math.max(...xs(shrunk.next))).toBeLessThan(Math.max(...xs(shrunk.old)))
  })
  it('show even three millimetres and keep ten centimetres on the sheet', () => {
    expect(drawnLength(3)).toBeGreaterThanOrEqual(9)
    expect(drawnLength(100)).toBeLessThanOrEqual(34)
    expect(drawnLength(-3)).toBe(-drawnLength(3))
  })
})

describe('the words of an edge', () => {
  it('mean the edge named first', () => {
    expect(edgeOf(pieceShapes['skirt-back'], 'top edge at the centre back')).toBe('waist')
    expect(edgeOf(pieceShapes['bodice-back'], 'centre back at the waist')).toBe('centre back')
    expect(edgeOf(pieceShapes['trouser-back'], 'crotch curve')).toBe('crotch curve')
  })
  it('mean none where a line inside the piece is named', () => expect(edgeOf(pieceShapes['bodice-front'], 'bust line')).toBeNull())
})

describe('drawings that come with the rules', () => {
  it('lie on the sheet, sign and change alike', () => {
    for (const { cause, drawing } of rules) {
      const { strokes, box } = figureOf(drawing.sign)
      expect(strokes.length, cause).toBeGreaterThan(0)
      expect(box.split(' ').map(Number).every((n) => n >= 0 && n <= 400), cause).toBe(true)
      for (const { from, to } of marksOn(pieceShapes[drawing.change.piece], drawing.change)) expect([...from, ...to].every(Number.isFinite), cause).toBe(true)
    }
  })
})
