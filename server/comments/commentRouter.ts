import { Router } from 'express'
import { createComment, listComments } from '#shared/contracts/project.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { commentService } from './commentService.ts'

export function commentRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, listComments, ({ project, db }) => commentService({ db }).list(project.id))
  serve(router, context, createComment, ({ project, user, body, db }) => commentService({ db }).create(project.id, user.id, body))
  return router
}
