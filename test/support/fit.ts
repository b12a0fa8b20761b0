import { type Rule } from '#shared/fit/rule.ts'
import { indexRules, type RuleIndex } from '#shared/fit/reasoning/ruleIndex.ts'
import { type Diagnosis, type Finding, type FitInput, type Observation } from '#shared/fit/types.ts'

let count = 0
/** An observation; its id is made up unless given. */
export const seen = (over: Partial<Observation> & Pick<Observation, 'sign' | 'zone'>): Observation => ({ id: `o${(count += 1)}`, view: 'front', side: 'both', severity: 2, ...over })

export const fitting = (over: Partial<FitInput> = {}): FitInput => ({ garment: { kind: 'skirt' }, body: {}, pattern: { body: {} }, observations: [], answers: {}, ledger: [], ...over })

/** A rule of our own making: the real causes' names, nothing else of them. Only what matters to a test is given. */
export const rule = (cause: Rule['cause'], over: Partial<Rule> = {}): Rule => ({
  cause, title: `Change ${cause}`, sentence: `The cloth shows ${cause}.`, recognise: 'A sign.', words: [], when: { kinds: ['skirt', 'bodice', 'trousers'] }, sided: 'either',
  signs: [{ sign: 'tight', zone: 'hip', weight: 'strong', because: 'it is strained', amounts: { cloth: 1 } }], measures: [], amounts: { direction: 1, usualMm: [10, 20, 40] },
  change: {
    operation: 'seam-shift', companions: [], noCompanions: 'a made-up rule',
    steps: [{ piece: 'skirt-front', edge: 'side seam', edges: 2, share: 'width', text: 'Move {amount}.' }, { piece: 'skirt-back', edge: 'side seam', edges: 2, share: 'width', text: 'Move {amount}.' }],
  },
  limits: { leastMm: 3, mostMm: 50, beyond: 'Take another size.' }, stage: 'hip', predicts: 'It lies smooth.', recheck: ['the side seam'], source: 'common practice',
  drawing: { sign: { figure: 'front', region: [0, 0, 1, 1], strokes: [] }, change: { piece: 'skirt-front', marks: [] } },
  rivals: [], noRivals: 'a made-up rule', ...over,
} as Rule)
export const catalogueOf = (...rules: readonly Rule[]): RuleIndex => indexRules(rules)

export const causesOf = ({ findings }: Diagnosis): string[] => findings.map(({ cause }) => cause)
/** The finding of a cause; throws where there is none, with what there is instead. */
export function findingFor(diagnosis: Diagnosis, cause: string): Finding {
  const found = diagnosis.findings.find((finding) => finding.cause === cause)
  if (!found) throw new Error(`No finding ${cause}; found ${causesOf(diagnosis).join(', ') || 'nothing'}`)
  return found
}
/** Paper amounts, one number for every cut edge. */
export const edgeAmounts = ({ change }: Finding): number[] => change.steps.flatMap((step) => Array<number>(step.edges).fill(step.amountMm))
export const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0)
