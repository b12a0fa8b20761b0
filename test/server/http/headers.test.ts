import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
const folder = mkdtempSync(join(tmpdir(), 'client-'))
beforeAll(async () => {
  mkdirSync(join(folder, 'assets'))
  writeFileSync(join(folder, 'index.html'), '<!doctype html><meta name="csp-nonce" content="__CSP_NONCE__"><title>Proofcloth</title>')
  writeFileSync(join(folder, 'assets', 'index-abc123.js'), 'export const n = 1')
  writeFileSync(join(folder, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>')
  t = await testApp({ env: { CLIENT_FOLDER: folder } })
})
afterAll(async () => {
  await t.close()
  rmSync(folder, { recursive: true })
})

const policy = (headers: Record<string, string>) => new Map(headers['content-security-policy']!.split(';').map((part) => [part.split(' ')[0]!, part.split(' ').slice(1).join(' ')]))

describe('the page', () => {
  it('carries this response’s nonce and the policy names the same one', async () => {
    const first = await t.anonymous.get('/').expect(200)
    const second = await t.anonymous.get('/studio/fittings').expect(200)
    const nonce = /content="([^"]+)"/.exec(first.text)![1]!
    expect(nonce.length).toBeGreaterThanOrEqual(22) // 128 bits in base64
    expect(policy(first.headers).get('style-src')).toBe(`'self' 'nonce-${nonce}'`)
    expect(second.text).not.toContain(nonce)
  })
  it('allows no inline script, no frame and no foreign origin', async () => {
    const found = policy((await t.anonymous.get('/')).headers)
    expect(found.get('script-src')).toBe("'self'")
    expect(found.get('script-src-attr')).toBe("'none'")
    expect(found.get('style-src-attr')).toBe("'none'")
    expect(found.get('default-src')).toBe("'self'")
    expect(found.get('connect-src')).toBe("'self'")
    expect(found.get('frame-ancestors')).toBe("'none'")
    expect(found.get('base-uri')).toBe("'none'")
    expect(found.get('form-action')).toBe("'self'")
    expect([...found.values()].join(' ')).not.toMatch(/unsafe/)
  })
  it('is never kept, while hashed assets are kept for a year', async () => {
    expect((await t.anonymous.get('/anything')).headers['cache-control']).toBe('no-store')
    expect((await t.anonymous.get('/assets/index-abc123.js').expect(200)).headers['cache-control']).toBe('public, max-age=31536000, immutable')
    expect((await t.anonymous.get('/icon.svg').expect(200)).headers['cache-control']).toBe('public, max-age=0')
  })
  it('does not stand in for a file that is missing', async () => {
    await t.anonymous.get('/assets/index-gone.js').expect(404)
    await t.anonymous.get('/favicon.ico').set('Accept', 'image/avif,*/*').expect(404)
    await t.anonymous.get('/projects/no.dot').set('Accept', 'text/html,*/*').expect(200)
  })
  it('is answered to GET alone', async () => {
    await t.anonymous.post('/studio').send({}).expect(404)
  })
})

describe('every answer', () => {
  it.each(['/', '/api/health', '/api/me', '/api/no-such-thing'])('of %s keeps to itself', async (path) => {
    const { headers } = await t.anonymous.get(path)
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff', 'referrer-policy': 'no-referrer', 'x-frame-options': 'DENY',
      'cross-origin-opener-policy': 'same-origin', 'cross-origin-resource-policy': 'same-origin',
    })
    expect(headers['permissions-policy']).toContain('camera=(self)')
    expect(headers['permissions-policy']).toContain('microphone=()')
    expect(headers).not.toHaveProperty('x-powered-by')
    expect(headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/)
  })
  it('of the API is never kept by a cache', async () => {
    expect((await t.owner.get('/api/me').expect(200)).headers['cache-control']).toBe('no-store')
  })
  it('has a request id of our own making, also in the error', async () => {
    const { headers, body } = await t.anonymous.get('/api/me').set('X-Request-Id', 'forged').expect(401)
    expect(body.error.requestId).toBe(headers['x-request-id'])
    expect(body.error.requestId).not.toBe('forged')
  })
})

describe('HSTS', () => {
  it('is absent without https', async () => {
    expect((await t.anonymous.get('/')).headers).not.toHaveProperty('strict-transport-security')
  })
  it('is sent with a public https address', async () => {
    const secure = await testApp({ env: { PUBLIC_URL: 'https://journal.example.org' } })
    const { headers } = await secure.anonymous.get('/api/health')
    expect(headers['strict-transport-security']).toMatch(/^max-age=\d{8}/)
    await secure.close()
  })
})
