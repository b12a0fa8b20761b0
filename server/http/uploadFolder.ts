import { mkdtemp, readdir, rm, stat } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

const prefix = 'proofcloth-uploads-'
const staleMs = 24 * 3600 * 1000
let made: Promise<string> | null = null

/** Where uploads of this process wait while they are worked on: a folder nobody else can read or foresee. */
export const uploadFolder = (): Promise<string> => (made ??= mkdtemp(join(tmpdir(), prefix)))

/** Removes what a process that was killed has left behind, and files a request of this one has lost. */
export async function sweepUploads(now = Date.now()): Promise<void> {
  const own = made ? await made : null
  for (const name of await readdir(tmpdir())) {
    const path = join(tmpdir(), name)
    if (!name.startsWith(prefix)) continue
    if (path !== own) await removeStale(path, now)
    else for (const file of await readdir(path)) await removeStale(join(path, file), now)
  }
}

async function removeStale(path: string, now: number): Promise<void> {
  const found = await stat(path).catch(() => null) // gone meanwhile
  // Another user's folder is none of ours, whatever it is called.
  if (found && found.uid === process.getuid?.() && now - found.mtimeMs > staleMs) await rm(path, { recursive: true, force: true })
}
