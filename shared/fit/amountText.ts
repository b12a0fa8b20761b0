/**
 * Texts of the rules carry their amounts as tokens, since only the reader knows whether they read centimetres or inches:
 * `{mm:16}` is a length, `{+mm:-16}` a change with its sign.
 */
const token = /\{(\+?)mm:(-?\d+(?:\.\d+)?)\}/g

/**
 * Replaces every amount token.
 * @param format - makes a length in mm into words; `signed` where the token asks for the sign
 */
export function fillAmounts(text: string, format: (mm: number, signed: boolean) => string): string {
  return text.replace(token, (_, sign: string, mm: string) => format(Number(mm), sign === '+'))
}

/** A length token, mm; signs are dropped. */
export const mmToken = (mm: number): string => `{mm:${tidy(Math.abs(mm))}}`
/** A change token: its sign is shown. */
export const signedToken = (mm: number): string => `{+mm:${tidy(mm)}}`

/** Enough for a sixteenth of an inch (1.5875 mm), without binary dust. */
const tidy = (mm: number): number => Math.round(mm * 10000) / 10000 || 0
