import { Router } from 'express'
import { confirmTracing, createPiece, listPieces, removePiece, setTransfer, startPieces, updatePiece } from '#shared/contracts/piece.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import { pieceService } from './pieceService.ts'

export function pieceRouter(context: AppContext): Router {
  const router = Router()
  serve(router, context, listPieces, ({ project, db }) => pieceService({ db }).list(project))
  serve(router, context, startPieces, ({ project, db }) => pieceService({ db }).start(project))
  serve(router, context, confirmTracing, ({ project, db }) => pieceService({ db }).lastLook(project))
  serve(router, context, createPiece, ({ project, body, db }) => pieceService({ db }).create(project, body))
  serve(router, context, updatePiece, ({ project, params, body, db }) => pieceService({ db }).update(project, params.pieceId, body))
  serve(router, context, removePiece, ({ project, params, db }) => pieceService({ db }).remove(project, params.pieceId))
  serve(router, context, setTransfer, ({ project, params, user, body, db }) => pieceService({ db }).setTransfer(project, params.pieceId, params.changeId, user.id, body.transferred))
  return router
}
