export type NotchPair = { aMm: number; bMm: number; offMm: number; meets: boolean }
export type NotchMeeting = { meets: boolean; pairs: NotchPair[]; /** notches of one edge without a partner on the other, mm along it */ alone: { a: number[]; b: number[] }; text: string }

/** A notch is drawn no more exactly than this. Our own limit. */
const toleranceMm = 1

/**
 * Whether the notches of two edges that are sewn together meet when the edges are laid from one end.
 * @param aMm - distances along the first edge from the end both start at
 * @param bMm - the same along the second
 * @param easeMm - how much longer the second edge may be from one notch to the next, eased in there: a sleeve cap, a back shoulder
 */
export function pairedNotches(aMm: readonly number[], bMm: readonly number[], easeMm = 0): NotchMeeting {
  const [a, b] = [aMm.toSorted((x, y) => x - y), bMm.toSorted((x, y) => x - y)]
  const pairs: NotchPair[] = []
  let easedSoFar = 0
  for (let i = 0; i < Math.min(a.length, b.length); i++) {
    const offMm = b[i]! - a[i]!
    const before = pairs.at(-1)?.offMm ?? 0
    // Between two notches the eased edge may only gain, and not more than its ease in all.
    const gained = offMm - before
    const meets = gained >= -toleranceMm && Math.max(0, easedSoFar + gained) <= easeMm + toleranceMm
    if (meets) easedSoFar += gained
    pairs.push({ aMm: a[i]!, bMm: b[i]!, offMm, meets })
  }
  const alone = { a: a.slice(pairs.length), b: b.slice(pairs.length) }
  const meets = pairs.every((pair) => pair.meets) && !alone.a.length && !alone.b.length
  return { meets, pairs, alone, text: meets ? '' : meetingText(a.length, b.length, pairs) }
}

function meetingText(countA: number, countB: number, pairs: readonly NotchPair[]): string {
  if (countA !== countB) return `One edge has ${countA} ${countA === 1 ? 'notch' : 'notches'}, the other ${countB}. Every notch needs its partner.`
  const first = pairs.findIndex((pair) => !pair.meets)
  return `Notch ${first + 1} is {mm:${Math.round(Math.abs(pairs[first]!.offMm) * 10) / 10}} off its partner. Walk the seam again, or move one of them.`
}
