import { type Queryable } from '#db/client.ts'
import { pieceQueries } from '#db/queries/pieces.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { type ProjectState, readProjectState } from '#db/queries/projectState.ts'
import { type PieceRow } from '#db/schema/pieces.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type Piece, type createPiece, type listPieces, type updatePiece } from '#shared/contracts/piece.ts'
import { type RouteBody, type RouteResponse } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { type SizePlan } from '#shared/fit/sizePlan.ts'
import { allReady, missingMarks, missingSentence } from '#shared/tracing/missingMarks.ts'
import { pieceTemplates, startMarks } from '#shared/tracing/pieceTemplates.ts'
import { amountOn, goesToPaper, isTransferred, touches } from '../projects/projectState.ts'
import { planOf, sizePlanService } from '../sizePlans/sizePlanService.ts'
import { staleVersion } from '../staleVersion.ts'

type Tracing = RouteResponse<typeof listPieces>

export const pieceService = ({ db }: { db: Queryable }) => ({
  async list(project: ProjectRow): Promise<Tracing> {
    const [state, plan, row] = [await readProjectState(db, project.id), await keptPlan(db, project), await projectQueries(db).find(project.id)]
    const list = state.pieces.map((piece) => toPiece(piece, state, plan))
    return { pieces: list, ready: allReady(state.pieces), lastLookAt: row?.lastLookAt?.toISOString() ?? null }
  },

  async read(project: ProjectRow, pieceId: string): Promise<Piece> {
    const piece = (await this.list(project)).pieces.find(({ id }) => id === pieceId)
    if (!piece) throw new DomainError('not-found', 'There is no such piece on this tracing list.')
    return piece
  },

  /** Fills an empty list with the usual pieces of the garment. @throws 'state.wrong' when pieces are there already */
  async start(project: ProjectRow): Promise<Tracing> {
    const { pattern } = await sizePlanService({ db }).read(project)
    await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      if ((await readProjectState(tx, project.id)).pieces.length) throw new DomainError('state.wrong', 'Pieces are on the list already. Add the missing ones by hand.')
      await pieceQueries(tx).insert(project.id, pieceTemplates(pattern.garment).map((template) => ({
        role: template.role, name: template.name, view: pattern.view, cutCount: template.cutCount, onFold: template.onFold,
        notchCount: template.notchCount, dartCount: template.dartCount, allowanceMm: pattern.allowanceMm, marks: startMarks(template),
      })))
      await projectQueries(tx).keep(project.id, { lastLookAt: null })
    })
    return this.list(project)
  },

  async create(project: ProjectRow, input: RouteBody<typeof createPiece>): Promise<Piece> {
    const id = await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const [row] = await pieceQueries(tx).insert(project.id, [input])
      await projectQueries(tx).keep(project.id, { lastLookAt: null })
      return row!.id
    })
    return this.read(project, id)
  },

  /** @throws 'version.stale' with the piece as it is now */
  async update(project: ProjectRow, pieceId: string, { version, marks, ...set }: RouteBody<typeof updatePiece>): Promise<Piece> {
    const row = await pieceQueries(db).find(project.id, pieceId)
    if (!row) throw new DomainError('not-found', 'There is no such piece on this tracing list.')
    // Ticks of two people at two marks do not contradict: only the marks named here change.
    const updated = await pieceQueries(db).update(pieceId, version, { ...set, ...(marks ? { marks: { ...row.marks, ...marks } } : {}) })
    if (!updated) throw staleVersion(await this.read(project, pieceId))
    const piece = await this.read(project, pieceId)
    if (piece.missing.length) await projectQueries(db).keep(project.id, { lastLookAt: null })
    return piece
  },

  async remove(project: ProjectRow, pieceId: string): Promise<void> {
    if (!(await pieceQueries(db).find(project.id, pieceId))) throw new DomainError('not-found', 'There is no such piece on this tracing list.')
    await pieceQueries(db).remove(pieceId)
  },

  /** The last look before the weights come off. @throws 'state.wrong' naming the pieces and the marks they lack */
  async lastLook(project: ProjectRow): Promise<Tracing> {
    const { pieces } = await readProjectState(db, project.id)
    if (!pieces.length) throw new DomainError('state.wrong', 'No piece is on the list yet. Start with the usual pieces of this garment.')
    const lacking = pieces.filter((piece) => missingMarks(piece).length > 0)
    if (lacking.length) {
      throw new DomainError('state.wrong', `Keep the weights on. ${lacking.map((piece) => `${piece.name}: ${missingSentence(piece)}`).join(' ')}`, { pieces: Object.fromEntries(lacking.map((piece) => [piece.id, missingMarks(piece)])) })
    }
    await projectQueries(db).keep(project.id, { lastLookAt: new Date() })
    return this.list(project)
  },

  async setTransfer(project: ProjectRow, pieceId: string, changeId: string, userId: string, transferred: boolean): Promise<Piece> {
    const state = await readProjectState(db, project.id)
    const [piece, change] = [state.pieces.find(({ id }) => id === pieceId), state.changes.find(({ id }) => id === changeId)]
    if (!piece || !change || !goesToPaper(change) || !touches(change.paper, piece)) throw new DomainError('not-found', 'This change does not touch this piece.')
    await pieceQueries(db).setTransfer(changeId, pieceId, userId, transferred)
    await projectQueries(db).keep(project.id, {})
    return this.read(project, pieceId)
  },
})

/** The plan the tracing follows; null while no size is kept. */
async function keptPlan(db: Queryable, project: ProjectRow): Promise<SizePlan | null> {
  const state = await sizePlanService({ db }).read(project)
  return state.keptAt ? planOf(state) : null
}

function toPiece(row: PieceRow, state: ProjectState, plan: SizePlan | null): Piece {
  const { projectId: _project, updatedAt, ...piece } = row
  const touching = state.changes.filter((change) => goesToPaper(change) && touches(change.paper, row))
  return {
    ...piece, updatedAt: updatedAt.toISOString(), sizeLabel: plan?.pieceLabels[row.role] ?? plan?.label ?? '', missing: missingMarks(row),
    changes: touching.map((change) => ({
      changeId: change.id, title: change.title, amountMm: amountOn(change.paper, row), transferred: isTransferred(state, change.id, row.id), follows: touches(change.paper, row) === 'follows',
      sampleNumber: state.samples.find(({ id }) => id === change.sampleId)?.number ?? 1,
    })),
  }
}
