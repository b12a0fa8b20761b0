import { DomainError } from '#shared/errors.ts'

/** Deeper JSON than any contract asks for: refused before it is walked by anything recursive. */
export const deepestLevel = 24

/**
 * Refuses what no field of any contract can hold: nesting beyond `deepestLevel`, NUL, halves of surrogate pairs.
 * PostgreSQL would refuse the last two later with an error that says nothing to the person.
 * @throws DomainError 'request.invalid'
 */
export function checkText(value: unknown): void {
  const open: { value: unknown; level: number }[] = [{ value, level: 0 }]
  for (let next = open.pop(); next; next = open.pop()) {
    if (typeof next.value === 'string') checkString(next.value)
    if (typeof next.value !== 'object' || next.value === null) continue
    if (next.level >= deepestLevel) throw new DomainError('request.invalid', `The request is nested more than ${deepestLevel} levels deep.`)
    for (const [key, inner] of Object.entries(next.value)) {
      checkString(key)
      open.push({ value: inner, level: next.level + 1 })
    }
  }
}

function checkString(text: string): void {
  if (text.includes('\0')) throw new DomainError('request.invalid', 'The text holds a NUL character. Leave it out and send again.')
  if (/\p{Cs}/u.test(text)) throw new DomainError('request.invalid', 'The text holds half a character. Type it again and send it once more.')
}
