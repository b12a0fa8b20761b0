import { describe, expect, it } from 'vitest'
import LengthField from '../../../src/components/LengthField.vue'
import { mountWithUnit } from './mountWithUnit.ts'

const field = (unit: 'cm' | 'inch', mm: number | null, props = {}) => {
  const { wrapper, session, value } = mountWithUnit<number | null>(LengthField, unit, mm, { label: 'Waist', ...props })
  const input = wrapper.get('input')
  return { wrapper, session, value, input, type: async (text: string) => { await input.setValue(text); await input.trigger('change') }, shown: () => (input.element as HTMLInputElement).value }
}

describe('LengthField', () => {
  it('is found by its label and reads the person’s unit', () => {
    const { wrapper, input, shown } = field('cm', 972.5)
    expect(wrapper.get('label').attributes('for')).toBe(input.attributes('id'))
    expect(shown()).toBe('97.25')
  })
  it('takes a comma, a fraction, and a length in the other unit', async () => {
    const cm = field('cm', null)
    await cm.type('97,5')
    expect(cm.value()).toBe(975)
    const inch = field('inch', null)
    await inch.type('38 1/4')
    expect(inch.value()).toBeCloseTo(971.55, 6)
    await inch.type('97 cm')
    expect(inch.value()).toBeCloseTo(970, 6)
  })
  it('says what is wrong beside the field, keeps what was typed and does not touch the value', async () => {
    const { wrapper, value, input, type, shown } = field('cm', 970)
    await type('about ninety')
    expect(value()).toBe(970)
    expect(shown()).toBe('about ninety')
    expect(input.attributes('aria-invalid')).toBe('true')
    const told = wrapper.get('[role=alert]')
    expect(input.attributes('aria-describedby')).toBe(told.attributes('id'))
    expect(told.text()).toContain('about ninety')
    await type('97')
    expect(wrapper.find('[role=alert]').exists()).toBe(false)
  })
  it('does not move a length that is only looked at in the other unit', async () => {
    const { session, value, input, shown } = field('cm', 973)
    await session.setUnit('inch')
    await input.trigger('change')
    expect(value()).toBe(973)
    await session.setUnit('cm')
    expect(shown()).toBe('97.3')
  })
  it('means "none" when it is emptied', async () => {
    const { value, type } = field('cm', 970)
    await type('')
    expect(value()).toBeNull()
  })
})
