import { mount } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import NoticeStack from '../../../src/components/shell/NoticeStack.vue'
import { useNoticesStore } from '../../../src/stores/notices.ts'

beforeEach(() => {
  vi.useFakeTimers()
  setActivePinia(createPinia())
})
afterEach(() => { vi.useRealTimers() })

describe('notices', () => {
  it('leave after six seconds, but not from under the pointer or the focus', async () => {
    const wrapper = mount(NoticeStack)
    const notices = useNoticesStore()
    notices.show('Change taken back.', { text: 'Undo', run: () => {} })
    await vi.advanceTimersByTimeAsync(5000)
    await wrapper.get('.notice').trigger('pointerenter')
    await vi.advanceTimersByTimeAsync(60_000)
    expect(wrapper.text()).toContain('Change taken back.')
    await wrapper.get('.notice').trigger('pointerleave')
    await vi.advanceTimersByTimeAsync(5900)
    expect(wrapper.text()).toContain('Change taken back.')
    await vi.advanceTimersByTimeAsync(200)
    expect(wrapper.find('.notice').exists()).toBe(false)
  })
  it('do what they offer once and go', async () => {
    const wrapper = mount(NoticeStack)
    const run = vi.fn()
    useNoticesStore().show('Photograph removed.', { text: 'Bring it back', run })
    await wrapper.vm.$nextTick()
    await wrapper.get('.notice button').trigger('click')
    expect(run).toHaveBeenCalledTimes(1)
    expect(wrapper.find('.notice').exists()).toBe(false)
  })
  it('never pile up over the page', () => {
    const notices = useNoticesStore()
    for (const text of ['one', 'two', 'three', 'four']) notices.show(text)
    expect(notices.notices.map(({ text }) => text)).toEqual(['two', 'three', 'four'])
  })
})
