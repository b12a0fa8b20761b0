import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Px } from '../../../src/composables/fitting/markGeometry.ts'
import { fanOut } from '../../../src/composables/fitting/pinLayout.ts'

describe('pins that are too close', () => {
  it('leaves free pins where they are', () => expect(fanOut([[0, 0], [100, 0]], 44)).toEqual([[0, 0], [0, 0]]))
  it('sets two pins on one spot a touch apart', () => {
    const [a, b] = fanOut([[50, 50], [50, 50]], 44) as [Px, Px]
    expect(Math.hypot(a[0] - b[0], a[1] - b[1])).toBeCloseTo(44)
  })
  it('sets every pin of one cluster at least that far from its cluster mates', () => {
    fc.assert(fc.property(fc.integer({ min: 2, max: 12 }), (n) => {
      const anchors: Px[] = Array.from({ length: n }, (_, i) => [200 + i, 200 - i])
      const placed = fanOut(anchors, 44).map(([dx, dy], i): Px => [anchors[i]![0] + dx, anchors[i]![1] + dy])
      placed.forEach((p, i) => placed.slice(i + 1).forEach((q) => expect(Math.hypot(p[0] - q[0], p[1] - q[1])).toBeGreaterThanOrEqual(43.9)))
    }))
  })
})
