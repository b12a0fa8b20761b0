import { DomainError } from '#shared/errors.ts'
import { commonWords } from './commonWords.ts'

/** Characters that must be left when a guessable word and trailing digits are taken away. */
const leastRest = 5
const ofTheJournal = ['proofcloth', 'proof', 'cloth', 'journal', 'fitjournal']
const rows = ['01234567890123456789', 'abcdefghijklmnopqrstuvwxyz', 'qwertyuiop', 'asdfghjkl', 'zxcvbnm']

/**
 * Refuses passwords that guessing programs try first: one common word with digits and signs around it, the person's own name
 * or address, a short thing repeated, a row of keys. Length is the contract's matter; which characters is nobody's.
 * @param about - what is known of the person: name, e-mail address, studio
 * @throws DomainError 'password.weak' with details { password: sentence }
 * Source: NIST SP 800-63B §5.1.1.2 (compare with common, context-specific, repetitive and sequential values)
 */
export function checkPassword(password: string, about: readonly string[]): void {
  const found = guessableIn(password, about)
  if (found === null) return
  const sentence = `This password is easy to guess: ${found}. Use several words that have nothing to do with you or with each other.`
  throw new DomainError('password.weak', sentence, { password: sentence })
}

function guessableIn(password: string, about: readonly string[]): string | null {
  const plain = plainLetters(password)
  if (/^(.{1,4})\1+.{0,3}$/su.test(password.toLowerCase())) return 'it repeats a few characters'
  if (withoutRows(plain).length < leastRest) return 'it is a row of keys, letters or digits'

  const own = [...ofTheJournal, ...about.flatMap(wordsOf)].filter((word) => word.length >= 3).sort((a, b) => b.length - a.length)
  const withoutOwn = own.reduce((rest, word) => rest.replaceAll(word, ''), plain)
  if (withoutOwn !== plain && withoutEnds(withoutOwn).length < leastRest) return 'it is built around your name, your address or the journal'

  for (const word of commonWords) {
    if (!plain.includes(word)) continue
    if (withoutEnds(withoutOwn.replaceAll(word, '')).length < leastRest) return `it is built around “${word}”`
  }
  return null
}

/** Lower case, without accents and signs, and with the usual disguises undone: p@ssw0rd → password. Digits at the ends stay digits. */
function plainLetters(text: string): string {
  const disguises: Record<string, string> = { '@': 'a', 4: 'a', 3: 'e', 1: 'i', '!': 'i', 0: 'o', 5: 's', $: 's', 7: 't' }
  return text.normalize('NFKD').toLowerCase()
    .replaceAll(/(?<=\p{L})[@431!05$7](?=[@431!05$7]?\p{L})/gu, (sign) => disguises[sign] ?? sign)
    .replaceAll(/[^\p{L}\p{N}]/gu, '')
}
const withoutEnds = (text: string) => text.replaceAll(/^\p{N}+|\p{N}+$/gu, '')

function withoutRows(text: string): string {
  let rest = text
  for (const row of rows.flatMap((keys) => [keys, [...keys].reverse().join('')])) {
    for (let length = Math.min(row.length, rest.length); length >= 4; length--) {
      for (let start = 0; start + length <= row.length; start++) rest = rest.replaceAll(row.slice(start, start + length), '')
    }
  }
  return rest
}

const wordsOf = (text: string) => [plainLetters(text), ...text.split(/[^\p{L}\p{N}]+/u).map(plainLetters)]
