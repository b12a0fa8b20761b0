import { Router } from 'express'
import { type Queryable } from '#db/client.ts'
import {
  changePassword, endSession, listSessions, readMe, requestReset, resetPassword, signIn, signOut, signUp, updateMe,
} from '#shared/contracts/account.ts'
import { type AppContext } from '../context.ts'
import { serve } from '../http/serve.ts'
import * as session from '../http/sessions.ts'
import { accountService } from './accountService.ts'
import { resetMail } from './resetMail.ts'

export function accountRouter(context: AppContext): Router {
  const router = Router()
  const sendResetMail = resetMail(context)
  const service = (db: Queryable) => accountService({ db, sendResetMail })

  serve(router, context, signUp, async ({ body, db, req }) => {
    const userId = await service(db).signUp(body)
    await session.startSession(req, userId)
    return service(db).me(userId)
  })
  serve(router, context, signIn, async ({ body, db, req }) => {
    const userId = await service(db).signIn(body.email, body.password)
    await session.startSession(req, userId)
    return service(db).me(userId)
  })
  serve(router, context, signOut, async ({ user, db, req, res }) => {
    if (user) await service(db).signedOut(user.id)
    await session.endSession(req, res, context.settings.secure)
  })
  serve(router, context, readMe, ({ user, db }) => service(db).me(user.id))
  serve(router, context, updateMe, ({ user, body, db }) => service(db).update(user.id, body))
  serve(router, context, changePassword, async ({ user, body, db, req }) => {
    await service(db).changePassword(user.id, body.current, body.next)
    await session.startSession(req, user.id)
  })
  serve(router, context, listSessions, async ({ user, db, req }) => ({ sessions: await service(db).sessions(user.id, req.sessionID) }))
  serve(router, context, endSession, async ({ user, params, db }) => service(db).endSession(user.id, params.sessionId))
  serve(router, context, requestReset, ({ body, db }) => service(db).requestReset(body.email))
  serve(router, context, resetPassword, ({ body, db }) => service(db).resetPassword(body.token, body.password))
  return router
}
