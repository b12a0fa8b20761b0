import { type FittingObservation, type Mark } from '#shared/contracts/fitting.ts'

/** A mark as the board draws it. */
export type BoardMark = {
  /** id of the observation */
  id: string
  number: number
  kind: Mark['kind']
  shape: Mark['shape']
  points: Mark['points']
  state: FittingObservation['state']
  /** said by its pin: "Observation 3, tight across the bust, 2.0 cm, noted" */
  label: string
}
