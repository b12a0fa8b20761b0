import { type Me, readMe, signIn as signInRoute, signOut as signOutRoute, signUp as signUpRoute, updateMe } from '#shared/contracts/account.ts'
import { type Unit } from '#shared/contracts/common.ts'
import { type Permission, may } from '#shared/contracts/permissions.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { useLocalStorage } from '@vueuse/core'
import { defineStore } from 'pinia'
import { computed, shallowRef } from 'vue'
import { ApiError, call } from '@/api/call.ts'

/** Who is signed in, in which studio they are working, and in which unit they read. */
export const useSessionStore = defineStore('session', () => {
  const me = shallowRef<Me | null>(null)
  const known = shallowRef(false)
  /** the server could not say who is signed in: its sentence, or empty */
  const away = shallowRef('')
  /** whether somebody was signed in here last time, so that the front door does not ask for nothing */
  const wasIn = useLocalStorage('proofcloth.was-in', false)
  const keptStudio = useLocalStorage('proofcloth.studio', '')
  const keptUnit = useLocalStorage<Unit>('proofcloth.unit', 'cm')

  const studio = computed(() => me.value?.memberships.find(({ studioId }) => studioId === keptStudio.value) ?? me.value?.memberships[0] ?? null)
  const unit = computed<Unit>(() => me.value?.units ?? keptUnit.value)
  const can = (permission: Permission) => studio.value !== null && may(studio.value.role, permission)

  function take(person: Me | null) {
    me.value = person
    known.value = true
    away.value = ''
    wasIn.value = person !== null
    if (person) keptUnit.value = person.units
  }
  /** Asks once who is signed in; afterwards it is known. When the journal cannot be reached, `away` says so and it stays unknown. */
  async function load() {
    if (known.value) return
    try {
      take(await call(readMe))
    } catch (failure) {
      if (failure instanceof ApiError && failure.status === 401) take(null)
      else away.value = failure instanceof Error ? failure.message : 'The journal could not be reached.'
    }
  }
  const signIn = async (body: RouteInput<typeof signInRoute, 'body'>) => take(await call(signInRoute, { body }))
  const signUp = async (body: RouteInput<typeof signUpRoute, 'body'>) => take(await call(signUpRoute, { body }))
  async function signOut() {
    await call(signOutRoute)
    take(null)
  }
  /** Shows the other unit at once and keeps it on the account; no stored length changes. */
  async function setUnit(next: Unit) {
    keptUnit.value = next
    if (!me.value) return
    me.value = { ...me.value, units: next }
    me.value = await call(updateMe, { body: { units: next } })
  }
  const rename = async (name: string) => { me.value = await call(updateMe, { body: { name } }) }
  const chooseStudio = (studioId: string) => { keptStudio.value = studioId }
  const forget = () => take(null)
  return { me, known, away, wasIn, studio, unit, can, load, signIn, signUp, signOut, setUnit, rename, chooseStudio, forget }
})
