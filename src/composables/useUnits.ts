import { fillAmounts } from '#shared/fit/amountText.ts'
import { type FormatLengthOptions, formatLength } from '#shared/units/formatLength.ts'
import { computed } from 'vue'
import { useSessionStore } from '@/stores/session.ts'

/** Writes lengths in the person's unit. Switching the unit changes what is read, never what is stored. */
export function useUnits() {
  const session = useSessionStore()
  const unit = computed(() => session.unit)
  const format = (mm: number, options: FormatLengthOptions = {}) => formatLength(mm, unit.value, options)
  /** A text of the rules module with its amounts written out. */
  const fill = (text: string) => fillAmounts(text, (mm, signed) => format(mm, { signed }))
  return { unit, format, fill, setUnit: session.setUnit }
}
