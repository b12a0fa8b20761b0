import { createHash } from 'node:crypto'
import { chmodSync, existsSync, mkdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { CommandError } from './CommandError.ts'
import { canReach, handOver, isRoot, serverUserId } from './serverUser.ts'

const pointerIn = (folder: string) => join(folder, 'place')

/** Where an earlier start has put the data of a folder, or would. */
export const knownPlace = (folder: string): string => (isRoot && existsSync(pointerIn(folder)) ? readFileSync(pointerIn(folder), 'utf8').trim() : folder)

/**
 * Where the data can lie: in the folder itself, or, when root keeps its folders shut to others (a clone below /root), in a folder of
 * the system that a file in it points to.
 * @param folder - absolute; made when it is missing
 * @throws CommandError when it is another user’s
 */
export function clusterPlace(folder: string): string {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  if (!isRoot) {
    refuseOthers(folder)
    chmodSync(folder, 0o700)
    return folder
  }
  const known = knownPlace(folder)
  const place = known !== folder || canReach(dirname(folder)) ? known : elsewhere(folder)
  if (place !== known) {
    if (existsSync(join(folder, 'data'))) throw new CommandError(`The database in ${folder} cannot be reached by the user postgres since a folder above is shut. Move the project back, or open that folder: chmod o+x ${dirname(dirname(dirname(folder)))}`)
    console.log(`The user postgres cannot get into this folder, so the database lies in ${place}.`)
    writeFileSync(pointerIn(folder), `${place}\n`)
  }
  mkdirSync(place, { recursive: true, mode: 0o700 })
  refuseOthers(place)
  handOver(place)
  return place
}

const elsewhere = (folder: string) => join('/var/lib', `proofcloth-${createHash('sha256').update(folder).digest('hex').slice(0, 12)}`)

/** PostgreSQL opens only what is its own user’s; better said before than by its log. */
function refuseOthers(place: string): void {
  const data = join(place, 'data')
  const looked = existsSync(data) ? data : place
  const { uid } = statSync(looked)
  const own = uid === serverUserId() || (isRoot && looked === place && uid === 0)
  if (!own) throw new CommandError(`The database in ${place} belongs to another user of this machine (number ${uid}). Start as that user, or move the folder away to begin anew.`)
}
