import { type Project } from '#shared/contracts/project.ts'
import { type StorySample } from './useStory.ts'

type SampleState = Project['samples'][number]['state']

/** State of a sample in words: "to photograph". */
export const sampleStateWords: Record<SampleState, string> = {
  'to-sew': 'to sew', 'to-photograph': 'to photograph', 'with-fitter': 'with the fitter', reviewed: 'reviewed', closed: 'closed',
}

const counting = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten', 'Eleven', 'Twelve']
/** "Four changes", "13 changes", "One change". */
export const countWords = (n: number, one: string, many = `${one}s`): string => `${counting[n] ?? n} ${n === 1 ? one : many}`

/** The four standing views every sample is photographed in. */
export const standingViews = ['front', 'back', 'left', 'right'] as const

/** Standing views a sample has no photograph of yet. */
export const missingViews = (sample: Pick<StorySample, 'photographs'>) =>
  standingViews.filter((view) => !sample.photographs.some((photograph) => photograph.view === view))

/** What a person does next with this project: words for the one primary button, and where it leads. */
export function nextStep(project: Project, samples: readonly StorySample[]): { text: string; to: string; icon?: string } | null {
  const base = `/p/${project.id}`
  const newest = samples.at(-1)
  if (project.stage === 'cut') return { text: 'Read the story', to: `${base}/story` }
  if (project.stage === 'cleared') return { text: 'Print the cutting sheet', to: `${base}/final-cut`, icon: 'print' }
  if (!project.sizeKept) return { text: 'Choose the size', to: `${base}/size`, icon: 'tape' }
  if (!newest) return { text: 'Trace the pieces', to: `${base}/pieces`, icon: 'piece' }
  const missing = missingViews(newest)
  const fitting = `${base}/samples/${newest.sample.number}`
  if (newest.sample.state === 'to-sew') return { text: `Sew sample ${newest.sample.number}`, to: fitting, icon: 'form' }
  if (newest.sample.state === 'to-photograph') {
    return { text: missing.length === 4 ? 'Start the fitting' : missing.length > 0 ? `Add the ${countWords(missing.length, 'missing photograph').toLowerCase()}` : 'Open the fitting', to: fitting, icon: 'camera' }
  }
  if (project.beforeTheCut.length === 0) return { text: 'Open the final cut', to: `${base}/final-cut`, icon: 'scissors' }
  return { text: 'Open the fitting', to: fitting, icon: 'pin' }
}
