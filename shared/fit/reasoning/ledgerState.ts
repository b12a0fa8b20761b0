import { leastChangeMm } from '../amount.ts'
import { type Rule } from '../rule.ts'
import { type LedgerEntry, type LedgerReading, type Observation, type Sign } from '../types.ts'
import { type CandidateSide } from './matchSign.ts'
import { holdResponse } from './response.ts'
import { listOf } from './ruleIndex.ts'

export type LedgerState = {
  entry: LedgerEntry
  rule: Rule
  side: CandidateSide
  /** whole amount in the sample so far, unsigned */
  doneMm: number
  status: 'not-looked' | 'settled' | 'better' | 'same' | 'worse' | 'overdone'
  /** held between its bounds; 1 where nothing was read */
  response: number
  /** cloth still to change, mm; below zero the overshoot */
  remainingMm: number
  /** the reading all this rests on */
  reading: LedgerReading | null
}

export const sideOfEntry = (side: LedgerEntry['side']): CandidateSide => (side === 'left' || side === 'right' ? side : 'both')

/** Several changes for one cause on one side are one change made in steps. */
export function mergeEntries(entries: readonly LedgerEntry[]): LedgerEntry[] {
  const merged = new Map<string, LedgerEntry>()
  for (const entry of entries) {
    const key = `${entry.cause} ${sideOfEntry(entry.side)}`
    const known = merged.get(key)
    merged.set(key, known ? { ...known, amountMm: known.amountMm + entry.amountMm, unreadMm: (known.unreadMm ?? 0) + (entry.unreadMm ?? 0), readings: [...known.readings, ...entry.readings] } : entry)
  }
  return [...merged.values()]
}

/** What the samples since a change say about it. */
export function ledgerState(entry: LedgerEntry, rule: Rule): LedgerState {
  const known = { entry, rule, side: sideOfEntry(entry.side), doneMm: Math.abs(entry.amountMm) }
  const chains = chainsOf(entry.readings, rule)
  const main = chains[0]
  const last = main?.at(-1)
  if (!last) return { ...known, status: 'not-looked', response: 1, remainingMm: 0, reading: null }
  const seen = statusOf(main![0]!, last)
  // What was put in or taken back since the last look makes that reading old. That a change made it worse stays true of its cause.
  const status = seen !== 'worse' && Math.abs(entry.unreadMm ?? 0) > 0 ? 'not-looked' : seen
  return { ...known, status, response: pooledResponse(chains), remainingMm: last.afterMm, reading: last }
}

/** Worse is told from the last sample alone; hardly answered only where all the samples together moved nothing. */
function statusOf(first: LedgerReading, { beforeMm, afterMm }: LedgerReading): LedgerState['status'] {
  if (afterMm <= -leastChangeMm) return 'overdone'
  if (afterMm < leastChangeMm) return 'settled'
  if (afterMm - beforeMm >= leastChangeMm) return 'worse'
  return first.beforeMm - afterMm < leastChangeMm ? 'same' : 'better'
}

/** The readings of each observation, oldest first; those whose sign measures the cause itself before the rest, larger ones first. */
function chainsOf(readings: readonly LedgerReading[], rule: Rule): LedgerReading[][] {
  const byObservation = new Map<string, LedgerReading[]>()
  for (const reading of readings) byObservation.set(reading.observationId, [...byObservation.get(reading.observationId) ?? [], reading])
  const chains = [...byObservation.values()].sort((a, b) => b[0]!.beforeMm - a[0]!.beforeMm || (a[0]!.observationId < b[0]!.observationId ? -1 : 1))
  const measures = chains.filter(([first]) => rule.signs.some((pattern) => pattern.amounts && listOf(pattern.sign).includes(first!.sign) && listOf(pattern.zone).includes(first!.zone)))
  return measures.length ? measures : chains
}

/**
 * Response of the paper over every sample: cloth taken away for each millimetre put in. A later prediction already allowed for the
 * response known by then, so what was put in is that prediction divided by it.
 */
function pooledResponse(chains: readonly LedgerReading[][]): number {
  let taken = 0
  let put = 0
  for (const chain of chains) {
    let known = 1
    let [chainTaken, chainPut] = [0, 0]
    for (const { beforeMm, afterMm, predictedMm } of chain) {
      if (predictedMm <= 0) continue
      chainTaken += beforeMm - afterMm
      chainPut += predictedMm / known
      known = holdResponse(chainTaken / chainPut)
    }
    taken += chainTaken
    put += chainPut
  }
  return put > 0 ? holdResponse(taken / put) : 1
}

const reverse: Partial<Record<Sign, readonly Sign[]>> = {
  tight: ['excess', 'gaping'], binds: ['excess'], 'drag-lines': ['excess'], excess: ['tight', 'drag-lines', 'gaping'], gaping: ['tight', 'excess'],
  short: ['long'], long: ['short'], rises: ['drops'], drops: ['rises'],
}

/** Whether an observation is the other side of what an overdone change was made for. */
export const isReversal = (reading: LedgerReading, observation: Observation): boolean =>
  observation.id === reading.observationId || (observation.zone === reading.zone && (reverse[reading.sign]?.includes(observation.sign) ?? false))
