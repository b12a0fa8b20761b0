import { formatLength } from './formatLength.ts'
import { parseLength, type ParsedLength, type ParseLengthOptions } from './parseLength.ts'
import { mmPerCm, mmPerInch, type Unit } from './unit.ts'

/**
 * What an entry field shows for a stored length: exactly what was typed where it was typed in this unit (97.25, 38 5/16, 38.3), the
 * nearest tape division where it was typed in the other. No unit: the field stands beside it.
 */
export function lengthText(mm: number, unit: Unit): string {
  const sign = mm < 0 ? '−' : ''
  const size = Math.abs(mm)
  if (unit === 'inch') {
    const sixtyFourths = (size / mmPerInch) * 64
    if (Math.abs(sixtyFourths - Math.round(sixtyFourths)) < 1e-5) return sign + fractionText(Math.round(sixtyFourths))
  }
  const per = unit === 'cm' ? mmPerCm : mmPerInch
  for (let digits = 0; digits <= 3; digits++) {
    const text = (size / per).toFixed(digits)
    const back = parseLength(text, unit, { mostMm: Infinity })
    if (back.ok && Math.abs(back.mm - size) < 1e-6) return sign + text
  }
  return formatLength(mm, unit, { bare: true })
}

/**
 * Reads an entry field back. A text left as it was shown keeps the stored length to the last digit, so looking at a length in the
 * other unit, or saving a form unedited, never moves it.
 */
export function readLengthText(text: string, unit: Unit, storedMm: number | null, options?: ParseLengthOptions): ParsedLength {
  if (storedMm !== null && text.trim() === lengthText(storedMm, unit)) return { ok: true, mm: storedMm, named: null }
  return parseLength(text, unit, options)
}

function fractionText(sixtyFourths: number): string {
  const whole = Math.floor(sixtyFourths / 64)
  let [top, bottom] = [sixtyFourths % 64, 64]
  if (!top) return String(whole)
  while (top % 2 === 0) [top, bottom] = [top / 2, bottom / 2]
  return whole ? `${whole} ${top}/${bottom}` : `${top}/${bottom}`
}
