import { readFileSync } from 'node:fs'
import { join, resolve } from 'node:path'
import express, { type RequestHandler, Router } from 'express'
import { DomainError } from '#shared/errors.ts'

/**
 * Serves the built client: hashed assets for a year, everything else always asked for anew, and the page itself for every
 * address that is none of a file, with this response's nonce in it.
 * @param folder - where the client was built to; without a page in it every address answers that it is missing
 */
export function client(folder: string): Router {
  const root = resolve(folder)
  const router = Router()
  router.use('/assets', express.static(join(root, 'assets'), { immutable: true, maxAge: '1y', index: false }))
  // Answering with the page would hide that a script is missing, and a browser would try to run it.
  router.use('/assets', () => { throw noFile() })
  router.use(express.static(root, { index: false, cacheControl: true, maxAge: 0 }))
  router.get('/{*path}', page(root))
  return router
}

function page(root: string): RequestHandler {
  let html: string | null = null
  return (req, res) => {
    // An address with an ending was meant as a file, unless a person typed it.
    if (/\.[a-z0-9]{2,5}$/i.test(req.path) && !req.get('accept')?.includes('text/html')) throw noFile()
    html ??= readPage(root)
    res.set('Cache-Control', 'no-store').type('html').send(html.replaceAll('__CSP_NONCE__', String(res.locals.cspNonce)))
  }
}

const noFile = () => new DomainError('not-found', 'There is no such file.')

function readPage(root: string): string {
  try {
    return readFileSync(join(root, 'index.html'), 'utf8')
  } catch (cause) {
    throw new DomainError('not-found', 'The client is not built yet. Run `npm run build`.', {}, { cause })
  }
}
