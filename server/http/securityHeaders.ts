import { randomBytes } from 'node:crypto'
import { type RequestHandler } from 'express'
import helmet from 'helmet'
import { type Settings } from '../settings.ts'

const nonceMark = '{nonce}'

/** A fresh nonce per response in `res.locals.cspNonce`, and the headers that keep a page to itself. */
export function securityHeaders(settings: Settings): RequestHandler {
  const headers = headersOf(settings)
  const policy = headers.get('Content-Security-Policy')!
  headers.delete('Content-Security-Policy')
  return (_req, res, next) => {
    const nonce = randomBytes(16).toString('base64')
    res.locals.cspNonce = nonce
    res.setHeaders(headers)
    res.setHeader('Content-Security-Policy', policy.replace(nonceMark, nonce))
    next()
  }
}

/** What helmet sets is the same for every response but for the nonce, so it is asked once and not a dozen functions per request. */
function headersOf(settings: Settings): Map<string, string> {
  // The camera for our own pages, everything else for nobody.
  const headers = new Map([['Permissions-Policy', 'camera=(self), microphone=(), geolocation=(), payment=(), usb=(), serial=(), midi=(), display-capture=(), browsing-topics=()']])
  const collector = { setHeader: (name: string, value: string) => headers.set(name, value), removeHeader: (name: string) => headers.delete(name) }
  let failed: unknown
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        // The component library makes style elements; the page puts this nonce on each. Vue sets styles through the DOM, which needs no permission.
        styleSrc: ["'self'", () => `'nonce-${nonceMark}'`],
        styleSrcAttr: ["'none'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        formAction: ["'self'"],
        baseUri: ["'none'"],
      },
    },
    strictTransportSecurity: settings.secure ? { maxAge: 365 * 24 * 3600, includeSubDomains: true } : false,
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    referrerPolicy: { policy: 'no-referrer' },
    frameguard: { action: 'deny' },
  })({} as never, collector as never, (error?: unknown) => { failed = error })
  if (failed !== undefined) throw failed
  return headers
}
