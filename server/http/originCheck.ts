import { type RequestHandler } from 'express'
import { DomainError } from '#shared/errors.ts'
import { type Settings } from '../settings.ts'

const safeMethods = new Set(['GET', 'HEAD'])

/**
 * Lets a request that changes something through only when it comes from our own pages. Browsers send `Origin` with every such
 * request and `Sec-Fetch-Site` cannot be set by a page; a program that calls the API sends our own address as `Origin`.
 */
export const originCheck = (settings: Settings): RequestHandler => (req, _res, next) => {
  if (safeMethods.has(req.method)) return next()
  const site = req.get('sec-fetch-site')
  const origin = req.get('origin')
  const own = settings.publicUrl ?? `${req.protocol}://${req.get('host')}`
  const siteIsOwn = site === undefined || site === 'same-origin' || site === 'none'
  // Without a public address a development proxy may stand between: what the browser calls one origin are then two ports.
  const originIsOwn = origin === own || (settings.publicUrl === null && site === 'same-origin')
  if (siteIsOwn && originIsOwn) return next()
  next(new DomainError('request.origin', 'This request did not come from the journal’s own pages, so it was not carried out. Open the journal and do it there.'))
}
