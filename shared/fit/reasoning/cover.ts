import { points } from '../weights.ts'
import { areRivals, type Candidate } from './candidates.ts'

/** What one more cause costs: more than a fair sign and less than a strong one, so that a cause is not brought in for one vague sign others explain. */
const causeCost = 6
/** What leaving an observation open costs. With the cost of a cause: a lone fair sign is enough. A sign that merely fits closes nothing. */
const openCost = 3
/** Up to this many candidates every set is tried: 2⁹ are 512. */
const mostForAll = 9
/** Two causes are tried together up to this many candidates; a fitting of six observations seldom has more worth trying. */
const mostForPairs = 24

export type Cover = {
  chosen: readonly Candidate[]
  /** column → the chosen candidate that explains it best */
  explainedBy: ReadonlyMap<string, Candidate>
}

/**
 * The fewest causes that explain what was seen: the set of candidates with the greatest sum of what each column is explained by,
 * less the cost of each cause. Few candidates are tried in every set; with more it begins with nothing and goes on adding (one, or two
 * together), exchanging and dropping while that helps. Equal sets are told apart by the catalogue's order, never by the order of the observations.
 */
export function coverObservations(candidates: readonly Candidate[]): Cover {
  const table = tabulate(withoutOutdone([...candidates].sort(byStanding)))
  let best: readonly number[] = []
  let bestValue = 0
  const improve = (tries: Iterable<readonly number[]>, settle: typeof slim): boolean => {
    const before = bestValue
    for (const next of tries) {
      const [set, value] = settle(next, table)
      if (value > bestValue) [best, bestValue] = [set, value]
    }
    return bestValue > before
  }
  const count = table.list.length
  if (count <= mostForAll) improve(everySet(count), pruned)
  else while (improve(neighbours(best, count), pruned) || improve(withPairs(best, count), slim));
  const by = explainers(best, table)
  const explainedBy = new Map<string, Candidate>()
  table.columns.forEach((column, i) => { if (by[i]! >= 0) explainedBy.set(column, table.list[by[i]!]!) })
  return { chosen: best.map((i) => table.list[i]!), explainedBy }
}

/**
 * The one with more behind it first; of equals by the catalogue's order, and one cause on several sides by what it explains: left before
 * right would answer a mirrored fitting otherwise.
 */
function byStanding(a: Candidate, b: Candidate): number {
  const seen = ({ columns }: Candidate) => [...columns.keys()].sort().join()
  return ownPoints(b) - ownPoints(a) || a.place - b.place || Number(b.side === 'both') - Number(a.side === 'both') || (seen(a) < seen(b) ? -1 : 1)
}

/** All that speaks for a cause less all that speaks against it, whatever else is chosen. */
export const ownPoints = ({ columns, bonus }: Candidate): number => [...columns.values()].reduce((sum, value) => sum + value, bonus)

/** Whoever another one equals or beats at every column and in all else could never be the better choice: left out before the search. */
function withoutOutdone(sorted: readonly Candidate[]): Candidate[] {
  const kept: Candidate[] = []
  for (const candidate of sorted) if (!kept.some((other) => outdoes(other, candidate))) kept.push(candidate)
  return kept
}
function outdoes(a: Candidate, b: Candidate): boolean {
  if (a.bonus < b.bonus || (!a.matches.size && !a.alone)) return false
  for (const [column, value] of b.columns) if ((a.columns.get(column) ?? 0) < value) return false
  return true
}

/** The candidates, strongest first, as rows of numbers: sets are weighed some thousand times. */
type Table = { list: readonly Candidate[]; columns: readonly string[]; isSeen: readonly boolean[]; rows: readonly Int32Array[]; bonus: readonly number[] }

function tabulate(list: readonly Candidate[]): Table {
  const columns = [...new Set(list.flatMap((candidate) => [...candidate.columns.keys()]))].sort()
  return {
    list, columns, isSeen: columns.map((column) => column.startsWith('seen ')), bonus: list.map((candidate) => candidate.bonus),
    rows: list.map((candidate) => Int32Array.from(columns, (column) => candidate.columns.get(column) ?? 0)),
  }
}

/** Smaller numbers first: of equal sets the one with the stronger candidates is met first. */
function* everySet(count: number): Generator<readonly number[]> {
  const all = Array.from({ length: count }, (_, i) => i)
  for (let bits = 1; bits < 2 ** count; bits++) yield all.filter((i) => bits & (1 << i))
}

const outsideOf = (set: readonly number[], count: number): number[] => Array.from({ length: count }, (_, i) => i).filter((i) => !set.includes(i))

function* neighbours(set: readonly number[], count: number): Generator<readonly number[]> {
  for (const one of outsideOf(set, count)) {
    yield [...set, one]
    for (const member of set) yield [...set.filter((other) => other !== member), one]
  }
  for (const member of set) yield set.filter((other) => other !== member)
}

/** Two causes at once that each by themselves would not pay beside those chosen. */
function* withPairs(set: readonly number[], count: number): Generator<readonly number[]> {
  const outside = outsideOf(set, count)
  if (outside.length > mostForPairs) return
  for (const [i, first] of outside.entries()) for (let j = i + 1; j < outside.length; j++) yield [...set, first, outside[j]!]
}

/** For each column the member that explains it best, −1 for none; of equals the one with more behind it, which stands first. */
function explainers(set: readonly number[], { columns, rows }: Table): Int32Array {
  const by = new Int32Array(columns.length).fill(-1)
  for (let column = 0; column < columns.length; column++) {
    let most = 0
    for (const member of set) {
      const value = rows[member]![column]!
      if (value > most || (value === most && value > 0 && member < by[column]!)) {
        most = value
        by[column] = member
      }
    }
  }
  return by
}

/** Leaves out, weakest first, whoever explains nothing better than the others or may not stand beside them. */
function prune(set: readonly number[], table: Table): readonly number[] {
  let kept = set
  for (;;) {
    const by = explainers(kept, table)
    let weakest = -1
    for (const member of kept) if (member > weakest && !earnsItsPlace(member, by, kept, table)) weakest = member
    if (weakest < 0) return kept
    kept = kept.filter((member) => member !== weakest)
  }
}

function pruned(set: readonly number[], table: Table): [readonly number[], number] {
  const kept = prune(set, table)
  return [kept, valueOf(kept, table)]
}

/** A set without the members that cost more than they explain: who comes in may make others not worth their place. */
function slim(set: readonly number[], table: Table): [readonly number[], number] {
  let [kept, value] = pruned(set, table)
  for (let slimmer = kept.length > 1; slimmer;) {
    slimmer = false
    for (const member of kept) {
      const [without, worth] = pruned(kept.filter((other) => other !== member), table)
      if (worth > value) [kept, value, slimmer] = [without, worth, true]
    }
    slimmer &&= kept.length > 1
  }
  return [kept, value]
}

/** A cause with nothing seen for it stands only where its rule allows, and never beside a rival: the measurement was taken once. */
function earnsItsPlace(member: number, by: Int32Array, set: readonly number[], { list, isSeen }: Table): boolean {
  let explains = false
  for (let column = 0; column < by.length; column++) {
    if (by[column] !== member) continue
    if (isSeen[column]) return true
    explains = true
  }
  const candidate = list[member]!
  return explains && candidate.alone && !set.some((other) => other < member && (list[other]!.rule === candidate.rule || areRivals(candidate.rule, list[other]!.rule)))
}

function valueOf(set: readonly number[], table: Table): number {
  const by = explainers(set, table)
  let value = 0
  for (let column = 0; column < by.length; column++) if (by[column]! >= 0) {
    const strength = table.rows[by[column]!]![column]!
    value += strength + (table.isSeen[column] && strength >= points.fair ? openCost : 0)
  }
  // An answer makes a cause free, never more: no cause comes in for its own sake beside one that explains the same.
  for (const member of set) value += Math.min(table.bonus[member]!, causeCost) - causeCost
  return value
}
