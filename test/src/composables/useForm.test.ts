import { describe, expect, it, vi } from 'vitest'
import { ApiError } from '../../../src/api/call.ts'
import { useForm } from '../../../src/composables/useForm.ts'

const refusing = (failure: Error) => useForm(() => Promise.reject(failure))

describe('useForm', () => {
  it('puts each sentence at its field and says at the top that there is something below', async () => {
    const form = refusing(new ApiError(400, 'request.invalid', 'Check this field of the request: password.', { password: 'Use at least 12 characters.', tries: 3 }))
    await expect(form.submit()).resolves.toBeUndefined()
    expect(form.fields.value).toEqual({ password: 'Use at least 12 characters.' })
    expect(form.problem.value).toBe('Check what is marked below.')
  })
  it('shows the server’s own sentence for every other refusal', async () => {
    const form = refusing(new ApiError(409, 'sign-up.taken', 'This address has an account already.'))
    await form.submit()
    expect([form.problem.value, form.fields.value]).toEqual(['This address has an account already.', {}])
  })
  it('sends once, however often it is pressed, and can be sent again after that', async () => {
    let finish = () => {}
    const send = vi.fn(() => new Promise<string>((resolve) => { finish = () => resolve('sent') }))
    const form = useForm(send)
    const first = form.submit()
    await expect(form.submit()).resolves.toBeUndefined()
    expect(form.busy.value).toBe(true)
    finish()
    await expect(first).resolves.toBe('sent')
    expect([form.busy.value, send.mock.calls.length]).toEqual([false, 1])
    void form.submit()
    expect(send).toHaveBeenCalledTimes(2)
  })
  it('forgets an old complaint when it is sent again', async () => {
    const answers = [Promise.reject(new Error('The tape is torn.')), Promise.resolve()]
    const form = useForm(() => answers.shift()!)
    await form.submit()
    expect(form.problem.value).toBe('The tape is torn.')
    await form.submit()
    expect(form.problem.value).toBe('')
  })
})
