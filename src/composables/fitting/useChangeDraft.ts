import { type PaperChange } from '#shared/fit/types.ts'
import { withAmount } from '#shared/fit/withAmount.ts'
import { computed, type MaybeRefOrGetter, ref, toValue, watch } from 'vue'

/**
 * A change with its amount being turned: every paper amount follows, in the drawing and in the words, and still adds up.
 * @param given - the change as suggested or as kept
 * @param stepMm - what is drawn: 1 mm, or a sixteenth of an inch
 */
export function useChangeDraft(given: MaybeRefOrGetter<PaperChange | null>, stepMm: MaybeRefOrGetter<number>) {
  const amountMm = ref(toValue(given)?.amountMm ?? 0)
  watch(() => toValue(given)?.amountMm, (now) => { amountMm.value = now ?? 0 })
  const isChanged = computed(() => Math.abs(amountMm.value - (toValue(given)?.amountMm ?? 0)) > 0.01)
  const paper = computed(() => {
    const change = toValue(given)
    return change && isChanged.value && change.amountMm !== 0 ? withAmount(change, amountMm.value, { stepMm: toValue(stepMm) }) : change
  })
  return { amountMm, isChanged, paper }
}
