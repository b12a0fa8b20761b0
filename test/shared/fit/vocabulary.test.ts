import { describe, expect, it } from 'vitest'
import { rules } from '#shared/fit/catalogue.ts'
import { amountKinds, directions, lines, sides, signs, targets, views, zones } from '#shared/fit/types.ts'
import {
  amountKindWords, askFor, clothMm, directionWords, isOffered, lineWords, placeOf, sentenceOf, sideWords, signWords, signsAt, signsOfMark, targetWords,
  viewWords, zoneViews, zoneWords, zonesOfView,
} from '#shared/fit/vocabulary.ts'

describe('the words of a fitting', () => {
  it('has one sentence for every sign at every zone', () => {
    for (const sign of signs) for (const zone of zones) expect(sentenceOf({ sign, zone }), `${sign} at ${zone}`).toMatch(/^[A-Z].{6,}[^.]$/)
  })
  it('never says the same of two signs at one zone, nor of two zones with one sign', () => {
    const said = signs.flatMap((sign) => zones.map((zone) => sentenceOf({ sign, zone })))
    expect(said.filter((text, i) => said.indexOf(text) !== i)).toEqual([])
  })
  it('blames the cloth and never the body', () => {
    const said = signs.flatMap((sign) => zones.map((zone) => sentenceOf({ sign, zone }).toLowerCase()))
    for (const text of said) expect(text).not.toMatch(/problem|flaw|ideal|wrong|fat|big bust|your /)
  })
  it('names every word a person can choose', () => {
    for (const [list, words] of [[zones, zoneWords], [sides, sideWords], [views, viewWords], [directions, directionWords], [targets, targetWords], [lines, lineWords]] as const)
      for (const key of list) expect((words as Record<string, string>)[key], key).toBeTruthy()
    for (const kind of amountKinds) expect(amountKindWords[kind].name).toBeTruthy()
  })
  it('asks at least one question for an amount of every sign, each ending as a question', () => {
    for (const sign of signs) {
      expect(signWords[sign].asks.length).toBeGreaterThan(0)
      for (const { ask } of signWords[sign].asks) expect(ask).toMatch(/\?$/)
    }
  })
  it('asks for a fold to be pinched flat where cloth is spare', () => expect(askFor('excess')).toEqual({ as: 'fold-depth', ask: 'Pinch the fold flat. How deep is it?' }))
  it('falls back to the usual question where a way of measuring is not one of the sign’s', () => expect(askFor('swings', 'gap').as).toBe('shift'))
  it('reaches every sign from a mark and every zone from a view', () => {
    const kinds = ['drag-line', 'gape', 'tight', 'excess', 'length', 'balance', 'place'] as const
    expect(kinds.flatMap((kind) => signsOfMark(kind)).toSorted()).toEqual([...signs].toSorted())
    expect(new Set(views.flatMap((view) => zonesOfView(view)))).toEqual(new Set(zones))
    expect(zonesOfView('detail')).toHaveLength(zones.length)
    expect(zonesOfView('front')).not.toContain('seat')
    for (const zone of zones) expect(zoneViews[zone].length).toBeGreaterThan(0)
  })
  it('offers the usual signs of a zone first and still every other', () => {
    const { usual, others } = signsAt('armhole')
    expect(usual).toContain('gaping')
    expect([...usual, ...others]).toHaveLength(signs.length)
    expect(isOffered('gaping', 'knee')).toBe(false)
  })
})

describe('sharper sentences', () => {
  it('says the hem that rises by its line', () => expect(sentenceOf({ sign: 'rises', zone: 'hem', line: 'centre-front' })).toBe('Hem rises at centre front'))
  it('says the back waist by its view', () => {
    expect(sentenceOf({ sign: 'excess', zone: 'waist', direction: 'horizontal', view: 'back' })).toBe('Cloth folds across the back waist')
    expect(sentenceOf({ sign: 'excess', zone: 'waist', direction: 'horizontal', view: 'front' })).toBe('Cloth folds across the waist')
  })
  it('does not repeat below the sentence what the sentence says already', () => {
    expect(placeOf({ sign: 'rises', zone: 'hem', line: 'centre-front', side: 'centre' })).toBe('Centre')
    expect(placeOf({ sign: 'drag-lines', zone: 'bust', towards: 'underarm', side: 'both' })).toBe('Both sides, towards the underarm')
  })
})

it('counts twice the depth of a pinched fold as cloth, and every other amount as it is', () => {
  expect(clothMm({ mm: 8, as: 'fold-depth' })).toBe(16)
  for (const as of ['cloth', 'gap', 'shift'] as const) expect(clothMm({ mm: 8, as })).toBe(8)
})

describe('the rules', () => {
  const list = <T>(one: T | readonly T[] | undefined): readonly T[] => (one === undefined ? [] : Array.isArray(one) ? one as readonly T[] : [one as T])
  it('use no sign, zone, target, direction or line that has no words, and no amount the editor cannot ask for', () => {
    for (const rule of rules) for (const pattern of rule.signs) for (const sign of list(pattern.sign)) {
      for (const zone of list(pattern.zone)) expect(sentenceOf({ sign, zone }), `${rule.cause}: ${sign} at ${zone}`).toBeTruthy()
      for (const target of list(pattern.towards)) expect(signWords[sign].targets, `${rule.cause}: ${sign} towards ${target}`).toContain(target)
      for (const direction of list(pattern.direction)) expect(signWords[sign].directions, `${rule.cause}: ${sign} ${direction}`).toContain(direction)
      for (const line of list(pattern.line)) expect(signWords[sign].lines, `${rule.cause}: ${sign} at the ${line}`).toContain(line)
    }
  })
})
