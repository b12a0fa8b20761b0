import { Router } from 'express'
import { createOwnChange, decideChange, readLedger, takeBackChange, updateChange } from '#shared/contracts/fitting.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { changeService } from './changeService.ts'
import { ledgerService } from './ledgerService.ts'

export function changeRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, decideChange, ({ project, params, user, body, db }) => changeService({ db }).decide(project, params.number, user.id, body))
  serve(router, context, createOwnChange, ({ project, params, user, body, db }) => changeService({ db }).own(project, params.number, user.id, body))
  serve(router, context, updateChange, ({ project, params, body, db }) => changeService({ db }).update(project, params.changeId, body))
  serve(router, context, takeBackChange, ({ project, params, db }) => changeService({ db }).takeBack(project, params.changeId))
  serve(router, context, readLedger, ({ project, db }) => ledgerService({ db }).read(project.id))
  return router
}
