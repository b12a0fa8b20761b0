import { describe, expect, it } from 'vitest'
import PcTape from '../../../src/components/PcTape.vue'
import { mountWithUnit } from './mountWithUnit.ts'

const tape = (unit: 'cm' | 'inch', mm: number | null, props = {}) => {
  const { wrapper, value } = mountWithUnit<number | null>(PcTape, unit, mm, { labelledBy: 'amount', ...props })
  return { wrapper, value, slider: wrapper.get('[role=slider]'), less: wrapper.get('[aria-label=Less]'), more: wrapper.get('[aria-label=More]') }
}

describe('PcTape', () => {
  it('takes one millimetre a press in centimetres, one eighth in inches', async () => {
    const cm = tape('cm', 20)
    await cm.more.trigger('click')
    expect(cm.value()).toBe(21)
    const inch = tape('inch', 25.4)
    await inch.less.trigger('click')
    expect(inch.value()).toBeCloseTo(22.225, 6)
  })
  it('takes five with Shift, ten with a page, and goes back to nothing', async () => {
    const { slider, value } = tape('cm', 20)
    await slider.trigger('keydown', { key: 'ArrowRight', shiftKey: true })
    expect(value()).toBe(25)
    await slider.trigger('keydown', { key: 'PageUp' })
    expect(value()).toBe(35)
    await slider.trigger('keydown', { key: 'Home' })
    expect(value()).toBe(0)
  })
  it('stays between nothing and the most it can take', async () => {
    const { slider, more, less, value } = tape('cm', 0, { maxMm: 3 })
    expect(less.attributes('disabled')).toBeDefined()
    await slider.trigger('keydown', { key: 'ArrowLeft' })
    expect(value()).toBe(0)
    await slider.trigger('keydown', { key: 'PageUp' })
    expect(value()).toBe(3)
    expect(more.attributes('disabled')).toBeDefined()
  })
  it('leaves other keys to the page', async () => {
    const { slider, value } = tape('cm', 20)
    const event = new KeyboardEvent('keydown', { key: 'Tab', cancelable: true })
    slider.element.dispatchEvent(event)
    expect(event.defaultPrevented).toBe(false)
    expect(value()).toBe(20)
  })
  it('is pulled under the needle: to the left for more', async () => {
    const { slider, value } = tape('cm', 20)
    ;(slider.element as HTMLElement).setPointerCapture = () => {}
    await slider.trigger('pointerdown', { clientX: 200, pointerId: 1 })
    await slider.trigger('pointermove', { clientX: 200 - 33, pointerId: 1 })
    expect(value()).toBe(23)
    await slider.trigger('pointerup')
    await slider.trigger('pointermove', { clientX: 0, pointerId: 1 })
    expect(value()).toBe(23)
  })
  it('tells a screen reader the amount with its unit, and that nothing is measured yet', () => {
    expect(tape('cm', 15).slider.attributes()).toMatchObject({ 'aria-valuenow': '15', 'aria-valuetext': '1.5\u00A0cm', 'aria-labelledby': 'amount' })
    expect(tape('cm', null).slider.attributes('aria-valuetext')).toBe('not measured')
  })
})
