import { pipeline } from 'node:stream/promises'
import { Router } from 'express'
import { readPhotographFile, removePhotograph, restorePhotograph, updatePhotograph, uploadPhotograph } from '#shared/contracts/photograph.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { photographService } from './photographService.ts'

export function photographRouter(context: AppContext): Router {
  const router = Router()
  const { storage } = context
  serve(router, context, uploadPhotograph, ({ project, params, user, body, file, createdId, db }) =>
    photographService({ db, storage }).add(project, params.number, { ...body, path: file.path, id: createdId, takenBy: user.id }))
  serve(router, context, updatePhotograph, ({ project, params, body, db }) => photographService({ db, storage }).update(project, params.photographId, body))
  serve(router, context, removePhotograph, ({ project, params, user, db }) => photographService({ db, storage }).remove(project, params.photographId, user.id))
  serve(router, context, restorePhotograph, ({ project, params, db }) => photographService({ db, storage }).restore(project, params.photographId))
  serve(router, context, readPhotographFile, async ({ project, params, req, res, db }) => {
    const { stream, bytes, tag } = await photographService({ db, storage }).open(project.id, params.photographId, params.size)
    res.set({
      ETag: tag, 'Cache-Control': 'private, max-age=86400', 'Content-Disposition': 'inline; filename="photograph.jpg"',
      // Should a browser ever be talked into opening it as a page, it may do nothing.
      'Content-Security-Policy': "default-src 'none'; sandbox", 'X-Content-Type-Options': 'nosniff', 'Cross-Origin-Resource-Policy': 'same-origin',
    })
    if (req.headers['if-none-match'] === tag) {
      stream.destroy()
      res.status(304).end()
      return
    }
    res.set({ 'Content-Type': 'image/jpeg', 'Content-Length': String(bytes) })
    await pipeline(stream, res)
  })
  return router
}
