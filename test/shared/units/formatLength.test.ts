import { formatLength } from '#shared/units/formatLength.ts'
import { lengthText, readLengthText } from '#shared/units/lengthText.ts'
import { parseLength } from '#shared/units/parseLength.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

const nb = (text: string) => text.replaceAll(' ', '\u00A0')
const sixteenth = mmPerInch / 16

describe('lengths for reading', () => {
  it.each([[970, '97.0 cm'], [972.5, '97.25 cm'], [971.55, '97.2 cm'], [0, '0.0 cm'], [-0.2, '0.0 cm'], [-15, '−1.5 cm']])('shows %d mm as %s', (mm, text) => expect(formatLength(mm, 'cm')).toBe(nb(text)))
  it.each([[971.55, '38 ¼ in'], [965.2, '38 in'], [15.875, '⅝ in'], [4.7625, '3/16 in'], [0, '0 in'], [25.3, '1 in'], [-12.7, '−½ in']])('shows %d mm as %s', (mm, text) => expect(formatLength(mm, 'inch')).toBe(nb(text)))
  it('rounds to eighths where asked', () => expect(formatLength(38 * mmPerInch + 3 * sixteenth, 'inch', { step: 8 })).toBe(nb('38 ¼ in')))
  it('gives a change its sign, and nothing at nothing', () => {
    expect(formatLength(15, 'cm', { signed: true })).toBe(nb('+1.5 cm'))
    expect(formatLength(-15.875, 'inch', { signed: true })).toBe(nb('−⅝ in'))
    expect(formatLength(0.1, 'cm', { signed: true })).toBe(nb('0.0 cm'))
    expect(formatLength(-0.1, 'inch', { signed: true })).toBe(nb('0 in'))
  })
  it('leaves the unit to the heading where asked', () => expect(formatLength(970, 'cm', { bare: true })).toBe('97.0'))
  it('never breaks between number, fraction and unit', () => {
    fc.assert(fc.property(fc.integer({ min: -64_000, max: 64_000 }), fc.constantFrom('cm', 'inch'), (n, unit) => { expect(formatLength(n / 16, unit as 'cm')).not.toMatch(/ /) }))
  })
  it('is never off by more than half a division', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 3990, noNaN: true }), (mm) => {
      const inch = parseLength(formatLength(mm, 'inch'), 'cm')
      const cm = parseLength(formatLength(mm, 'cm'), 'inch')
      expect(inch.ok && Math.abs(inch.mm - mm) <= sixteenth / 2 + 1e-6).toBe(true)
      expect(cm.ok && Math.abs(cm.mm - mm) <= 0.5 + 1e-6).toBe(true)
    }))
  })
})

describe('what was typed comes back', () => {
  it('in centimetres, to the half millimetre, on the screen and in the field', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 8000 }), (halves) => {
      const typed = (halves / 20).toFixed(halves % 2 ? 2 : 1)
      const read = parseLength(typed, 'cm')
      expect(read.ok && formatLength(read.mm, 'cm', { bare: true })).toBe(typed)
    }))
  })
  it('in inches, to the sixteenth', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 150 }), fc.integer({ min: 0, max: 15 }), (whole, top) => {
      const read = parseLength(top ? `${whole} ${top}/16` : `${whole}`, 'inch')
      expect(read.ok).toBe(true)
      if (!read.ok) return
      expect(read.mm).toBeCloseTo((whole + top / 16) * mmPerInch, 9)
      const shown = parseLength(formatLength(read.mm, 'inch'), 'inch')
      expect(shown).toMatchObject({ ok: true, mm: read.mm })
    }))
  })
  it('keeps a decimal typed to a tenth of a millimetre, and decimal inches', () => {
    for (const [typed, unit] of [['97.23', 'cm'], ['38.3', 'inch'], ['38 5/16', 'inch'], ['38 1/64', 'inch'], ['97', 'cm']] as const) {
      const read = parseLength(typed, unit)
      expect(read.ok && lengthText(read.mm, unit)).toBe(typed)
    }
  })
  it('never moves a stored length by looking at it in the other unit', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 4000, noNaN: true }), fc.array(fc.constantFrom('cm', 'inch'), { maxLength: 12 }), (stored, looks) => {
      let mm = stored
      for (const unit of looks as ('cm' | 'inch')[]) {
        const read = readLengthText(lengthText(mm, unit), unit, mm)
        expect(read.ok).toBe(true)
        if (read.ok) mm = read.mm
      }
      expect(mm).toBe(stored)
    }))
  })
  it('reads a changed text afresh', () => expect(readLengthText('98', 'cm', 970)).toMatchObject({ ok: true, mm: 980 }))
})
