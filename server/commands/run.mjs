// Runs one of the project's commands (`start`, `test`, `dev` …). Nothing may be installed yet when this runs, so it is plain JavaScript
// with Node's own modules only: it installs the packages by the lock file where they are missing or older than it.
import { spawn } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))))
const at = (/** @type {string} */ path) => join(root, path)
/** @type {Record<string, string>} */
const commands = {
  start: 'server/commands/start.ts', dev: 'server/commands/dev.ts', build: 'server/commands/build.ts',
  test: 'test/run/test.ts', bench: 'test/run/bench.ts', screenshots: 'test/run/screenshots.ts',
}

const [name = '', ...rest] = process.argv.slice(2)
const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
if (major < 20 || (major === 20 && minor < 19)) stop(`Proofcloth needs Node.js 20.19 or newer; this is ${process.versions.node}.`)
if (name === 'serve') await serve()
else await runSource()

/** From source, through tsx, in a process of its own. */
async function runSource() {
  const command = commands[name]
  if (!command) return stop(`There is no command “${name}”. There are: ${Object.keys(commands).join(', ')}, serve.`)
  await ensurePackages()
  // The channel between the two tells the command when this process is gone, however that came about.
  process.exit(await run(process.execPath, ['--import', 'tsx', at(command), ...rest], ['inherit', 'inherit', 'inherit', 'ipc']))
}

/** The built server in this very process; a machine that only serves has neither sources nor the tools to build. */
async function serve() {
  if (!existsSync(at('dist/server/serve.js'))) return stop('There is no build yet. Run: npm run build')
  if (!existsSync(at('node_modules'))) return stop('The packages are missing. Run: npm ci --ignore-scripts --omit=dev')
  process.chdir(root)
  process.env.NODE_ENV ??= 'production'
  process.setSourceMapsEnabled(true)
  await import(at('dist/server/serve.js'))
}

async function ensurePackages() {
  const lock = createHash('sha256').update(readFileSync(at('package-lock.json'))).digest('hex')
  const stamp = at('node_modules/.proofcloth-lock')
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return
  // npm writes this file last: somebody has installed by hand since the lock changed.
  const installed = at('node_modules/.package-lock.json')
  const isNewer = existsSync(installed) && statSync(installed).mtimeMs >= statSync(at('package-lock.json')).mtimeMs
  if (!isNewer) {
    console.log('Installing packages by the lock file. This takes about a minute.')
    // The tools are development dependencies, which npm leaves out where NODE_ENV says production.
    const code = await run('npm', ['ci', '--include=dev', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error'], ['ignore', 'inherit', 'inherit'])
    if (code !== 0) stop('The packages could not be installed; the reason is in the lines above. Mostly it is a full disk or no network.')
  }
  writeFileSync(stamp, lock)
}

/**
 * Runs a program to its end. Signals are passed on: a terminal sends Ctrl-C to both, a service manager only to this process, and
 * what runs here takes a second one as it took the first.
 * @param {string} program @param {string[]} args @param {import('node:child_process').StdioOptions} stdio
 * @returns {Promise<number>} its exit code
 */
function run(program, args, stdio) {
  return new Promise((done) => {
    const child = spawn(program, args, { cwd: root, stdio })
    let asked = false
    const pass = (/** @type {NodeJS.Signals} */ signal) => {
      asked = true
      child.kill(signal)
      // npm goes on to the end of its work and only then says that it was broken off; half of it is thrown away next time.
      if (program === 'npm') setTimeout(() => child.kill('SIGKILL'), 1000).unref()
    }
    const signals = /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])
    for (const signal of signals) process.on(signal, pass)
    child.on('error', (error) => { console.error(`${program} did not start: ${error.message}`); done(1) })
    child.on('exit', (code) => {
      for (const signal of signals) process.off(signal, pass)
      // npm is broken off by a signal; our own commands end in order and say 0.
      if (asked && code !== 0) process.exit(130)
      done(code ?? 1)
    })
  })
}

/** @param {string} line */
function stop(line) {
  console.error(line)
  process.exit(1)
}
