import { createServer } from 'node:net'
import { expect, it } from 'vitest'
import { freePort, whyTaken } from '#db/local/ports.ts'

it('knows a taken port from a free one, and takes the preferred one only when it is free', async () => {
  const server = createServer()
  const port = await freePort()
  expect(await whyTaken(port)).toBeNull()
  expect(await freePort(port)).toBe(port)
  await new Promise<void>((done) => { server.listen(port, '127.0.0.1', done) })
  expect(await whyTaken(port)).toBe('EADDRINUSE')
  expect(await freePort(port)).not.toBe(port)
  await new Promise((done) => server.close(done))
})
