// Runs one of the commands beside this file (`start`, `test`, `dev` …). Nothing may be installed yet when this runs, so it is plain
// JavaScript with Node's own modules only: it installs the packages by the lock file where they are missing or older than it.
import { spawn, spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))
const at = (path) => `${root}/${path}`

/** @param {string} line */
function stop(line) {
  console.error(line)
  process.exit(1)
}

function ensurePackages() {
  const lock = createHash('sha256').update(readFileSync(at('package-lock.json'))).digest('hex')
  const stamp = at('node_modules/.proofcloth-lock')
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return
  const installed = at('node_modules/.package-lock.json')
  const isNewer = existsSync(installed) && statSync(installed).mtimeMs >= statSync(at('package-lock.json')).mtimeMs
  if (!isNewer) {
    console.log('Installing packages by the lock file. This takes about a minute.')
    const { status } = spawnSync('npm', ['ci', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error'], { cwd: root, stdio: ['ignore', 'inherit', 'inherit'] })
    if (status !== 0) stop('The packages could not be installed. Look at the lines above; a full disk or no network are the usual reasons.')
  }
  writeFileSync(stamp, lock)
}

const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
if (major < 20 || (major === 20 && minor < 19)) stop(`Proofcloth needs Node.js 20.19 or newer; this is ${process.versions.node}.`)
const [name = '', ...rest] = process.argv.slice(2)
if (!existsSync(at(`server/commands/${name}.ts`))) stop(`There is no command “${name}”.`)
ensurePackages()

const child = spawn(process.execPath, ['--import', 'tsx', at(`server/commands/${name}.ts`), ...rest], { cwd: root, stdio: 'inherit' })
// A terminal sends Ctrl-C to both; a service manager only to this one. The command ends by itself and its code is ours.
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => { if (signal !== 'SIGINT' || !process.stdin.isTTY) child.kill(signal) })
child.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)))
