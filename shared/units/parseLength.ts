import { mmPerCm, mmPerInch, tidyMm, type Unit } from './unit.ts'

export type ParsedLength = { ok: true; mm: number; /** the unit the text itself names, if it does */ named: Unit | 'mm' | 'm' | null } | { ok: false; message: string }
export type ParseLengthOptions = {
  /** amounts of a change may be below zero */
  signed?: boolean
  /** the longest length that makes sense here, mm */
  mostMm?: number
}

const vulgar: Readonly<Record<string, string>> = {
  '½': '1/2', '¼': '1/4', '¾': '3/4', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8', '⅓': '1/3', '⅔': '2/3', '⅕': '1/5', '⅖': '2/5', '⅗': '3/5', '⅘': '4/5', '⅙': '1/6', '⅚': '5/6', '⅒': '1/10',
}
const unitWords: readonly (readonly [RegExp, Unit | 'mm' | 'm'])[] = [
  [/\s*(?:mm|millimet(?:er|re)s?)\.?$/, 'mm'],
  [/\s*(?:cms?|centimet(?:er|re)s?)\.?$/, 'cm'],
  [/\s*(?:"|in|ins|inch|inches)\.?$/, 'inch'],
  [/\s*(?:m|met(?:er|re)s?)\.?$/, 'm'],
]
const mmPer = { mm: 1, cm: mmPerCm, inch: mmPerInch, m: 1000 } as const
const example = { cm: '97.5, 97,5 or 970 mm', inch: '38 1/4, 38.25 or 97 cm' } as const

const no = (message: string): ParsedLength => ({ ok: false, message })

/**
 * Reads a length as people write it: 97, 97.5, 97,5, 38 1/4, 38¼, 38-1/4, 38 1/4", 97 cm, 970 mm, 38.25 in, 5 ft 6 in.
 * @param unit - the unit of a bare number; a unit in the text wins
 * @returns mm, kept to a millionth, or a sentence that says what to write instead. Never NaN.
 */
export function parseLength(text: string, unit: Unit, { signed = false, mostMm = 4000 }: ParseLengthOptions = {}): ParsedLength {
  const typed = text.trim()
  if (!typed) return no(`Type a length, for example ${example[unit]}.`)
  let rest = plain(typed)
  const sign = /^[+-]/.exec(rest)?.[0]
  if (sign) rest = rest.slice(1).trim()
  if (sign === '-' && !signed) return no(`${typed} is below zero. Type the length without a minus.`)

  let feetMm = 0
  const feet = /^(\d+)\s*(?:'|ft\.?|feet|foot)\s*/.exec(rest)
  if (feet) {
    feetMm = Number(feet[1]) * 12 * mmPerInch
    rest = rest.slice(feet[0].length)
  }
  const word = unitWords.find(([pattern]) => pattern.test(rest))
  const named = word?.[1] ?? (feet ? 'inch' : null)
  if (feet && named !== 'inch') return no(`${typed} mixes feet with another unit. Write feet and inches, or one metric length.`)
  if (word) rest = rest.replace(word[0], '')
  const used = named ?? unit

  const number = feet && !rest ? { value: 0 } : readNumber(rest, used)
  if ('message' in number) return no(number.message || `"${typed}" is not a length. Write it like ${example[unit]}.`)
  const mm = tidyMm((feetMm + number.value * mmPer[used]) * (sign === '-' ? -1 : 1))
  if (Math.abs(mm) > mostMm) return no(`${typed} is longer than anything measured here. Check the number and the unit.`)
  return { ok: true, mm, named }
}

/** One spelling for the many dashes, quotes, spaces and fraction glyphs of phones and spreadsheets. */
function plain(text: string): string {
  return text
    // Before NFKC, which would turn 38¼ into 381⁄4.
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔⅕⅖⅗⅘⅙⅚⅒]/g, (glyph) => ` ${vulgar[glyph]}`)
    .replace(/(\d)([⁰¹²³⁴⁵⁶⁷⁸⁹]+[⁄∕/])/g, '$1 $2')
    .normalize('NFKC').toLowerCase()
    .replace(/[⁄∕]/g, '/').replace(/[−–—‐‑]/g, '-').replace(/''|[″”“]/g, '"').replace(/[′’‘]/g, "'").replace(/''/g, '"')
    .replace(/\s+/g, ' ').replace(/ ?\/ ?/g, '/').trim()
}

function readNumber(text: string, unit: Unit | 'mm' | 'm'): { value: number } | { message: string } {
  const fraction = /^(?:(\d+)[ -])?\s*(\d+)\/(\d+)$/.exec(text)
  if (fraction) {
    const [whole, top, bottom] = [Number(fraction[1] ?? 0), Number(fraction[2]), Number(fraction[3])]
    if (!bottom) return { message: 'A fraction cannot end in /0. Write it like 38 1/4.' }
    if (fraction[1] !== undefined && top >= bottom) return { message: `${top}/${bottom} after a whole number is one or more. Write the whole number and a smaller fraction, like 38 1/4.` }
    return { value: whole + top / bottom }
  }
  if (/^\d*[.,]\d+$|^\d+[.,]?$/.test(text)) {
    // 1,020 mm may be a thousand and twenty; 38,375 in is decimal beyond doubt, as eighths have three places.
    if (/^\d{1,3},\d{3}$/.test(text) && unit !== 'inch') return { message: `${text} can be read two ways. Write ${text.replace(',', '')} or ${text.replace(',', '.')}.` }
    return { value: Number(text.replace(',', '.')) }
  }
  if (/[.,].*[.,]/.test(text) && /^[\d.,]+$/.test(text)) return { message: `${text} has two decimal marks. Write one, and no thousands mark.` }
  return { message: '' }
}
