import { Router } from 'express'
import { createProject, listProjects, readProject, removeProject, updateProject } from '#shared/contracts/project.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { projectService } from './projectService.ts'

export function projectRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, listProjects, ({ params, query, membership, user, db }) => projectService({ db }).list(params.studioId, query, { userId: user.id, role: membership.role }))
  serve(router, context, createProject, ({ params, body, membership, user, db }) => projectService({ db }).create(params.studioId, user.id, membership.role, body))
  serve(router, context, readProject, ({ project, membership, db }) => projectService({ db }).read(project.id, membership.role))
  serve(router, context, updateProject, ({ project, membership, body, db }) => projectService({ db }).update(project.id, membership.role, body))
  serve(router, context, removeProject, ({ project, user, db }) => projectService({ db }).remove(project.id, project.studioId, user.id))
  return router
}
