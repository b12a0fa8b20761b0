import { Router } from 'express'
import { type Queryable } from '#db/client.ts'
import { changeRole, readStudio, removeMember, renameStudio } from '#shared/contracts/studio.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { studioService } from './studioService.ts'

export function studioRouter(context: AppContext): Router {
  const router = Router()
  const service = (db: Queryable) => studioService({ db })
  serve(router, context, readStudio, ({ params, db }) => service(db).read(params.studioId))
  serve(router, context, renameStudio, ({ params, body, db }) => service(db).rename(params.studioId, body.name))
  serve(router, context, changeRole, ({ params, body, user, db }) => service(db).changeRole(params.studioId, user.id, params.userId, body.role))
  serve(router, context, removeMember, ({ params, user, db }) => service(db).removeMember(params.studioId, user.id, params.userId))
  return router
}
