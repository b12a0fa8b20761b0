import { createServer } from 'node:net'

const host = '127.0.0.1'

/** Why nobody can listen on a port of this machine's loopback: the system's code, such as EADDRINUSE; null when it is free. */
export const whyTaken = (port: number) => new Promise<string | null>((done) => {
  const probe = createServer().once('error', (error: NodeJS.ErrnoException) => done(error.code ?? 'unknown')).listen(port, host, () => probe.close(() => done(null)))
})

/** @param preferred - taken when it is free @returns a port of the loopback nobody listens on */
export async function freePort(preferred: number | null = null): Promise<number> {
  if (preferred && (await whyTaken(preferred)) === null) return preferred
  return new Promise((done, fail) => {
    const probe = createServer().once('error', fail).listen(0, host, () => {
      const { port } = probe.address() as { port: number }
      probe.close(() => done(port))
    })
  })
}
