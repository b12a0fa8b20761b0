import { type Unit } from '../contracts/common.ts'

export type { Unit }

/** Exact by definition (international inch, 1959). */
export const mmPerInch = 25.4
export const mmPerCm = 10

/** The smallest paper amount worth drawing in each unit: 1 mm, or a sixteenth of an inch. */
export const paperStepMm: Readonly<Record<Unit, number>> = { cm: 1, inch: mmPerInch / 16 }
/** One press of + or − on the tape: 0.1 cm, or an eighth of an inch. */
export const tapeStepMm: Readonly<Record<Unit, number>> = { cm: 1, inch: mmPerInch / 8 }

/**
 * A length without the dust of binary fractions: 9.95 cm is 99.5 mm, not 99.49999999999999. A millionth of a millimetre is kept, so
 * sixty-fourths of an inch (0.396875 mm) stay exact.
 */
export const tidyMm = (mm: number): number => Math.round(mm * 1e6) / 1e6 || 0
