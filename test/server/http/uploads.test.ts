import { mkdirSync, mkdtempSync, readdirSync, utimesSync, writeFileSync, existsSync, readFileSync } from 'node:fs'
import { type AddressInfo, connect } from 'node:net'
import { createServer } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import express, { Router } from 'express'
import { pino } from 'pino'
import request from 'supertest'
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { type AppContext } from '#server/context.ts'
import { errorHandler } from '#server/http/errorHandler.ts'
import { serve } from '#server/http/serve.ts'
import { sweepUploads, uploadFolder } from '#server/http/uploadFolder.ts'
import { photographLimits } from '#shared/contracts/photograph.ts'
import { defineRoute } from '#shared/contracts/route.ts'

const upload = defineRoute({
  id: 'test.upload', method: 'post', path: '/api/test', access: 'public', status: 201, upload: true, summary: 'Takes a file',
  body: z.strictObject({ view: z.enum(['front', 'back']) }), response: z.object({ bytes: z.int(), content: z.string() }),
})
const context = { settings: { mode: 'local' }, logger: pino({ level: 'silent' }) } as AppContext
const router = Router()
let fail = false
serve(router, context, upload, ({ file }) => {
  if (fail) throw new Error('the handler fails')
  return { bytes: file.bytes, content: readFileSync(file.path, 'utf8').slice(0, 20) }
})
const server = createServer(express().use(router).use(errorHandler(context.logger)))
let folder: string
beforeAll(async () => {
  folder = await uploadFolder()
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve) })
})
afterAll(() => { server.closeAllConnections(); server.close() })
beforeEach(() => { fail = false })

const send = (bytes: Buffer = Buffer.from('a photograph'), fields: Record<string, string> = { view: 'front' }, name = 'photograph') => {
  const form = request(server).post('/api/test')
  for (const [field, value] of Object.entries(fields)) form.field(field, value)
  return form.attach(name, bytes, '../../etc/passwd.jpg')
}

describe('an uploaded file', () => {
  it('is handed to the handler in a place of our own, and removed afterwards', async () => {
    expect((await send().expect(201)).body).toEqual({ bytes: 12, content: 'a photograph' })
    expect(readdirSync(folder)).toEqual([])
  })
  it('is removed when the handler fails', async () => {
    fail = true
    await send().expect(500)
    expect(readdirSync(folder)).toEqual([])
  })
  it('is removed when a field beside it is wrong', async () => {
    expect((await send(undefined, { view: 'above' }).expect(400)).body.error.details).toHaveProperty('view')
    expect((await send(undefined, { view: 'front', rights: 'all' }).expect(400)).body.error.details).toHaveProperty('rights')
    expect(readdirSync(folder)).toEqual([])
  })
  it('that is too large is refused and removed', async () => {
    const { body } = await send(Buffer.alloc(photographLimits.bytes + 1)).expect(413)
    expect(body.error).toMatchObject({ code: 'photograph.too-large', message: expect.stringContaining('25 MB') })
    await vi.waitFor(() => expect(readdirSync(folder)).toEqual([]))
  })
  it('under another name, or a second one, is refused', async () => {
    await send(undefined, undefined, 'picture').expect(400)
    await send().attach('photograph', Buffer.from('another'), 'b.jpg').expect(400)
    await vi.waitFor(() => expect(readdirSync(folder)).toEqual([]))
  })
  it('must be there', async () => {
    expect((await request(server).post('/api/test').field('view', 'front').expect(400)).body.error.code).toBe('photograph.missing')
    await request(server).post('/api/test').send({ view: 'front' }).expect(400)
  })
  it('that breaks off half-way leaves nothing', async () => {
    const socket = connect((server.address() as AddressInfo).port, '127.0.0.1')
    socket.write('POST /api/test HTTP/1.1\r\nHost: x\r\nContent-Type: multipart/form-data; boundary=b\r\nContent-Length: 100000\r\n\r\n--b\r\nContent-Disposition: form-data; name="photograph"; filename="a.jpg"\r\n\r\n')
    socket.write(Buffer.alloc(50_000, 1))
    await vi.waitFor(() => expect(readdirSync(folder)).toHaveLength(1))
    socket.destroy()
    await vi.waitFor(() => expect(readdirSync(folder)).toEqual([]))
  })
})

it('sweeps what a killed process left behind a day ago, and nothing newer', async () => {
  const [old, fresh] = [mkdtempSync(join(tmpdir(), 'proofcloth-uploads-')), mkdtempSync(join(tmpdir(), 'proofcloth-uploads-'))]
  mkdirSync(join(old, 'x'))
  writeFileSync(join(folder, 'lost'), '')
  const before = new Date(Date.now() - 25 * 3600 * 1000)
  for (const path of [old, join(folder, 'lost')]) utimesSync(path, before, before)
  await sweepUploads()
  expect([existsSync(old), existsSync(fresh), existsSync(folder), readdirSync(folder).length]).toEqual([false, true, true, 0])
})
