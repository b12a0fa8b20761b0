import { type ProjectState } from '#db/queries/projectState.ts'
import { type SampleRow } from '#db/schema/samples.ts'
import { type SizePlanState } from '#shared/contracts/sizePlan.ts'
import { clothOf } from '#shared/fit/amount.ts'
import { type FitInput, type LedgerEntry, type Observation } from '#shared/fit/types.ts'
import { goesToPaper } from '../projects/projectState.ts'
import { bodyOf, planOf } from '../sizePlans/sizePlanService.ts'
import { askedAgain } from './askedAgain.ts'

/**
 * What the rules module reads of one sample: what is open on it, what was measured, answered and changed before.
 * An earlier observation counts with its reading here; one that was not looked at again yet says nothing, and one that went the
 * other way speaks through the ledger.
 */
export function fitInput(state: ProjectState, sample: SampleRow, plan: SizePlanState): FitInput {
  const { pattern, set } = plan
  return {
    garment: pattern.garment,
    body: bodyOf(set),
    pattern: pattern.chart.length ? planOf(plan).pattern : { body: {}, ...(pattern.draftedCupMm === null ? {} : { draftedCupMm: pattern.draftedCupMm }) },
    observations: openOn(state, sample),
    answers: sample.answers,
    ledger: ledgerBefore(state, sample),
    cloth: {
      stiffer: sample.stiffer,
      ...(sample.stretchPercent === null ? {} : { stretchPercent: sample.stretchPercent }),
      ...(sample.finalStretchPercent === null ? {} : { finalStretchPercent: sample.finalStretchPercent }),
    },
  }
}

function openOn(state: ProjectState, sample: SampleRow): Observation[] {
  const here = state.observations.filter((row) => row.sampleId === sample.id && row.state !== 'let-be')
  const again = askedAgain(state, sample).flatMap((row) => {
    const reading = state.readings.find(({ observationId, sampleId }) => observationId === row.id && sampleId === sample.id)
    return reading && !reading.gone && !reading.reversed && row.state !== 'let-be' ? [{ ...row, amount: reading.amount }] : []
  })
  return [...here, ...again].map((row) => ({
    id: row.id, sign: row.sign, zone: row.zone, view: row.view, side: row.side, severity: row.severity,
    ...(row.direction && { direction: row.direction }), ...(row.towards && { towards: row.towards }), ...(row.line && { line: row.line }), ...(row.amount && { amount: row.amount }),
  }))
}

/** Per cause and side what the sample was sewn with, and every reading of what the changes answered, oldest first. */
function ledgerBefore(state: ProjectState, sample: SampleRow): LedgerEntry[] {
  const numberOf = new Map(state.samples.map(({ id, number }) => [id, number]))
  const entries = new Map<string, LedgerEntry & { readings: LedgerEntry['readings'][number][] }>()
  for (const change of state.changes.filter((one) => goesToPaper(one) && one.cause && one.carriedTo !== null && one.carriedTo <= sample.number)) {
    const key = `${change.cause}~${change.side}`
    const entry = entries.get(key) ?? { cause: change.cause!, side: change.side, amountMm: 0, unreadMm: 0, readings: [] }
    const readBefore = entry.readings.length
    entry.amountMm += change.amountMm
    for (const prediction of change.predictions) {
      const observation = state.observations.find(({ id }) => id === prediction.observationId)
      const reading = state.readings.find((one) => one.observationId === prediction.observationId && numberOf.get(one.sampleId) === change.carriedTo)
      if (!observation || !reading) continue
      // What it measured on the sample this change was decided on: the reading there, or what was noted first.
      const earlier = state.readings.find((one) => one.observationId === observation.id && one.sampleId === change.sampleId)?.amount ?? observation.amount
      const after = reading.gone ? 0 : reading.amount ? clothOf(reading.amount) * (reading.reversed ? -1 : 1) : null
      if (!earlier || after === null) continue
      entry.readings.push({ observationId: observation.id, sign: observation.sign, zone: observation.zone, beforeMm: clothOf(earlier), afterMm: after, predictedMm: prediction.changeMm })
    }
    // A look at the sample sees everything sewn into it, earlier changes too.
    entry.unreadMm = entry.readings.length > readBefore ? 0 : (entry.unreadMm ?? 0) + change.amountMm
    entries.set(key, entry)
  }
  return [...entries.values()]
}
