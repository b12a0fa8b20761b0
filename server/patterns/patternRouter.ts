import { Router } from 'express'
import { type Queryable } from '#db/client.ts'
import { createPattern, listPatterns, readPattern, removePattern, updatePattern } from '#shared/contracts/pattern.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { patternService } from './patternService.ts'

export function patternRouter(context: AppContext): Router {
  const router = Router()
  const service = (db: Queryable) => patternService({ db })
  serve(router, context, listPatterns, async ({ params, db }) => ({ patterns: await service(db).list(params.studioId) }))
  serve(router, context, createPattern, ({ params, body, db }) => service(db).create(params.studioId, body))
  serve(router, context, readPattern, ({ params, db }) => service(db).read(params.studioId, params.patternId))
  serve(router, context, updatePattern, ({ params, body, db }) => service(db).update(params.studioId, params.patternId, body))
  serve(router, context, removePattern, ({ params, user, db }) => service(db).remove(params.studioId, user.id, params.patternId))
  return router
}
