import { effectScope, nextTick, shallowRef } from 'vue'
import { afterEach, expect, it, vi } from 'vitest'
import { useObjectUrl } from '../../../src/composables/useObjectUrl.ts'

afterEach(() => vi.restoreAllMocks())

it('keeps one address per file and gives each back', async () => {
  let made = 0
  vi.spyOn(URL, 'createObjectURL').mockImplementation(() => `blob:${++made}`)
  const given = vi.spyOn(URL, 'revokeObjectURL').mockImplementation(() => {})
  const file = shallowRef<Blob | null>(new Blob(['front']))
  const scope = effectScope()
  const url = scope.run(() => useObjectUrl(file))!
  expect(url.value).toBe('blob:1')
  file.value = new Blob(['back'])
  await nextTick()
  expect([url.value, given.mock.calls]).toEqual(['blob:2', [['blob:1']]])
  scope.stop()
  expect(given).toHaveBeenLastCalledWith('blob:2')
})
