/** How causes compete, with rules of our own making: each test shows only what matters to it. */
import { describe, expect, it } from 'vitest'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type Rule, type SignPattern } from '#shared/fit/rule.ts'
import { type Strength } from '#shared/fit/weights.ts'
import { catalogueOf, causesOf, findingFor, fitting, rule, seen } from '../../support/fit.ts'

const pattern = (over: Partial<SignPattern> & Pick<SignPattern, 'sign' | 'zone'>): SignPattern => ({ weight: 'fair', because: 'it goes with it', ...over })
const check = { ask: 'Open the side seam. Does the front fall level?', yes: 'It was the width.', no: 'It was the length.' }
const [hip, waist, hem] = [seen({ id: 'hip', sign: 'tight', zone: 'hip' }), seen({ id: 'waist', sign: 'excess', zone: 'waist', direction: 'horizontal' }), seen({ id: 'hem', sign: 'rises', zone: 'hem', line: 'front' })]

describe('the fewest causes', () => {
  const wide = rule('hip-tight', { signs: [pattern({ sign: 'tight', zone: 'hip', weight: 'strong' }), pattern({ sign: 'excess', zone: 'waist' }), pattern({ sign: 'rises', zone: 'hem' })] })
  const single = (cause: Rule['cause'], sign: SignPattern['sign'], zone: SignPattern['zone'], weight: Strength = 'strong') => rule(cause, { signs: [pattern({ sign, zone, weight })] })
  it('one cause of three signs beats a cause for each', () => {
    const index = catalogueOf(wide, single('hollow-back-skirt', 'excess', 'waist'), single('side-seam-forward', 'rises', 'hem'))
    const diagnosis = diagnose(fitting({ observations: [hip, waist, hem] }), index)
    expect(causesOf(diagnosis)).toEqual(['hip-tight'])
    expect(diagnosis.findings[0]!.explains.toSorted()).toEqual(['hem', 'hip', 'waist'])
  })
  it('a sign found exactly where one cause alone puts it keeps that cause', () => {
    const index = catalogueOf(wide, single('hollow-back-skirt', 'excess', 'waist', 'decisive'))
    const diagnosis = diagnose(fitting({ observations: [hip, waist] }), index)
    expect(causesOf(diagnosis).toSorted()).toEqual(['hip-tight', 'hollow-back-skirt'])
    expect(findingFor(diagnosis, 'hip-tight').explains).toEqual(['hip'])
  })
  it('what a chosen cause accounts for no longer speaks for the other’s rivals', () => {
    const rival = single('full-seat-skirt', 'excess', 'waist', 'fair')
    const both = rule('full-seat-skirt', { signs: [...rival.signs, pattern({ sign: 'tight', zone: 'hip' })] })
    const index = catalogueOf(single('hip-tight', 'tight', 'hip'), single('hollow-back-skirt', 'excess', 'waist', 'decisive'), both)
    const rivalOf = (observations: typeof hip[]) => findingFor(diagnose(fitting({ observations }), index), 'hip-tight').rivals[0]!.confidence
    expect(rivalOf([hip, waist])).toBe(rivalOf([hip]))
  })
  it('a lone slight sign is left open, with what to look at next', () => {
    const { findings, unexplained } = diagnose(fitting({ observations: [hem] }), catalogueOf(single('side-seam-forward', 'rises', 'hem', 'slight')))
    expect(findings).toEqual([])
    expect(unexplained).toMatchObject([{ observationId: 'hem', lookNext: expect.stringMatching(/\?$/) }])
  })
  it('a sign nobody knows is left open too', () => {
    expect(diagnose(fitting({ observations: [seen({ id: 'x', sign: 'swings', zone: 'sleeve' })] }), catalogueOf(wide)).unexplained).toMatchObject([{ observationId: 'x' }])
  })
  it('a rule for another garment does not take part', () => {
    const other = rule('hip-tight', { when: { kinds: ['trousers'] } })
    expect(diagnose(fitting({ observations: [hip] }), catalogueOf(other)).findings).toEqual([])
  })
})

describe('signs', () => {
  const sure = (over: Partial<SignPattern>, observation: typeof hip) => diagnose(fitting({ observations: [observation] }), catalogueOf(rule('hip-tight', { signs: [pattern({ sign: 'tight', zone: 'hip', weight: 'strong', ...over })] }))).findings[0]?.confidence ?? 0
  it('seen with their direction speak louder than without, and not at all with another', () => {
    const seenWith = (direction?: 'horizontal' | 'vertical') => sure({ direction: 'horizontal' }, { ...hip, ...(direction && { direction }) })
    expect(seenWith('horizontal')).toBeGreaterThan(seenWith())
    expect(seenWith()).toBeGreaterThan(0)
    expect(seenWith('vertical')).toBe(0)
  })
  it('on a detail photograph fit every view, less surely', () => {
    const on = (view: 'front' | 'back' | 'detail') => sure({ view: 'front' }, { ...hip, view })
    expect(on('front')).toBeGreaterThan(on('detail'))
    expect(on('detail')).toBeGreaterThan(on('back'))
  })
  it('from the left and from the right are both from the side', () => {
    for (const view of ['left', 'right'] as const) expect(sure({ view: 'side' }, { ...hip, view })).toBeGreaterThan(0)
  })
  it('against a cause make it less sure', () => {
    const index = catalogueOf(rule('hip-tight', { signs: [pattern({ sign: 'tight', zone: 'hip', weight: 'decisive' }), pattern({ sign: 'excess', zone: 'waist', weight: 'slight', against: true })] }))
    const [alone, refused] = [[hip], [hip, waist]].map((observations) => findingFor(diagnose(fitting({ observations }), index), 'hip-tight'))
    expect(refused!.confidence).toBeLessThan(alone!.confidence)
    expect(refused!.because.some(({ speaks }) => speaks === 'against')).toBe(true)
  })
})

describe('one side of the body', () => {
  const sided = (value: Rule['sided']) => catalogueOf(rule('hip-tight', { sided: value }))
  const left = { ...hip, side: 'left' as const }
  it('stays one side: pieces unfold, left and right are traced apart', () => {
    const { change, side } = findingFor(diagnose(fitting({ observations: [left] }), sided('either')), 'hip-tight')
    expect(side).toBe('left')
    expect(change.unfold).toBe(true)
    expect(change.steps.every((step) => step.side === 'left')).toBe(true)
    expect(change.notes.join(' ')).toMatch(/unfold/)
  })
  it('is only hinted at where a cause always takes both', () => {
    const { side, change, confidence } = findingFor(diagnose(fitting({ observations: [left] }), sided('both')), 'hip-tight')
    expect([side, change.unfold]).toEqual(['both', false])
    expect(confidence).toBeLessThan(findingFor(diagnose(fitting({ observations: [hip] }), sided('both')), 'hip-tight').confidence)
  })
  it('is not made up for a difference between left and right where both look alike', () => {
    expect(diagnose(fitting({ observations: [hip] }), sided('one')).findings).toEqual([])
  })
  it('takes the side the measurements say', () => {
    const index = catalogueOf(rule('hip-full-one-side', {
      sided: 'one', measures: [{ plus: ['body:waist-to-hip'], minus: [], leftRight: 'larger-side', grades: [{ from: 6, weight: 'strong' }], amount: 1, alone: true, because: 'one side is {value} longer from waist to hip' }],
    }))
    const side = (leftMm: number, rightMm: number) => diagnose(fitting({ body: { 'waist-to-hip-left': leftMm, 'waist-to-hip-right': rightMm } }), index).findings.map((finding) => [finding.side, finding.change.amountMm])
    expect(side(212, 200)).toEqual([['left', 12]])
    expect(side(200, 212)).toEqual([['right', 12]])
    expect(side(203, 200)).toEqual([])
  })
})

describe('rivals', () => {
  const strained = pattern({ sign: 'tight', zone: 'hip', weight: 'strong' })
  const index = catalogueOf(
    rule('hip-tight', { signs: [strained], rivals: [{ cause: 'full-seat-skirt', check }] }), rule('full-seat-skirt', { signs: [strained] }),
    rule('full-abdomen-skirt', { signs: [{ ...strained, weight: 'slight' }] }),
  )
  const ask = (answers: Record<string, 'yes' | 'no'> = {}) => diagnose(fitting({ observations: [hip], answers }), index)
  it('that stay close are named with the check that tells them apart', () => {
    const [finding] = ask().findings
    expect(finding!.rivals[0]).toMatchObject({ cause: 'full-seat-skirt', confidence: finding!.confidence, tellApart: { id: 'hip-tight~full-seat-skirt', ...check } })
    expect(finding!.rivals[1]).toMatchObject({ cause: 'full-abdomen-skirt', tellApart: null })
  })
  it('move at once with the answer, and the answer is in the trace', () => {
    const yes = findingFor(ask({ 'hip-tight~full-seat-skirt': 'yes' }), 'hip-tight')
    expect(yes.confidence).toBeGreaterThan(ask().findings[0]!.confidence)
    expect(yes.because.some(({ from }) => 'answer' in from && from.answer === 'hip-tight~full-seat-skirt')).toBe(true)
    expect(yes.rivals.find(({ cause }) => cause === 'full-seat-skirt')?.confidence).toBe(0)
    expect(causesOf(ask({ 'hip-tight~full-seat-skirt': 'no' }))).toEqual(['full-seat-skirt'])
  })
  it('keep their check once it is answered, so that the answer can be taken back', () => {
    expect(findingFor(ask({ 'hip-tight~full-seat-skirt': 'no' }), 'full-seat-skirt').rivals.map(({ tellApart }) => tellApart?.id)).toContain('hip-tight~full-seat-skirt')
  })
  it('may turn a check round', () => {
    const turned = catalogueOf(rule('hip-tight', { signs: [strained], rivals: [{ cause: 'full-seat-skirt', check: { ...check, yesMeans: 'rival' } }] }), rule('full-seat-skirt', { signs: [strained] }))
    expect(causesOf(diagnose(fitting({ observations: [hip], answers: { 'hip-tight~full-seat-skirt': 'yes' } }), turned))).toEqual(['full-seat-skirt'])
  })
  it('are not raised by an answer to a check nobody asks', () => expect(ask({ 'no~such': 'yes' })).toEqual(ask()))
})

describe('order and what moves what', () => {
  const on = (cause: Rule['cause'], zone: SignPattern['zone'], over: Partial<Rule>) => rule(cause, { signs: [pattern({ sign: 'tight', zone, weight: 'strong', amounts: { cloth: 1 } })], ...over })
  const tight = (zone: 'hip' | 'waist' | 'bust' | 'sleeve' | 'whole', mm = 20) => seen({ sign: 'tight', zone, amount: { mm, as: 'cloth' } })
  it('lengths come first, then bust before waist before hip, then sleeves', () => {
    const index = catalogueOf(on('full-upper-arm', 'sleeve', { stage: 'sleeve' }), on('hip-tight', 'hip', { stage: 'hip' }), on('waist-tight', 'waist', { stage: 'waist' }), on('full-bust', 'bust', { stage: 'bust' }), on('bodice-short', 'whole', { stage: 'length' }))
    const observations = (['hip', 'sleeve', 'whole', 'waist', 'bust'] as const).map((zone) => tight(zone))
    expect(causesOf(diagnose(fitting({ observations }), index))).toEqual(['bodice-short', 'full-bust', 'waist-tight', 'hip-tight', 'full-upper-arm'])
  })
  it('a later amount is corrected by what an earlier change moves', () => {
    const index = catalogueOf(on('full-bust', 'bust', { stage: 'bust', moves: [{ cause: 'waist-tight', times: -1, note: 'The bust change widens the waist.' }] }), on('waist-tight', 'waist', { stage: 'waist' }))
    const waistAfter = (bustMm: number) => findingFor(diagnose(fitting({ observations: [tight('bust', bustMm), tight('waist', 30)] }), index), 'waist-tight').change
    expect(waistAfter(20).amountMm).toBe(10)
    expect(waistAfter(20).steps.reduce((total, { amountMm, edges }) => total + amountMm * edges, 0)).toBe(10)
    expect(waistAfter(20).notes.join(' ')).toContain('The bust change widens the waist.')
    expect(waistAfter(40).amountMm).toBe(30) // used up: asked again, not turned round
    expect(waistAfter(40).notes.join(' ')).toMatch(/asked again/)
  })
  it('a corrected amount that becomes too small is left', () => {
    const index = catalogueOf(on('full-bust', 'bust', { stage: 'bust', moves: [{ cause: 'waist-tight', times: -1, note: 'The bust change widens the waist.' }] }), on('waist-tight', 'waist', { stage: 'waist' }))
    expect(findingFor(diagnose(fitting({ observations: [tight('bust', 28), tight('waist', 30)] }), index), 'waist-tight')).toMatchObject({ advice: 'leave-it', change: { operation: 'none' } })
  })
})

describe('contradictions', () => {
  it('changes that undo each other are both held back', () => {
    const index = catalogueOf(
      rule('hip-tight', { opposite: 'hip-loose' }), rule('hip-loose', { opposite: 'hip-tight', amounts: { direction: -1, usualMm: [10, 20, 40] }, signs: [pattern({ sign: 'excess', zone: 'seat', weight: 'strong' })] }),
    )
    const diagnosis = diagnose(fitting({ observations: [hip, seen({ id: 'seat', sign: 'excess', zone: 'seat', view: 'back' })] }), index)
    expect(diagnosis.findings).toEqual([])
    expect(diagnosis.conflicts).toMatchObject([{ observationIds: ['hip', 'seat'], text: expect.stringContaining('undo each other') }])
    expect(diagnosis.unexplained).toEqual([])
  })
  it('left tight and right loose is a body that differs, not a contradiction', () => {
    const index = catalogueOf(rule('hip-tight', { opposite: 'hip-loose' }), rule('hip-loose', { opposite: 'hip-tight', signs: [pattern({ sign: 'excess', zone: 'hip', weight: 'strong' })] }))
    const observations = [seen({ sign: 'tight', zone: 'hip', side: 'left' }), seen({ sign: 'excess', zone: 'hip', side: 'right' })]
    expect(diagnose(fitting({ observations }), index).findings.map(({ cause, side }) => [cause, side])).toEqual([['hip-tight', 'left'], ['hip-loose', 'right']])
  })
  it('a tight place with folds lying across it is none: width lacks, length is spare', () => {
    const observations = [seen({ sign: 'tight', zone: 'hip' }), seen({ sign: 'excess', zone: 'hip', direction: 'horizontal' })]
    expect(diagnose(fitting({ observations }), catalogueOf(rule('hip-tight'))).conflicts).toEqual([])
  })
  it('too short and too long, higher and lower at one place are', () => {
    for (const [a, b] of [['short', 'long'], ['rises', 'drops']] as const) {
      const at = (sign: typeof a | typeof b, line?: 'front' | 'back') => seen({ sign, zone: 'hem', ...(line && { line }) })
      expect(diagnose(fitting({ observations: [at(a), at(b)] }), catalogueOf()).conflicts).toHaveLength(1)
      expect(diagnose(fitting({ observations: [at(a, 'front'), at(b, 'back')] }), catalogueOf()).conflicts).toEqual([])
    }
  })
})

describe('what the next sample should show', () => {
  const index = catalogueOf(rule('hip-tight', { signs: [pattern({ sign: 'tight', zone: 'hip', weight: 'strong', amounts: { cloth: 1 }, after: 'The side seams hang without strain.' }), pattern({ sign: 'excess', zone: 'waist' })] }))
  it('is foretold for everything the change explains', () => {
    const { predicts } = diagnose(fitting({ observations: [{ ...hip, amount: { mm: 20, as: 'cloth' } }, waist] }), index).findings[0]!
    expect(predicts).toEqual([
      { observationId: 'hip', text: 'The side seams hang without strain.', expectedMm: 0, changeMm: 20 },
      { observationId: 'waist', text: 'It lies smooth.', expectedMm: 0, changeMm: 20 },
    ])
  })
})

describe('the sample’s cloth', () => {
  const notes = (cloth: { stretchPercent?: number; finalStretchPercent?: number; stiffer?: boolean }) => diagnose(fitting({ observations: [hip], cloth }), catalogueOf(rule('hip-tight'))).findings[0]!.change.notes.join(' ')
  it('is noted where it stretches more or less than the final cloth, or is stiffer', () => {
    expect(notes({ stretchPercent: 20, finalStretchPercent: 5 })).toMatch(/more width than the sample shows/)
    expect(notes({ stretchPercent: 5, finalStretchPercent: 20 })).toMatch(/less width/)
    expect(notes({ stiffer: true })).toMatch(/stiffer/)
    expect(notes({ stretchPercent: 5, finalStretchPercent: 7 })).toBe('')
  })
})

describe('limits', () => {
  const by = (mm: number, over: Partial<Rule> = {}) => findingFor(diagnose(fitting({ observations: [{ ...hip, amount: { mm, as: 'cloth' } }] }), catalogueOf(rule('hip-tight', over))), 'hip-tight')
  it('leaves what is under the smallest worth doing, never less than 3', () => {
    expect(by(2, { limits: { leastMm: 0, mostMm: 50, beyond: 'Take another size.' } }).advice).toBe('leave-it')
    expect(by(3).advice).toBe('change')
    expect(by(5, { limits: { leastMm: 6, mostMm: 50, beyond: 'Take another size.' } }).advice).toBe('leave-it')
  })
  it('says what is better beyond the largest', () => {
    expect(by(60).change.limits.text).toMatch(/is over the \{mm:50\}.*Take another size\./)
    expect(by(50).change.limits.text).toMatch(/within the limits/)
  })
})
