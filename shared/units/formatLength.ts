import { mmPerCm, mmPerInch, type Unit } from './unit.ts'

export type FormatLengthOptions = {
  /** amounts that are changes carry their sign: +1.5 cm, −⅝ in */
  signed?: boolean
  /** the finest fraction of an inch shown */
  step?: 8 | 16
  /** the number alone, for a column whose heading names the unit */
  bare?: boolean
}

const glyphs: Readonly<Record<string, string>> = { '1/2': '½', '1/4': '¼', '3/4': '¾', '1/8': '⅛', '3/8': '⅜', '5/8': '⅝', '7/8': '⅞' }
const space = '\u00A0' // a length never breaks over two lines
const minus = '−'

export const unitNames: Readonly<Record<Unit, string>> = { cm: 'cm', inch: 'in' }

/**
 * A length for reading: "97.0 cm", "38 ¼ in", "−1.5 cm". Centimetres show millimetres, and half a millimetre where the value
 * stands exactly on one; inches show the nearest eighth or sixteenth, reduced.
 */
export function formatLength(mm: number, unit: Unit, { signed = false, step = 16, bare = false }: FormatLengthOptions = {}): string {
  const number = unit === 'cm' ? cmText(Math.abs(mm)) : inchText(Math.abs(mm), step)
  const isZero = /^[0.]+$/.test(number)
  const sign = isZero ? '' : mm < 0 ? minus : signed ? '+' : ''
  return `${sign}${number}${bare ? '' : space + unitNames[unit]}`
}

function cmText(mm: number): string {
  const onHalf = Math.abs(mm * 2 - Math.round(mm * 2)) < 1e-6 && Math.round(mm * 2) % 2 === 1
  // Rounded in millimetres: 97.25 in binary is fine, 99.95 / 10 is not.
  return onHalf ? (Math.round(mm * 10) / 100).toFixed(2) : (Math.round(mm) / mmPerCm).toFixed(1)
}

function inchText(mm: number, step: 8 | 16): string {
  const parts = Math.round((mm / mmPerInch) * step)
  const whole = Math.floor(parts / step)
  let [top, bottom] = [parts % step, step as number]
  if (!top) return String(whole)
  while (top % 2 === 0) [top, bottom] = [top / 2, bottom / 2]
  const fraction = glyphs[`${top}/${bottom}`] ?? `${top}/${bottom}`
  return whole ? `${whole}${space}${fraction}` : fraction
}
