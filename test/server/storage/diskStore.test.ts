import { mkdtempSync, readdirSync, rmSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { buffer } from 'node:stream/consumers'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { diskStore } from '#server/storage/diskStore.ts'
import { type PhotographStore } from '#server/storage/store.ts'

let folder: string
beforeEach(() => { folder = mkdtempSync(join(tmpdir(), 'store-')) })
afterEach(() => { rmSync(folder, { recursive: true }) })
async function all(store: PhotographStore) {
  const found = []
  for await (const entry of store.list()) found.push(entry)
  return found
}
const files = () => readdirSync(folder, { recursive: true, withFileTypes: true }).filter((entry) => entry.isFile()).map(({ name }) => name)

describe('a store on disk', () => {
  it('gives back what was put, and lists it until it is removed', async () => {
    const store = diskStore(folder)
    await store.put('ab/abcdef-full.jpg', Buffer.from('a photograph'))
    expect(await store.has('ab/abcdef-full.jpg')).toBe(true)
    const found = await store.get('ab/abcdef-full.jpg')
    expect(found!.bytes).toBe(12)
    expect((await buffer(found!.stream)).toString()).toBe('a photograph')
    expect(await all(store)).toEqual([{ key: 'ab/abcdef-full.jpg', putAt: expect.any(Date) }])
    await store.remove('ab/abcdef-full.jpg')
    await store.remove('ab/abcdef-full.jpg')
    expect(await store.get('ab/abcdef-full.jpg')).toBeNull()
    expect(await store.has('ab/abcdef-full.jpg')).toBe(false)
    expect(await all(store)).toEqual([])
  })
  it('takes the same file twice, also at once, and leaves no half file', async () => {
    const store = diskStore(folder)
    await Promise.all(Array.from({ length: 8 }, () => store.put('ab/same.jpg', Buffer.alloc(100_000, 7))))
    expect(files()).toEqual(['same.jpg'])
  })
  it('keeps its files from other people of the machine', async () => {
    await diskStore(folder).put('ab/x.jpg', Buffer.from('x'))
    expect(statSync(join(folder, 'ab/x.jpg')).mode & 0o077).toBe(0)
    expect(statSync(join(folder, 'ab')).mode & 0o077).toBe(0)
  })
  it.each(['../x', 'a/../../x', '/etc/passwd', '', 'a//b', 'a/.hidden', 'A.jpg', 'a\0b'])('refuses the key %j', async (key) => {
    const store = diskStore(folder)
    await expect(store.put(key, Buffer.from('x'))).rejects.toThrow(/wrong shape/)
    await expect(store.get(key)).rejects.toThrow(/wrong shape/)
    await expect(store.remove(key)).rejects.toThrow(/wrong shape/)
  })
})
