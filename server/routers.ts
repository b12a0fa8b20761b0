import { type Router } from 'express'
import { type AppContext } from './context.ts'

/** Every router behind the session, one a noun; each registers its routes with `serve`. */
export const routers = (_context: AppContext): Router[] => [
]
