import { type ProjectState } from '#db/queries/projectState.ts'
import { goesToPaper, isOpen, isTransferred, touches } from './projectState.ts'

const list = (words: readonly (string | number)[]) => (words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`)

/** What still stands between a project and its final cut, in words; empty when the final cut is open. */
export function beforeTheCut(state: ProjectState, sizeKept: boolean): string[] {
  const lines: string[] = []
  if (!sizeKept) lines.push('The size is not kept yet.')
  const newest = state.samples.at(-1)
  if (!newest) return [...lines, 'No sample is sewn yet.']
  if (newest.state === 'to-sew' || newest.state === 'to-photograph' || newest.state === 'with-fitter') lines.push(`Sample ${newest.number} is not reviewed yet.`)
  const open = state.observations.filter(isOpen)
  if (open.length === 1) lines.push(`Observation ${open[0]!.number} is still open: settle it, or let it be with a reason.`)
  if (open.length > 1) lines.push(`Observations ${list(open.map(({ number }) => number))} are still open: settle them, or let them be with a reason.`)
  const paper = state.changes.filter(goesToPaper)
  const waiting = paper.filter(({ carriedTo }) => carriedTo === null)
  if (waiting.length) lines.push(`${waiting.length === 1 ? 'One change waits' : `${waiting.length} changes wait`} for a sample that proves ${waiting.length === 1 ? 'it' : 'them'}.`)
  for (const change of paper.filter(({ carriedTo }) => carriedTo !== null)) {
    const missing = state.pieces.filter((piece) => touches(change.paper, piece) && !isTransferred(state, change.id, piece.id))
    if (missing.length) lines.push(`“${change.title}” is not drawn on ${list(missing.map(({ name }) => name))} yet.`)
  }
  return lines
}
