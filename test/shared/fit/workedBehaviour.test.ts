/**
 * The module's worked behaviour, with the whole catalogue competing. Inputs and answers are consistency values: the arithmetic is ours, from
 * the rules cited (width divided by the seams there are, Pattern Alterations, Central Washington University, ch. 17; length never divided, common practice).
 */
import { describe, expect, it } from 'vitest'
import { diagnose } from '#shared/fit/diagnose.ts'
import { causesOf, edgeAmounts, findingFor, fitting, seen, sum } from '../../support/fit.ts'

describe('a full bust', () => {
  const bodice = fitting({
    garment: { kind: 'bodice' }, body: { bust: 1020, 'high-bust': 920 }, pattern: { body: {}, draftedCupMm: 50 },
    observations: [
      seen({ id: 'lines', sign: 'drag-lines', zone: 'bust', towards: 'side-seam' }), seen({ id: 'edge', sign: 'gaping', zone: 'armhole' }),
      seen({ id: 'hem', sign: 'rises', zone: 'hem', line: 'front' }),
    ],
  })
  it('is one finding that explains lines, armhole and hem', () => {
    const diagnosis = diagnose(bodice)
    expect(causesOf(diagnosis)).toEqual(['full-bust'])
    expect(diagnosis.findings[0]!.explains.toSorted()).toEqual(['edge', 'hem', 'lines'])
    expect(diagnosis.unexplained).toEqual([])
    expect(diagnosis.conflicts).toEqual([])
  })
  it('adds 50 over the front, 25 on the half: (1020 − 920) − 50', () => { // choice of size by the high bust: Texas E-372
    const { change } = findingFor(diagnose(bodice), 'full-bust')
    expect(change).toMatchObject({ amountMm: 50, amountFrom: 'measurements', operation: 'full-bust' })
    expect(change.steps.filter(({ amountMm }) => amountMm !== 0)).toMatchObject([{ pieceRole: 'bodice-front', amountMm: 25, edges: 2 }])
  })
  it('is the surest thing there', () => expect(findingFor(diagnose(bodice), 'full-bust').confidence).toBeGreaterThan(0.8))
})

describe('a fold under the back waist', () => {
  const skirt = fitting({
    garment: { kind: 'skirt', waist: 'fitted' },
    observations: [seen({ sign: 'excess', zone: 'waist', direction: 'horizontal', line: 'centre-back', view: 'back', side: 'centre', amount: { mm: 8, as: 'fold-depth' } })],
  })
  const finding = () => findingFor(diagnose(skirt), 'hollow-back-skirt')
  it('of 8 takes 16 of cloth at the centre back, to nothing at the side seam', () => { // USDA, Fitting Dresses: trim the skirt top at the centre back
    expect(finding().change).toMatchObject({ amountMm: -16, amountFrom: 'measured on sample' })
    expect(finding().change.steps).toMatchObject([{ pieceRole: 'skirt-back', amountMm: -16, taper: 'to nothing at the side seam' }])
    expect(causesOf(diagnose(skirt))).toHaveLength(1)
  })
  it('says that a fold holds twice its depth', () => expect(finding().because[0]!.text).toContain('A fold {mm:8} deep holds {mm:16} of cloth'))
  it('leaves the front alone and keeps the length of the waistband', () => {
    expect(finding().change.steps.map(({ pieceRole }) => pieceRole)).not.toContain('skirt-front')
    expect(finding().change.companions.find(({ pieceRole }) => pieceRole === 'waistband')?.text).toMatch(/keep/i)
  })
})

describe('side seams that strain at the hip, 40 short all round', () => {
  const strained = seen({ sign: 'tight', zone: 'hip', line: 'side-seam', amount: { mm: 40, as: 'cloth' } })
  it('gain 10 on each of four edges', () => { // CWU ch. 17: total divided by the seams available
    const finding = findingFor(diagnose(fitting({ garment: { kind: 'skirt', waist: 'fitted' }, observations: [strained] })), 'hip-tight')
    expect(finding.change.amountMm).toBe(40)
    expect(edgeAmounts(finding).filter(Boolean)).toEqual([10, 10, 10, 10])
  })
  it('keep a waist that has ease enough, and say so', () => {
    const note = (finished: number) => findingFor(diagnose(fitting({
      garment: { kind: 'skirt', waist: 'fitted' }, observations: [strained], body: { waist: 720 }, pattern: { body: {}, finished: { waist: finished } },
    })), 'hip-tight').change.notes.join(' ')
    expect(note(760)).not.toBe(note(722))
  })
  it('take the casing along only where the top edge would not pass the hip', () => { // casing must pass over the hips: common practice
    const companions = (finished?: number) => findingFor(diagnose(fitting({
      garment: { kind: 'skirt', waist: 'elastic' }, observations: [strained], body: { hip: 1040 }, pattern: { body: {}, ...(finished && { finished: { waist: finished } }) },
    })), 'hip-tight').change.companions.filter(({ pieceRole }) => pieceRole === 'casing' || pieceRole === 'waistband')
    expect(companions(1000).map(({ amountMm }) => amountMm)).toContain(40)
    expect(companions(1060).filter(({ amountMm }) => amountMm)).toEqual([])
    expect(companions().length).toBeGreaterThan(0)
  })
})

describe('a right shoulder that sits 12 lower', () => {
  const bodice = fitting({
    garment: { kind: 'bodice' },
    observations: [
      seen({ sign: 'drag-lines', zone: 'neck', towards: 'armhole', side: 'right' }),
      seen({ sign: 'drops', zone: 'shoulder', side: 'right', amount: { mm: 12, as: 'shift' } }),
    ],
  })
  it('changes the right side only, with left and right traced apart', () => {
    const diagnosis = diagnose(bodice)
    expect(diagnosis.findings).toHaveLength(1)
    const [finding] = diagnosis.findings
    expect(['low-shoulder', 'sloping-shoulders']).toContain(finding!.cause)
    expect(finding!.side).toBe('right')
    expect(finding!.change.unfold).toBe(true)
    expect(finding!.change.steps.every(({ side }) => side === 'right')).toBe(true)
    expect(finding!.change.notes.join(' ')).toMatch(/apart/)
  })
  it('lowers the tip on front and back by 12, and the armhole with it', () => {
    const { change } = diagnose(bodice).findings[0]!
    for (const pieceRole of ['bodice-front', 'bodice-back']) {
      const steps = change.steps.filter((step) => step.pieceRole === pieceRole)
      expect(steps.map(({ amountMm }) => Math.abs(amountMm)), pieceRole).toContain(12)
    }
    expect(change.steps.map(({ text, edge }) => text + edge).join(' ')).toMatch(/underarm|armhole/)
  })
})

describe('the next sample', () => {
  const sample2 = (afterMm: number, observations = [seen({ id: 'hip', sign: 'tight', zone: 'hip', amount: { mm: 6, as: 'cloth' } })]) => diagnose(fitting({
    observations, ledger: [{ cause: 'hip-tight', amountMm: 20, side: 'both', readings: [{ observationId: 'hip', sign: 'tight', zone: 'hip', beforeMm: 20, afterMm, predictedMm: 20 }] }],
  }))
  it('still 6 short after 20: the cloth answers 0.7 to 1, so 9 more, 29 in all', () => {
    const finding = findingFor(sample2(6), 'hip-tight')
    expect(finding.response).toMatchObject({ value: 0.7, soFarMm: 20 })
    expect(finding.change.amountMm).toBe(9)
    expect(finding.response!.text).toContain('{mm:29} in all')
    expect(sum(edgeAmounts(finding))).toBe(9)
  })
  it('knows it from the reading alone', () => expect(findingFor(sample2(6, []), 'hip-tight').change.amountMm).toBe(9))
  it('slack by a fold of 4 after 20: overdone by 8, 8 goes back and 12 stays', () => {
    const slack = seen({ id: 'slack', sign: 'excess', zone: 'hip', direction: 'vertical', amount: { mm: 4, as: 'fold-depth' } })
    for (const observations of [[slack], []]) {
      const diagnosis = sample2(-8, observations)
      expect(causesOf(diagnosis)).toEqual(['hip-tight'])
      const { change, response } = diagnosis.findings[0]!
      expect(change.amountMm).toBe(-8)
      expect(response!.text).toContain('{mm:12} stays')
      expect(diagnosis.unexplained).toEqual([])
    }
  })
  it('knows an overdone change without a reading by the opposite sign', () => {
    const diagnosis = diagnose(fitting({
      observations: [seen({ sign: 'excess', zone: 'hip', direction: 'vertical', amount: { mm: 4, as: 'fold-depth' } })],
      ledger: [{ cause: 'hip-tight', amountMm: 20, side: 'both', readings: [] }],
    }))
    expect(findingFor(diagnosis, 'hip-tight').change.amountMm).toBe(-8)
  })
  it('worse after 20: the change comes out', () => {
    const finding = findingFor(sample2(30, []), 'hip-tight')
    expect(finding.advice).toBe('bring-back')
    expect(finding.change.amountMm).toBe(-20)
  })
})

describe('what is not changed', () => {
  it('tight and loose at one place contradict each other: nothing is suggested', () => {
    const diagnosis = diagnose(fitting({ observations: [seen({ id: 'a', sign: 'tight', zone: 'hip' }), seen({ id: 'b', sign: 'excess', zone: 'hip' })] }))
    expect(diagnosis.findings).toEqual([])
    expect(diagnosis.conflicts).toHaveLength(1)
    expect(diagnosis.conflicts[0]!.observationIds).toEqual(['a', 'b'])
  })
  it('an amount under 3 is noted and left', () => {
    const finding = findingFor(diagnose(fitting({ observations: [seen({ sign: 'tight', zone: 'hip', line: 'side-seam', amount: { mm: 2, as: 'cloth' } })] })), 'hip-tight')
    expect(finding).toMatchObject({ advice: 'leave-it', change: { operation: 'none', steps: [], companions: [] } })
    expect(finding.predicts).toEqual([])
  })
})
