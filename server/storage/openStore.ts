import { mkdir } from 'node:fs/promises'
import { type Settings } from '../settings.ts'
import { diskStore } from './diskStore.ts'
import { type PhotographStore } from './store.ts'

/** Opens the store the settings name. @throws when its folder cannot be made */
export async function openStore({ folder }: Settings['photoStorage']): Promise<PhotographStore> {
  await mkdir(folder, { recursive: true, mode: 0o700 })
  return diskStore(folder)
}
