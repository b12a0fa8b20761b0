import { type ProjectState } from '#db/queries/projectState.ts'
import { type ObservationRow } from '#db/schema/observations.ts'
import { type SampleRow } from '#db/schema/samples.ts'

/** Observations of earlier samples that are looked at again on this one: all that were not gone before it and are not let be. */
export function askedAgain(state: ProjectState, sample: Pick<SampleRow, 'id' | 'number'>): ObservationRow[] {
  const numberOf = new Map(state.samples.map(({ id, number }) => [id, number]))
  return state.observations.filter((observation) => {
    if (numberOf.get(observation.sampleId)! >= sample.number) return false
    const readings = state.readings.filter(({ observationId }) => observationId === observation.id)
    if (readings.some(({ sampleId }) => sampleId === sample.id)) return true
    return observation.state !== 'let-be' && !readings.some(({ gone, sampleId }) => gone && numberOf.get(sampleId)! < sample.number)
  })
}
