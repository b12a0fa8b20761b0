import { Router } from 'express'
import { readSizePlan, updateSizePlan } from '#shared/contracts/sizePlan.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { sizePlanService } from './sizePlanService.ts'

export function sizePlanRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, readSizePlan, ({ project, db }) => sizePlanService({ db }).read(project))
  serve(router, context, updateSizePlan, ({ project, body, db }) => sizePlanService({ db }).update(project, body))
  return router
}
