/**
 * Dimensional change of cloth in percent, negative where it shrank: 100 (after − before) / before.
 * Source: the form of AATCC test method 135, from memory
 */
export const dimensionalChange = (beforeMm: number, afterMm: number): number => (100 * (afterMm - beforeMm)) / beforeMm

/**
 * Length to have before the wash so that `lengthMm` is left after it: L / (1 − s). Cloth that grows needs less.
 * @param changePercent - as `dimensionalChange` gives it, above −100
 */
export const clothNeeded = (lengthMm: number, changePercent: number): number => lengthMm / (1 + changePercent / 100)
