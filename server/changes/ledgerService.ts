import { type Queryable } from '#db/client.ts'
import { type ProjectState, readProjectState } from '#db/queries/projectState.ts'
import { type readLedger } from '#shared/contracts/fitting.ts'
import { type RouteResponse } from '#shared/contracts/route.ts'
import { pieceWords } from '#shared/fit/vocabulary.ts'
import { goesToPaper, isTransferred } from '../projects/projectState.ts'

type Ledger = RouteResponse<typeof readLedger>
type LedgerPiece = Ledger['pieces'][number]

/** Everything changed so far, piece by piece, with what it adds up to at each edge. */
export const ledgerService = ({ db }: { db: Queryable }) => ({
  async read(projectId: string): Promise<Ledger> {
    return ledgerOf(await readProjectState(db, projectId))
  },
})

export function ledgerOf(state: ProjectState): Ledger {
  const numberOf = new Map(state.samples.map(({ id, number }) => [id, number]))
  const byRole = new Map<string, LedgerPiece>()
  for (const change of state.changes.filter(goesToPaper)) {
    for (const step of change.paper.steps.filter(({ amountMm }) => amountMm !== 0)) {
      const piece = state.pieces.find(({ role }) => role === step.pieceRole)
      const entry = byRole.get(step.pieceRole) ?? { pieceId: piece?.id ?? null, pieceRole: step.pieceRole, pieceName: piece?.name ?? pieceWords[step.pieceRole], lines: [], totals: [] }
      entry.lines.push({
        changeId: change.id, sampleNumber: numberOf.get(change.sampleId) ?? 1, carriedTo: change.carriedTo, title: change.title, edge: step.edge, amountMm: step.amountMm, side: step.side,
        transferred: piece ? isTransferred(state, change.id, piece.id) : false,
      })
      byRole.set(step.pieceRole, entry)
    }
  }
  for (const entry of byRole.values()) entry.totals = totalsOf(entry.lines)
  return { pieces: [...byRole.values()] }
}

/** What each edge adds up to: right and left apart as soon as one change was for one side only, because the paper then differs. */
export function totalsOf(lines: LedgerPiece['lines']): LedgerPiece['totals'] {
  return [...new Set(lines.map(({ edge }) => edge))].flatMap((edge) => {
    const here = lines.filter((line) => line.edge === edge)
    const sides = here.every(({ side }) => side === 'both') ? ['both' as const] : ['right' as const, 'left' as const]
    return sides.flatMap((side) => {
      const lying = here.filter((line) => line.side === 'both' || line.side === side)
      return lying.length === 0 ? [] : [{ edge, side, amountMm: lying.reduce((sum, { amountMm }) => sum + amountMm, 0) }]
    })
  })
}
