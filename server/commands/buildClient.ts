import { createHash } from 'node:crypto'
import { existsSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { root } from './localSettings.ts'

const stampFile = `${root}/dist/client.stamp`
const sources = ['src', 'shared', 'public', 'index.html', 'vite.config.ts', 'package-lock.json', 'tsconfig.json']

/** Builds the client, unless nothing it is made of has changed since the last time. */
export async function buildClient(): Promise<void> {
  const now = stampOf(sources)
  if (existsSync(`${root}/dist/client/index.html`) && existsSync(stampFile) && readFileSync(stampFile, 'utf8') === now) return
  console.log('Building the client.')
  // A build that is broken off must not pass for a whole one.
  rmSync(stampFile, { force: true })
  const { build } = await import('vite') // only here: loading it takes longer than the rest of a start
  await build({ root, logLevel: 'warn' })
  writeFileSync(stampFile, now)
}

/** Changes whenever a file below these paths does. */
function stampOf(paths: readonly string[]): string {
  const hash = createHash('sha256')
  const add = (path: string) => {
    const found = statSync(path)
    if (found.isDirectory()) readdirSync(path).sort().forEach((name) => add(`${path}/${name}`))
    else hash.update(path).update(readFileSync(path))
  }
  paths.forEach((path) => add(`${root}/${path}`))
  return hash.digest('hex')
}
