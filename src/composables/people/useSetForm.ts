import { type MeasurementSet, createSet, updateSet } from '#shared/contracts/wearer.ts'
import { checkEntries } from '#shared/measurements/checkEntry.ts'
import { combineReadings, readingToleranceMm } from '#shared/measurements/combineReadings.ts'
import { computed, ref, shallowRef } from 'vue'
import { ApiError, call } from '@/api/call.ts'

export type Reading = (number | null)[]

/** A dated set while it is typed: two readings a measurement, a third where they differ, and nothing lost when saving fails. */
export function useSetForm(params: { studioId: string; wearerId: string }, takenBy: string) {
  const open = ref(false)
  const setId = ref<string | null>(null)
  const version = ref(1)
  const takenOn = ref('')
  const by = ref(takenBy)
  const note = ref('')
  const readings = ref<Record<string, Reading>>({})
  const before = shallowRef<MeasurementSet | null>(null)
  const problem = ref('')
  const theirs = shallowRef<MeasurementSet | null>(null)
  const busy = ref(false)
  let key = crypto.randomUUID()

  function fill(set: MeasurementSet | null, codes: readonly string[], previous: MeasurementSet | null) {
    setId.value = set?.id ?? null
    version.value = set?.version ?? 1
    takenOn.value = set?.takenOn ?? new Date().toISOString().slice(0, 10)
    by.value = set?.takenBy ?? takenBy
    note.value = set?.note ?? ''
    const all = [...new Set([...(set?.measurements.map(({ code }) => code) ?? []), ...codes])]
    readings.value = Object.fromEntries(all.map((code) => {
      const known = set?.measurements.find((one) => one.code === code)?.readingsMm ?? []
      return [code, [known[0] ?? null, known[1] ?? null, known[2] ?? null]]
    }))
    before.value = previous
    problem.value = ''
    theirs.value = null
    key = crypto.randomUUID()
    open.value = true
  }
  function setReading(code: string, i: number, mm: number | null) {
    const row = [...(readings.value[code] ?? [null, null, null])]
    row[i] = mm
    readings.value = { ...readings.value, [code]: row }
  }
  const add = (code: string) => { if (!readings.value[code]) readings.value = { ...readings.value, [code]: [null, null, null] } }
  const typed = (code: string) => (readings.value[code] ?? []).filter((mm): mm is number => mm !== null)
  const combined = (code: string) => combineReadings(typed(code), readingToleranceMm(code))
  /** Asks for a third reading where two differ by more than the tolerance. */
  const wantsThird = (code: string) => typed(code).length >= 2 && (combined(code)?.askThird ?? false)
  const values = computed(() => Object.fromEntries(Object.keys(readings.value).flatMap((code) => {
    const value = combined(code)?.valueMm
    return value === undefined || value === null ? [] : [[code, value]]
  })))
  const questions = computed(() => checkEntries(values.value, Object.fromEntries((before.value?.measurements ?? []).map(({ code, valueMm }) => [code, valueMm]))))

  async function save(): Promise<MeasurementSet | null> {
    busy.value = true
    problem.value = ''
    const body = { takenOn: takenOn.value, takenBy: by.value, note: note.value, measurements: Object.keys(readings.value).flatMap((code) => (typed(code).length ? [{ code, readingsMm: typed(code).slice(0, 3) }] : [])) }
    try {
      const saved = setId.value
        ? await call(updateSet, { params: { ...params, setId: setId.value }, body: { ...body, version: theirs.value?.version ?? version.value } })
        : await call(createSet, { params, body, idempotencyKey: key })
      open.value = false
      return saved
    } catch (failure) {
      problem.value = failure instanceof Error ? failure.message : 'This did not reach the journal.'
      if (failure instanceof ApiError && failure.code === 'version.stale') theirs.value = failure.details.theirs as MeasurementSet
      return null
    } finally {
      busy.value = false
    }
  }
  return { open, setId, takenOn, by, note, readings, before, problem, theirs, busy, fill, add, setReading, typed, combined, wantsThird, values, questions, save, close: () => { open.value = false } }
}
export type SetForm = ReturnType<typeof useSetForm>
