import { Router } from 'express'
import { putAnswer, readFitting, readStory, startSample, updateSample } from '#shared/contracts/fitting.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { sampleService } from './sampleService.ts'

export function sampleRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, startSample, ({ project, body, db }) => sampleService({ db }).start(project, body))
  serve(router, context, readFitting, ({ project, params, db }) => sampleService({ db }).read(project, params.number))
  serve(router, context, updateSample, ({ project, params, body, db }) => sampleService({ db }).update(project, params.number, body))
  serve(router, context, putAnswer, ({ project, params, body, db }) => sampleService({ db }).answer(project, params.number, params.checkId, body.answer))
  serve(router, context, readStory, ({ project, db }) => sampleService({ db }).story(project))
  return router
}
