/**
 * How loudly evidence speaks. Four grades and no others, so that every rule is weighed on one scale; whole points, so that sums do not
 * depend on the order they are made in. The figures are our own and tuned against the worked fittings of the tests.
 */
export const strengths = ['slight', 'fair', 'strong', 'decisive'] as const
export type Strength = (typeof strengths)[number]

/**
 * `decisive` settles it where nothing contradicts (a check answered, a fold found exactly where this cause alone puts it);
 * `strong` is the sign the handbooks name first; `fair` goes with it but has other causes too; `slight` merely fits.
 */
export const points: Readonly<Record<Strength, number>> = { slight: 2, fair: 4, strong: 8, decisive: 14 }

/** One grade lower; null below slight. For signs that were seen with a detail missing. */
export const weaker = (strength: Strength): Strength | null => strengths[strengths.indexOf(strength) - 1] ?? null
