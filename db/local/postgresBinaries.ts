import { execFileSync } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { CommandError } from './CommandError.ts'
import { installPackage } from './installPackage.ts'

const debianFolder = '/usr/lib/postgresql'
const oldest = 14
// Debian’s package would make and start a cluster of its own, which nobody here asked for; left out this once.
const skipOwnCluster = 'mkdir -p /etc/postgresql-common/createcluster.d && echo "create_main_cluster = false" > /etc/postgresql-common/createcluster.d/proofcloth.conf'
const settingBack = 'rm -f /etc/postgresql-common/createcluster.d/proofcloth.conf'

/** Every folder with PostgreSQL’s programs, newest first; Debian keeps them off the PATH. */
function found(): { folder: string; major: number }[] {
  const versions = existsSync(debianFolder) ? readdirSync(debianFolder).map((version) => join(debianFolder, version, 'bin')) : []
  return [...versions, ...(process.env.PATH ?? '').split(delimiter)]
    .filter((folder) => ['initdb', 'pg_ctl', 'postgres'].every((program) => existsSync(join(folder, program))))
    .map((folder) => ({ folder, major: Number(/\d+/.exec(execFileSync(join(folder, 'postgres'), ['--version']).toString())?.[0]) }))
    .filter(({ major }) => major >= oldest)
    .sort((a, b) => b.major - a.major)
}

/**
 * Folder of PostgreSQL’s programs, installed from Debian’s packages when they are missing and that is allowed.
 * @param wanted - the version that has made the data, where there is some already
 * @param data - that data, for the message
 * @throws CommandError when they cannot be had, or none fits the data
 */
export function postgresBinaries(wanted: number | null, data: string): string {
  if (!found().length) installPackage(['postgresql'], 'PostgreSQL', `${skipOwnCluster} && trap '${settingBack}' EXIT`)
  const all = found()
  if (!all.length) throw new CommandError(`PostgreSQL ${oldest} or newer was not found below ${debianFolder} or on the PATH. Install it with: sudo apt-get install postgresql`)
  const fitting = wanted === null ? all[0] : all.find(({ major }) => major === wanted)
  if (!fitting) throw new CommandError(`The database in ${data} was made by PostgreSQL ${wanted} and this machine has ${[...new Set(all.map(({ major }) => major))].join(' and ')}. Install PostgreSQL ${wanted}, or move that folder away to begin anew.`)
  return fitting.folder
}
