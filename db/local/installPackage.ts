import { execFileSync, spawnSync } from 'node:child_process'
import { CommandError } from './CommandError.ts'

const isRoot = process.getuid?.() === 0
const has = (command: string) => spawnSync('sh', ['-c', `command -v ${command}`]).status === 0
const maySudo = () => has('sudo') && spawnSync('sudo', ['-n', 'true']).status === 0

/**
 * Installs Debian packages where that is allowed (root, or sudo without a password).
 * @param what - the thing as a person calls it
 * @param before - shell line to run first, with the same rights
 * @throws CommandError with the line to type where it is not allowed or goes wrong
 */
export function installPackage(names: readonly string[], what: string, before = 'true'): void {
  const byHand = `apt-get install ${names.join(' ')}`
  if (!has('apt-get') || !(isRoot || maySudo())) throw new CommandError(`${what} is missing. Install it with: sudo ${byHand}`)
  console.log(`Installing ${what} from Debian’s packages. This takes a minute or two.`)
  // Settings somebody changed on this machine stay as they are; a question would wait for an answer that cannot come.
  const install = `apt-get install -y -qq --no-install-recommends -o Dpkg::Options::=--force-confdef -o Dpkg::Options::=--force-confold ${names.join(' ')}`
  const script = `export DEBIAN_FRONTEND=noninteractive; ${before} && apt-get update -qq && ${install}`
  const [program, args] = isRoot ? ['sh', ['-c', script]] : ['sudo', ['-n', 'sh', '-c', script]]
  try {
    execFileSync(program as string, args as string[], { stdio: ['ignore', 'ignore', 'pipe'] })
  } catch (error) {
    const said = String((error as { stderr?: Buffer }).stderr ?? '').split('\n').find((line) => /^(E:|dpkg: error)/.test(line))
    throw new CommandError(`${what} could not be installed (${said ?? 'no reason given'}). Install it with: sudo ${byHand}`)
  }
}
