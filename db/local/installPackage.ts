import { execFileSync, spawnSync } from 'node:child_process'
import { CommandError } from './CommandError.ts'

const isRoot = process.getuid?.() === 0
const has = (command: string) => spawnSync('sh', ['-c', `command -v ${command}`]).status === 0
const maySudo = () => !isRoot && has('sudo') && spawnSync('sudo', ['-n', 'true']).status === 0

/**
 * Installs a Debian package where that is allowed (root, or sudo without a password).
 * @throws CommandError with the line to type where it is not
 */
export function installPackage(name: string, what: string): void {
  const byHand = new CommandError(`${what} is missing. Install it with: sudo apt-get install ${name}`)
  if (!has('apt-get') || !(isRoot || maySudo())) throw byHand
  console.log(`Installing ${what} from Debian’s packages.`)
  const run = (args: string[]) => execFileSync(isRoot ? 'apt-get' : 'sudo', isRoot ? args : ['-n', 'apt-get', ...args], { stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } })
  try {
    run(['update', '-qq'])
    run(['install', '-y', '-qq', '--no-install-recommends', name])
  } catch {
    throw byHand
  }
}

/** Path of Chromium, installed when it is missing. */
export function findChromium(): string {
  const find = () => ['chromium', 'chromium-browser'].map((name) => spawnSync('sh', ['-c', `command -v ${name}`]).stdout.toString().trim()).find(Boolean)
  return find() ?? (installPackage('chromium', 'Chromium'), find() ?? fail())
}
function fail(): never {
  throw new CommandError('Chromium was installed and is still not found. Put it on the PATH as “chromium”.')
}
