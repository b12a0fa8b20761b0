import { type ProjectState } from '#db/queries/projectState.ts'
import { type ChangeRow } from '#db/schema/changes.ts'
import { type ObservationRow } from '#db/schema/observations.ts'
import { type PhotographRow } from '#db/schema/photographs.ts'
import { type SampleRow } from '#db/schema/samples.ts'
import { type Change, type FittingObservation, type Reading, type Sample } from '#shared/contracts/fitting.ts'
import { type Photograph } from '#shared/contracts/photograph.ts'
import { outcomeOf } from '#shared/fit/outcome.ts'
import { goesToPaper, isTransferred, personOf, touches } from '../projects/projectState.ts'

/** Rows of a project as they are sent. */
export function toSample({ projectId: _project, answers: _answers, createdAt, ...row }: SampleRow): Sample {
  return { ...row, createdAt: createdAt.toISOString() }
}

export function toPhotograph(row: PhotographRow, sampleNumber: number, names: ReadonlyMap<string, string>): Photograph {
  return {
    id: row.id, sampleNumber, view: row.view, caption: row.caption, width: row.width ?? 0, height: row.height ?? 0, drawing: row.drawing, pose: row.pose,
    takenBy: personOf(names, row.takenBy), createdAt: row.createdAt.toISOString(), version: row.version,
  }
}

const sampleNumberOf = (state: ProjectState, sampleId: string): number => state.samples.find(({ id }) => id === sampleId)?.number ?? 1

export function toChange(row: ChangeRow & { observationIds: string[] }, state: ProjectState): Change {
  return {
    id: row.id, sampleNumber: sampleNumberOf(state, row.sampleId), cause: row.cause, decision: row.decision, title: row.title, suggestedMm: row.suggestedMm, amountMm: row.amountMm,
    paper: row.paper, observationIds: row.observationIds, reason: row.reason, note: row.note, carriedTo: row.carriedTo, by: personOf(state.names, row.decidedBy),
    at: row.decidedAt.toISOString(), version: row.version,
    transfers: goesToPaper(row) ? state.pieces.filter((piece) => touches(row.paper, piece)).map(({ id, name }) => ({ pieceId: id, pieceName: name, transferred: isTransferred(state, row.id, id) })) : [],
  }
}

export function toObservation(row: ObservationRow, state: ProjectState): FittingObservation {
  const readings = state.readings.filter(({ observationId }) => observationId === row.id)
    .map((reading) => ({ ...reading, sampleNumber: sampleNumberOf(state, reading.sampleId) })).toSorted((a, b) => a.sampleNumber - b.sampleNumber)
  const answering = state.changes.filter((change) => goesToPaper(change) && change.carriedTo !== null && change.predictions.some(({ observationId }) => observationId === row.id))
    .toSorted((a, b) => b.carriedTo! - a.carriedTo!)
  const newest = answering[0]
  const prediction = newest?.predictions.find(({ observationId }) => observationId === row.id)
  return {
    id: row.id, number: row.number, sampleNumber: sampleNumberOf(state, row.sampleId), photographId: row.photographId, mark: row.mark,
    sign: row.sign, zone: row.zone, view: row.view, side: row.side, direction: row.direction, towards: row.towards, line: row.line, severity: row.severity,
    amount: row.amount, note: row.note, state: row.state, letBeReason: row.letBeReason, by: personOf(state.names, row.notedBy), createdAt: row.createdAt.toISOString(), version: row.version,
    predicted: newest && prediction ? { sampleNumber: newest.carriedTo!, expectedMm: prediction.expectedMm, changeMm: prediction.changeMm, text: prediction.text } : null,
    readings: readings.map((reading, i): Reading => {
      const before = readings.slice(0, i).findLast(({ amount }) => amount)?.amount ?? row.amount
      const predicted = answering.find(({ carriedTo }) => carriedTo === reading.sampleNumber)?.predictions.find(({ observationId }) => observationId === row.id)
      return {
        observationId: row.id, sampleNumber: reading.sampleNumber, gone: reading.gone, amount: reading.amount, reversed: reading.reversed, note: reading.note,
        outcome: outcomeFrom(before, reading, predicted?.changeMm ?? 0), at: reading.readAt.toISOString(), by: personOf(state.names, reading.readBy),
      }
    }),
  }
}

/** Named only where there are numbers to name it by; what is gone is settled without one. */
function outcomeFrom(before: ObservationRow['amount'], reading: { gone: boolean; reversed: boolean; amount: ObservationRow['amount'] }, predictedMm: number): Reading['outcome'] {
  if (reading.gone) return 'settled'
  if (reading.reversed) return 'overdone'
  return before && reading.amount ? outcomeOf(before, reading.amount, predictedMm).outcome : null
}
