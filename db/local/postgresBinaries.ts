import { existsSync, readdirSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { CommandError } from './CommandError.ts'
import { installPackage } from './installPackage.ts'

const debianFolder = '/usr/lib/postgresql'

/** Folder with initdb and pg_ctl, and the major version in it; Debian keeps them off the PATH. */
function find(): string | null {
  const versions = existsSync(debianFolder) ? readdirSync(debianFolder).map(Number).filter((version) => version >= 13).sort((a, b) => b - a) : []
  const folders = [...versions.map((version) => join(debianFolder, String(version), 'bin')), ...(process.env.PATH ?? '').split(delimiter)]
  return folders.find((folder) => existsSync(join(folder, 'initdb')) && existsSync(join(folder, 'pg_ctl')) && existsSync(join(folder, 'postgres'))) ?? null
}

/** PostgreSQL’s programs, installed from Debian’s packages when they are missing and that is allowed. */
export function postgresBinaries(): string {
  const found = find()
  if (found) return found
  installPackage('postgresql', 'PostgreSQL')
  const now = find()
  if (!now) throw new CommandError('PostgreSQL was installed and its programs are still not found below /usr/lib/postgresql.')
  return now
}
