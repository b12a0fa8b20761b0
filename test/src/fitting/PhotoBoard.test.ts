// @vitest-environment happy-dom
import { flushPromises, mount } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { describe, expect, it, vi } from 'vitest'
import { type BoardMark } from '../../../src/components/fitting/boardMark.ts'
import PhotoBoard from '../../../src/components/fitting/PhotoBoard.vue'
import { photograph } from './fittingFixtures.ts'

// A board of 300 × 400 px: a picture of 900 × 1200 fits it exactly.
vi.mock('@vueuse/core', async (original) => ({ ...await original<object>(), useElementSize: () => ({ width: { value: 300, __v_isRef: true }, height: { value: 400, __v_isRef: true } }) }))

const mark = (number: number, more: Partial<BoardMark> = {}): BoardMark => ({ id: `o${number}`, number, kind: 'gape', shape: 'stroke', points: [[0.2, 0.2], [0.2, 0.4]], state: 'noted', label: `Observation ${number}, armhole stands off, 1.2 cm, noted`, ...more })
const open = (props: Partial<InstanceType<typeof PhotoBoard>['$props']> = {}) => mount(PhotoBoard, {
  props: { projectId: 'p', photograph: photograph(), marks: [], selectedId: null, tool: null, editable: true, hint: '', ...props }, global: { plugins: [createPinia()], stubs: { PcIcon: true } }, attachTo: document.body,
})
const pointer = (type: string, x: number, y: number, more: object = {}) => Object.assign(new MouseEvent(type, { clientX: x, clientY: y, bubbles: true, cancelable: true }), { pointerId: 1, pointerType: 'mouse', ...more })
function drag(board: Element, ...way: [number, number][]) {
  board.dispatchEvent(pointer('pointerdown', ...way[0]!))
  for (const at of way.slice(1)) board.dispatchEvent(pointer('pointermove', ...at))
  board.dispatchEvent(pointer('pointerup', ...way.at(-1)!))
}

describe('the photograph board', () => {
  it('puts a mark on by one drag, kept as fractions of the picture', async () => {
    const board = open({ tool: { kind: 'gape', shape: 'stroke' } })
    drag(board.element, [60, 80], [62, 120], [60, 160])
    expect(board.emitted('mark')).toEqual([[{ kind: 'gape', shape: 'stroke', points: [[0.2, 0.2], [0.2, 0.4]] }]])
  })
  it('puts a mark on with the keyboard alone', async () => {
    const board = open({ tool: { kind: 'gape', shape: 'stroke' } });
    (board.vm as unknown as { startCrosshair: () => void }).startCrosshair()
    await board.trigger('keydown', { key: 'Enter' })
    for (let i = 0; i < 5; i++) await board.trigger('keydown', { key: 'ArrowDown', shiftKey: true })
    await board.trigger('keydown', { key: 'Enter' })
    expect(board.emitted('mark')![0]).toEqual([{ kind: 'gape', shape: 'stroke', points: [[0.5, 0.5], [0.5, 0.9]] }])
    expect(board.emitted('say')!.flat().join(' ')).toContain('Arrow keys move it')
  })
  it('gives up a begun mark on Escape', async () => {
    const board = open({ tool: { kind: 'gape', shape: 'stroke' } })
    drag(board.element, [60, 80])
    await board.trigger('keydown', { key: 'Escape' })
    drag(board.element, [100, 80])
    expect(board.emitted('mark')).toBeUndefined()
  })
  it('draws nothing for someone who may only look', () => {
    const board = open({ tool: { kind: 'gape', shape: 'stroke' }, editable: false })
    drag(board.element, [60, 80], [60, 160])
    expect(board.emitted('mark')).toBeUndefined()
  })
  it('shows pins as buttons in the order of the list, each saying its observation', async () => {
    const board = open({ marks: [mark(1), mark(2, { points: [[0.7, 0.2], [0.7, 0.4]] })] })
    const pins = board.findAll('button.pin')
    expect(pins.map((pin) => pin.attributes('aria-label'))).toEqual(['Observation 1, armhole stands off, 1.2 cm, noted', 'Observation 2, armhole stands off, 1.2 cm, noted'])
    await pins[1]!.trigger('click')
    expect(board.emitted('select')).toEqual([['o2']])
  })
  it('selects a mark by touching its stroke', () => {
    const board = open({ marks: [mark(1)] })
    drag(board.element, [64, 120])
    expect(board.emitted('select')).toEqual([['o1']])
  })
  it('moves one end of the selected mark by arrow keys and keeps it on release', async () => {
    const board = open({ marks: [mark(1)], selectedId: 'o1' })
    await flushPromises()
    const end = board.find('button[aria-label="End of mark 1"]')
    await end.trigger('keydown', { key: 'ArrowRight', shiftKey: true })
    await end.trigger('keyup', { key: 'ArrowRight' })
    const [id, points] = board.emitted('reshape')![0] as [string, [number, number][]]
    expect(id).toBe('o1')
    expect(points[0]).toEqual([0.2, 0.2])
    expect(points[1]![0]).toBeCloseTo(0.24)
  })
  it('hands keys it has no use for to the screen', async () => {
    const board = open()
    await board.trigger('keydown', { key: 'g' })
    expect((board.emitted('key')![0] as [KeyboardEvent])[0].key).toBe('g')
  })
  it('zooms at the wheel and never beyond the picture', async () => {
    const board = open()
    board.element.dispatchEvent(Object.assign(new MouseEvent('wheel', { clientX: 150, clientY: 200, bubbles: true, cancelable: true }), { deltaY: -400, deltaX: 0, deltaMode: 0 }))
    await flushPromises()
    const scale = Number(/scale\(([\d.]+)\)/.exec(board.find('img').attributes('style') ?? '')?.[1])
    expect(scale).toBeGreaterThan(1.5)
    for (let i = 0; i < 20; i++) await board.trigger('keydown', { key: '+' })
    expect(Number(/scale\(([\d.]+)\)/.exec(board.find('img').attributes('style') ?? '')?.[1])).toBe(8)
  })
})
