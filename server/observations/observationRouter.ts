import { Router } from 'express'
import { createObservation, putReading, removeObservation, removeReading, restoreObservation, updateObservation } from '#shared/contracts/fitting.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { observationService } from './observationService.ts'

export function observationRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, createObservation, ({ project, params, user, body, db }) => observationService({ db }).create(project, params.number, user.id, body))
  serve(router, context, updateObservation, ({ project, params, body, db }) => observationService({ db }).update(project, params.observationId, body))
  serve(router, context, removeObservation, ({ project, params, db }) => observationService({ db }).remove(project, params.observationId))
  serve(router, context, restoreObservation, ({ project, params, db }) => observationService({ db }).restore(project, params.observationId))
  serve(router, context, putReading, ({ project, params, user, body, db }) => observationService({ db }).putReading(project, params.number, params.observationId, user.id, body))
  serve(router, context, removeReading, ({ project, params, db }) => observationService({ db }).removeReading(project, params.number, params.observationId))
  return router
}
