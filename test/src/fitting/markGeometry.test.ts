import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markKinds } from '#shared/contracts/fitting.ts'
import { distanceToMark, finishPoints, markPaths, moveMark, pinAnchor, type Px, thinStroke, toFractions, toPixels } from '../../../src/composables/fitting/markGeometry.ts'

const fraction = fc.double({ min: 0, max: 1, noNaN: true })
const fractions = fc.array(fc.tuple(fraction, fraction), { minLength: 1, maxLength: 40 })
const pixel = fc.tuple(fc.integer({ min: 0, max: 600 }), fc.integer({ min: 0, max: 800 })) as fc.Arbitrary<Px>

describe('the strokes of a mark', () => {
  it('draws every kind in every shape without a broken number, even with both ends on one spot', () => {
    for (const kind of markKinds) for (const shape of ['stroke', 'point', 'area'] as const) for (const points of [[[10, 10]], [[10, 10], [10, 10]], [[10, 10], [90, 40], [30, 70]]] as Px[][]) {
      const { solid, dashed } = markPaths(kind, shape, points)
      expect(solid).toMatch(/^M/)
      expect(solid + dashed).not.toMatch(/NaN|Infinity/)
    }
  })
  it('gives each kind its own drawing', () => {
    const drawn = markKinds.map((kind) => JSON.stringify(markPaths(kind, 'stroke', [[100, 100], [160, 220]])))
    expect(new Set(drawn).size).toBe(markKinds.length)
  })
  it('hangs the plumb line straight below the pivot', () => expect(markPaths('balance', 'stroke', [[50, 20], [80, 120]]).dashed).toMatch(/^M50 20L50 /))
  it('points the drag line at its last point', () => expect(markPaths('drag-line', 'stroke', [[0, 0], [100, 0]]).solid).toContain('L100 0L'))
  it('closes an area', () => expect(markPaths('excess', 'area', [[0, 0], [50, 0], [50, 50]]).solid).toMatch(/Z$/))
  it('sets the pin beside the mark, not on its far end', () => {
    const [x] = pinAnchor('drag-line', 'stroke', [[100, 100], [200, 100]])
    expect(x).toBeLessThan(100)
  })
})

describe('points as fractions', () => {
  it('come back as they were at any picture size, to a third of a pixel', () => {
    fc.assert(fc.property(fractions, fc.integer({ min: 200, max: 2560 }), (points, width) => {
      const size = { width, height: width * 1.25 }
      const back = toFractions(toPixels(points, size), size)
      back.forEach(([x, y], i) => {
        expect(Math.abs(x - points[i]![0])).toBeLessThanOrEqual(0.00006)
        expect(Math.abs(y - points[i]![1])).toBeLessThanOrEqual(0.00006)
      })
    }))
  })
  it('never leave the picture, however far the finger goes', () => expect(toFractions([[-40, 900]], { width: 100, height: 100 })).toEqual([[0, 1]]))
  it('keep a mark whole when it is moved against the edge', () => {
    expect(moveMark([[0.1, 0.1], [0.3, 0.2]], [-0.5, 0.05])).toEqual([[0, 0.15], [0.2, 0.25]])
    fc.assert(fc.property(fractions, fraction, fraction, (points, dx, dy) => {
      for (const [x, y] of moveMark(points, [dx - 0.5, dy - 0.5])) expect(x >= 0 && x <= 1 && y >= 0 && y <= 1).toBe(true)
    }))
  })
})

describe('a stroke drawn by hand', () => {
  it('is thinned to its ends where it is straight', () => expect(thinStroke([[0, 0], [10, 1], [20, 0], [30, -1], [40, 0]], 3)).toEqual([[0, 0], [40, 0]]))
  it('keeps its ends and stays within the tolerance', () => {
    fc.assert(fc.property(fc.array(pixel, { minLength: 2, maxLength: 60 }), (points) => {
      const thin = thinStroke(points, 6)
      expect(thin[0]).toEqual(points[0])
      expect(thin.at(-1)).toEqual(points.at(-1))
      for (const p of points) expect(distanceToMark(p, 'stroke', thin)).toBeLessThanOrEqual(6 + 1e-6)
    }))
  })
  it('keeps only two ends for a kind that has no run of its own', () => expect(finishPoints('gape', 'stroke', [[0, 0], [5, 20], [0, 40]])).toEqual([[0, 0], [0, 40]]))
  it('keeps one spot for a point', () => expect(finishPoints('place', 'point', [[3, 4], [9, 9]])).toEqual([[3, 4]]))
})
