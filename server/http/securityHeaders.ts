import { randomBytes } from 'node:crypto'
import { type RequestHandler } from 'express'
import helmet from 'helmet'
import { type Settings } from '../settings.ts'

/** A fresh nonce per response in `res.locals.cspNonce`, and the headers that keep a page to itself. */
export function securityHeaders(settings: Settings): RequestHandler[] {
  return [
    (_req, res, next) => {
      res.locals.cspNonce = randomBytes(16).toString('base64')
      // The camera for our own pages, everything else for nobody.
      res.set('Permissions-Policy', 'camera=(self), microphone=(), geolocation=(), payment=(), usb=(), serial=(), bluetooth=(), midi=(), display-capture=(), browsing-topics=()')
      next()
    },
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'"],
          scriptSrcAttr: ["'none'"],
          // The component library makes style elements; the page puts this nonce on each. Vue sets styles through the DOM, which needs no permission.
          styleSrc: ["'self'", (_req, res) => `'nonce-${(res as unknown as { locals: { cspNonce: string } }).locals.cspNonce}'`],
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
    }),
  ]
}
