import { Router } from 'express'
import { agreeToCut, clearToCut, cuttingSheetPdf, markCut, readFinalCut, updateFinalCut } from '#shared/contracts/finalCut.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { cuttingSheetFacts } from './cuttingSheetFacts.ts'
import { writeCuttingSheet } from './cuttingSheetPdf.ts'
import { finalCutService } from './finalCutService.ts'

export function finalCutRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, readFinalCut, ({ project, db }) => finalCutService({ db }).read(project))
  serve(router, context, updateFinalCut, ({ project, body, db }) => finalCutService({ db }).update(project, body))
  serve(router, context, agreeToCut, ({ project, user, body, db }) => finalCutService({ db }).agree(project, user.id, body.agreed))
  serve(router, context, clearToCut, ({ project, user, db }) => finalCutService({ db }).clear(project, user.id))
  serve(router, context, markCut, ({ project, db }) => finalCutService({ db }).cut(project))
  serve(router, context, cuttingSheetPdf, async ({ project, query, membership, res, db }) => {
    const facts = await cuttingSheetFacts(db, project, membership.role)
    res.set({ 'Content-Type': 'application/pdf', 'Content-Disposition': 'inline; filename="cutting-sheet.pdf"', 'Cache-Control': 'private, no-store' })
    await writeCuttingSheet(facts, query, res)
  })
  return router
}
