import fc from 'fast-check'
import { effectScope } from 'vue'
import { describe, expect, it } from 'vitest'
import { fitSize, heldView, useBoardView, zoomedAt } from '../../../src/composables/fitting/useBoardView.ts'

const size = fc.record({ width: fc.integer({ min: 100, max: 3000 }), height: fc.integer({ min: 100, max: 3000 }) })
const open = () => effectScope().run(() => useBoardView({ width: 900, height: 1200 }, { width: 300, height: 400 }))!

describe('zoom and pan', () => {
  it('fits any picture into any board in its own proportion', () => {
    fc.assert(fc.property(size, size, (picture, board) => {
      const fit = fitSize(picture, board)
      expect(fit.width).toBeLessThanOrEqual(board.width + 1e-6)
      expect(fit.height).toBeLessThanOrEqual(board.height + 1e-6)
      expect(fit.width / fit.height).toBeCloseTo(picture.width / picture.height, 6)
    }))
  })
  it('keeps the spot under the finger while zooming', () => {
    const before = { scale: 1.5, x: -40, y: -60 }
    const after = zoomedAt(before, [120, 200], 2)
    expect((120 - after.x) / after.scale).toBeCloseTo((120 - before.x) / before.scale)
    expect((200 - after.y) / after.scale).toBeCloseTo((200 - before.y) / before.scale)
  })
  it('never leaves the board empty at an edge', () => {
    fc.assert(fc.property(fc.double({ min: 0.1, max: 20, noNaN: true }), fc.integer({ min: -9999, max: 9999 }), fc.integer({ min: -9999, max: 9999 }), (scale, x, y) => {
      const held = heldView({ scale, x, y }, { width: 300, height: 400 }, { width: 300, height: 400 })
      expect(held.scale).toBeGreaterThanOrEqual(1)
      expect(held.scale).toBeLessThanOrEqual(8)
      expect(held.x).toBeLessThanOrEqual(0)
      expect(held.x + 300 * held.scale).toBeGreaterThanOrEqual(300 - 1e-6)
    }))
  })
  it('turns spots of the board into spots of the picture and back', () => {
    const { zoom, pan, toBoard, toPicture } = open()
    zoom(3, [100, 100])
    pan(-20, 14)
    const [x, y] = toBoard(toPicture([77, 88]))
    expect([x, y]).toEqual([expect.closeTo(77), expect.closeTo(88)])
  })
  it('brings a pin that is outside into view', () => {
    const { zoom, show, toBoard } = open()
    zoom(4, [0, 0])
    show([290, 390])
    const [x, y] = toBoard([290, 390])
    expect(x).toBeLessThanOrEqual(300)
    expect(y).toBeLessThanOrEqual(400)
  })
})
