import { fillAmounts } from '#shared/fit/amountText.ts'
import { type ChangeStep, type PaperChange } from '#shared/fit/types.ts'
import { computed, ref, type Ref, watch } from 'vue'

/**
 * A change with its amount being turned: every paper amount follows in proportion, in the drawing and in the words. Parts stay whole
 * millimetres only where the server splits them again; here they are shown.
 * @param paper - the change as suggested or as kept
 */
export function useChangeDraft(paper: Ref<PaperChange | null>, format: (mm: number, options?: { signed?: boolean }) => string) {
  const amountMm = ref(paper.value?.amountMm ?? 0)
  watch(() => paper.value?.amountMm, (now) => { amountMm.value = now ?? 0 })
  const factor = computed(() => (paper.value && paper.value.amountMm !== 0 ? amountMm.value / paper.value.amountMm : 1))
  const changed = computed(() => paper.value !== null && Math.abs(amountMm.value - paper.value.amountMm) > 0.01)
  const steps = computed<ChangeStep[]>(() => (paper.value?.steps ?? []).map((step) => ({ ...step, amountMm: step.amountMm * factor.value })))

  /** Words of the rules with the amounts that belong to this change turned too; measures of the piece stay. */
  function say(text: string): string {
    const own = new Set([paper.value?.amountMm ?? 0, ...(paper.value?.steps ?? []).map((step) => step.amountMm)].map((mm) => Math.round(Math.abs(mm) * 100)))
    return fillAmounts(text, (mm, signed) => format(own.has(Math.round(Math.abs(mm) * 100)) ? mm * factor.value : mm, { signed }))
  }
  return { amountMm, changed, steps, say }
}
