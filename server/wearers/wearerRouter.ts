import { Router } from 'express'
import { type Queryable } from '#db/client.ts'
import {
  createSet, createWearer, listUsualChanges, listWearers, readWearer, removeSet, removeWearer, updateSet, updateWearer,
} from '#shared/contracts/wearer.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { usualChangesService } from './usualChangesService.ts'
import { wearerService } from './wearerService.ts'

export function wearerRouter(context: AppContext): Router {
  const router = Router()
  const service = (db: Queryable) => wearerService({ db })
  serve(router, context, listWearers, async ({ params, membership, db }) => ({ wearers: await service(db).list(params.studioId, membership) }))
  serve(router, context, createWearer, ({ params, body, db }) => service(db).create(params.studioId, body))
  serve(router, context, readWearer, ({ params, membership, db }) => service(db).read(params.studioId, params.wearerId, membership))
  serve(router, context, updateWearer, ({ params, body, db }) => service(db).update(params.studioId, params.wearerId, body))
  serve(router, context, removeWearer, ({ params, user, db }) => service(db).remove(params.studioId, user.id, params.wearerId))
  serve(router, context, createSet, ({ params, body, db }) => service(db).createSet(params.studioId, params.wearerId, body))
  serve(router, context, updateSet, ({ params, body, db }) => service(db).updateSet(params.studioId, params.wearerId, params.setId, body))
  serve(router, context, removeSet, ({ params, user, db }) => service(db).removeSet(params.studioId, user.id, params.wearerId, params.setId))
  serve(router, context, listUsualChanges, async ({ params, membership, db }) => (
    { usualChanges: await usualChangesService({ db }).list(params.studioId, params.wearerId, membership) }
  ))
  return router
}
