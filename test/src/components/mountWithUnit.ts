import { mount } from '@vue/test-utils'
import { createPinia, setActivePinia } from 'pinia'
import { type Component } from 'vue'
import { type Unit } from '#shared/contracts/common.ts'
import { useSessionStore } from '../../../src/stores/session.ts'

/** Mounts a component with a `modelValue` that follows what it emits, for a person who reads this unit. */
export function mountWithUnit<V>(component: Component, unit: Unit, modelValue: V, props: Record<string, unknown> = {}) {
  const pinia = createPinia()
  setActivePinia(pinia)
  const session = useSessionStore()
  void session.setUnit(unit)
  const wrapper = mount(component, {
    attachTo: document.body,
    global: { plugins: [pinia] },
    props: { ...props, modelValue, 'onUpdate:modelValue': (value: V) => wrapper.setProps({ modelValue: value }) },
  })
  return { wrapper, session, value: () => wrapper.props('modelValue') as V }
}
