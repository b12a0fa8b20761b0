import { measurementTable } from '../../measurements/measurementTable.ts'
import { type Measurement } from '../../measurements/measurement.ts'
import { type Unit } from '../../units/unit.ts'

export type Heading = { code: string; unit: Unit | 'mm' | null; finished: boolean }

const codes = new Map<string, string>()
for (const { code, name, standardName, aliases } of measurementTable as readonly Measurement[]) {
  for (const word of [code, name, standardName, ...aliases]) if (word && !codes.has(key(word))) codes.set(key(word), code)
}
const sizeWords = new Set(['size', 'sizes', 'label', 'pattern size', 'sizing', 'us', 'eu', 'uk', 'misses', 'women', 'men'].map(key))

function key(text: string): string {
  return text.toLowerCase().replace(/[^a-z]+/g, ' ').trim()
}

/** The unit a heading or a title line names: "Bust (cm)", "Hip, in inches", 'Waist "'. */
export function headingUnit(text: string): Unit | 'mm' | null {
  const lower = text.toLowerCase()
  if (/\b(mm|millimet(er|re)s?)\b/.test(lower)) return 'mm'
  if (/\b(cms?|centimet(er|re)s?)\b/.test(lower)) return 'cm'
  // "in" is a unit at the end or in brackets, and a plain word elsewhere.
  return /\b(ins|inch|inches)\b|["″]|\bin\.?\s*[)\]]?\s*$/.test(lower) ? 'inch' : null
}
export const isFinished = (text: string): boolean => /\b(finished|garment)\b/i.test(text)
export const isSizeWord = (text: string): boolean => sizeWords.has(key(stripped(text)))

/** Which measurement a heading means, by code or any common name; null where none. */
export function readHeading(text: string): Heading | null {
  const code = codes.get(key(stripped(text)))
  return code ? { code, unit: headingUnit(text), finished: isFinished(text) } : null
}

/** The words of the measurement alone, without unit, brackets and what chart makers add. */
function stripped(text: string): string {
  const plain = text.toLowerCase().replace(/[([{].*?[)\]}]/g, ' ').replace(/\b(in )?(cms?|centimet(er|re)s?|mm|millimet(er|re)s?|ins|inch|inches)\b|["″*:]/g, ' ').replace(/[\s,]+in\s*$/, ' ')
  const bare = plain.replace(/\b(finished|garment|body|measurements?|circumference|to fit)\b/g, ' ')
  return codes.has(key(bare)) || sizeWords.has(key(bare)) ? bare : plain
}
