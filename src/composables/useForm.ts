import { ref, shallowRef } from 'vue'
import { ApiError } from '@/api/call.ts'

/** A form that is sent as a whole: busy while it is sent, the server's sentence when it is refused, and one sentence per field. */
export function useForm<T>(send: () => Promise<T>) {
  const busy = ref(false)
  const problem = ref('')
  const fields = shallowRef<Readonly<Record<string, string>>>({})
  /** Sends; answers undefined when it was refused. */
  async function submit(): Promise<T | undefined> {
    if (busy.value) return undefined
    busy.value = true
    problem.value = ''
    fields.value = {}
    try {
      return await send()
    } catch (failure) {
      problem.value = failure instanceof Error ? failure.message : 'This did not reach the journal.'
      if (failure instanceof ApiError && failure.code === 'request.invalid') {
        const refused = Object.entries(failure.details).filter((entry): entry is [string, string] => typeof entry[1] === 'string')
        fields.value = Object.fromEntries(refused)
        // The server names fields as programs do; the form shows each sentence at its field.
        if (refused.length) problem.value = refused.length === 1 ? 'Check what is marked below.' : 'Check the fields marked below.'
      }
      return undefined
    } finally {
      busy.value = false
    }
  }
  return { busy, problem, fields, submit }
}
