import { type ProjectState } from '#db/queries/projectState.ts'
import { type PieceRow } from '#db/schema/pieces.ts'
import { type PaperChange } from '#shared/fit/types.ts'

export const isOpen = ({ state }: { state: string }): boolean => state !== 'settled' && state !== 'let-be'
/** A change that goes to the paper: everything but what was declined. */
export const goesToPaper = ({ decision }: { decision: string }): boolean => decision !== 'declined'

/** How a change touches a piece: drawn on it, following a neighbour, or not at all. */
export function touches(paper: PaperChange, piece: Pick<PieceRow, 'role'>): 'drawn' | 'follows' | null {
  if (paper.steps.some(({ pieceRole, amountMm }) => pieceRole === piece.role && amountMm !== 0)) return 'drawn'
  return paper.companions.some(({ pieceRole }) => pieceRole === piece.role) ? 'follows' : null
}

/** What a change puts on this piece's paper: the largest of its steps there, or what follows, mm. */
export function amountOn(paper: PaperChange, piece: Pick<PieceRow, 'role'>): number {
  const steps = paper.steps.filter(({ pieceRole }) => pieceRole === piece.role).map(({ amountMm }) => amountMm)
  const follows = paper.companions.filter(({ pieceRole }) => pieceRole === piece.role).map(({ amountMm }) => amountMm ?? 0)
  return [...steps, ...follows].reduce((most, amount) => (Math.abs(amount) > Math.abs(most) ? amount : most), 0)
}

export const isTransferred = (state: ProjectState, changeId: string, pieceId: string): boolean => state.transfers.some((one) => one.changeId === changeId && one.pieceId === pieceId)

/** Nobody's account: who it was has left and taken their name with them. */
const nobody = '00000000-0000-0000-0000-000000000000'
/** The person an id stands for, as it is sent. */
export const personOf = (names: ReadonlyMap<string, string>, id: string | null) => (id && names.has(id) ? { id, name: names.get(id)! } : { id: nobody, name: 'Somebody who has left' })
