import { spawnSync } from 'node:child_process'
import { CommandError } from './CommandError.ts'
import { installPackage } from './installPackage.ts'

const find = () => spawnSync('sh', ['-c', 'command -v chromium || command -v chromium-browser']).stdout.toString().trim()

/** Path of Chromium: what CHROMIUM names, or Debian’s, installed when it is missing. @throws CommandError when there is none */
export function findChromium(): string {
  const known = process.env.CHROMIUM || find()
  if (known) return known
  // Without any font of the system it shows pages without letters.
  installPackage(['chromium', 'fonts-liberation'], 'Chromium')
  const now = find()
  if (!now) throw new CommandError('Chromium was installed and is still not found. Put it on the PATH as “chromium”.')
  return now
}
