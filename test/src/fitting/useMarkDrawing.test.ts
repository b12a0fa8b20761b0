import { ref } from 'vue'
import { describe, expect, it } from 'vitest'
import { type FinishedMark, type MarkTool, useMarkDrawing } from '../../../src/composables/fitting/useMarkDrawing.ts'

function board(tool: MarkTool) {
  const marks: FinishedMark[] = []
  const chosen = ref<MarkTool | null>(tool)
  return { marks, ...useMarkDrawing(chosen, (mark) => marks.push(mark)) }
}
const gape: MarkTool = { kind: 'gape', shape: 'stroke' }

describe('putting a mark on', () => {
  it('is one drag from end to end', () => {
    const { marks, press, move, release } = board(gape)
    press([10, 10]); move([[20, 40]]); move([[30, 80]]); release([30, 80])
    expect(marks).toEqual([{ kind: 'gape', shape: 'stroke', points: [[10, 10], [30, 80]] }])
  })
  it('or a touch where it starts and a touch where it ends', () => {
    const { marks, press, release, drawing } = board(gape)
    press([10, 10]); release([11, 10])
    expect(marks).toEqual([])
    expect(drawing.value).toBe(true)
    press([40, 90]); release([40, 90])
    expect(marks[0]!.points).toEqual([[10, 10], [40, 90]])
    expect(drawing.value).toBe(false)
  })
  it('needs one touch for a point', () => {
    const { marks, press, release } = board({ kind: 'place', shape: 'point' })
    press([5, 5]); release([6, 5])
    expect(marks).toEqual([{ kind: 'place', shape: 'point', points: [[6, 5]] }])
  })
  it('follows a drag line along its fold', () => {
    const { marks, press, move, release } = board({ kind: 'drag-line', shape: 'stroke' })
    press([0, 0]); move([[40, 0], [60, 30]]); move([[60, 60]]); release([60, 60])
    expect(marks[0]!.points).toEqual([[0, 0], [40, 0], [60, 30], [60, 60]])
  })
  it('closes an area touched corner by corner at its first corner', () => {
    const { marks, press, release } = board({ kind: 'excess', shape: 'area' })
    for (const p of [[0, 0], [100, 0], [100, 100], [2, 3]] as const) { press(p); release(p) }
    expect(marks).toEqual([{ kind: 'excess', shape: 'area', points: [[0, 0], [100, 0], [100, 100]] }])
  })
  it('closes an area drawn round', () => {
    const { marks, press, move, release } = board({ kind: 'excess', shape: 'area' })
    press([0, 0]); move([[100, 0], [100, 100]]); move([[0, 100]]); release([2, 4])
    expect(marks[0]!.points.length).toBeGreaterThanOrEqual(4)
  })
  it('is forgotten on cancel, and a stray touch on one spot makes no mark', () => {
    const { marks, press, release, cancel, drawing } = board(gape)
    press([10, 10]); release([10, 10])
    press([11, 11]); release([11, 11])
    expect(marks).toEqual([])
    cancel()
    expect(drawing.value).toBe(false)
  })
  it('shows the stroke to the free end while drawing', () => {
    const { press, move, draft } = board(gape)
    press([0, 0]); move([[0, 50]])
    expect(draft.value!.points).toEqual([[0, 0], [0, 50]])
  })
})
