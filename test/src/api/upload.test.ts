import { afterEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { defineRoute } from '#shared/contracts/route.ts'
import { upload } from '../../../src/api/upload.ts'

const route = defineRoute({
  id: 'photographs.upload', method: 'post', path: '/api/samples/:n/photographs', access: 'signed-in', summary: 'A photograph', upload: true, idempotent: true,
  params: z.strictObject({ n: z.number() }), body: z.strictObject({ view: z.string(), caption: z.string().optional() }), response: z.object({ id: z.string() }),
})

/** A request whose answer the test gives. */
class HeldRequest {
  static last: HeldRequest
  upload = { onprogress: (_: { loaded: number; total: number }) => {} }
  headers: Record<string, string> = {}
  opened: unknown[] = []
  form?: FormData
  status = 0
  responseText = ''
  onload = () => {}
  onerror = () => {}
  onabort = () => {}
  constructor() { HeldRequest.last = this }
  open(...opened: unknown[]) { this.opened = opened }
  setRequestHeader(name: string, value: string) { this.headers[name] = value }
  getResponseHeader() { return null }
  send(form: FormData) { this.form = form }
  abort() { this.onabort() }
  answer(status: number, body: string) {
    Object.assign(this, { status, responseText: body })
    this.onload()
  }
}

function start(signal?: AbortSignal) {
  vi.stubGlobal('XMLHttpRequest', HeldRequest)
  const parts: number[] = []
  const sent = upload(route, { params: { n: 2 }, body: { view: 'back', caption: undefined }, file: new File(['light'], 'back.jpg', { type: 'image/jpeg' }), idempotencyKey: 'back-of-two', signal, onProgress: (part) => parts.push(part) })
  return { sent, parts, request: HeldRequest.last }
}
afterEach(() => vi.unstubAllGlobals())

describe('upload', () => {
  it('sends the file beside its fields, and tells how far it is', async () => {
    const { sent, parts, request } = start()
    expect(request.opened).toEqual(['POST', '/api/samples/2/photographs'])
    expect(request.headers['Idempotency-Key']).toBe('back-of-two')
    expect([...request.form!.keys()]).toEqual(['view', 'photograph'])
    request.upload.onprogress({ loaded: 31, total: 50 })
    expect(parts).toEqual([0.62])
    request.answer(201, '{"id":"p"}')
    await expect(sent).resolves.toEqual({ id: 'p' })
  })
  it('says how far it got when the connection drops', async () => {
    const { sent, request } = start()
    request.upload.onprogress({ loaded: 62, total: 100 })
    request.onerror()
    await expect(sent).rejects.toMatchObject({ code: 'network', message: expect.stringContaining('dropped at 62 %') })
  })
  it('passes on why the server refused it', async () => {
    const { sent, request } = start()
    request.answer(413, JSON.stringify({ error: { code: 'photograph.too-large', message: 'This photograph is larger than 25 MB.', details: {} } }))
    await expect(sent).rejects.toMatchObject({ status: 413, code: 'photograph.too-large', message: 'This photograph is larger than 25 MB.' })
  })
  it('does not take an answer of another shape for a photograph', async () => {
    const { sent, request } = start()
    request.answer(201, '<!doctype html>')
    await expect(sent).rejects.toMatchObject({ code: 'answer.unreadable' })
  })
  it('stops when it is cancelled, before and while it is sent', async () => {
    const stop = new AbortController()
    const { sent } = start(stop.signal)
    stop.abort()
    await expect(sent).rejects.toMatchObject({ name: 'AbortError' })
    const late = start(AbortSignal.abort())
    expect(late.request.form).toBeUndefined()
    await expect(late.sent).rejects.toMatchObject({ name: 'AbortError' })
  })
})
