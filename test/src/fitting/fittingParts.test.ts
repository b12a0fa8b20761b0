// @vitest-environment happy-dom
import { mount } from '@vue/test-utils'
import { createPinia } from 'pinia'
import { describe, expect, it, vi } from 'vitest'
import AskedAgainRow from '../../../src/components/fitting/AskedAgainRow.vue'
import ObservationEditor from '../../../src/components/fitting/ObservationEditor.vue'
import PhotographQueue from '../../../src/components/fitting/PhotographQueue.vue'
import SuggestionCard from '../../../src/components/fitting/SuggestionCard.vue'
import { changeOf, finding, shown } from './fittingFixtures.ts'

const global = () => ({ plugins: [createPinia()], stubs: { PcIcon: true, RouterLink: { props: ['to'], template: '<a :href="to"><slot /></a>' } } })
const button = (wrapper: ReturnType<typeof mount>, words: string | RegExp) => wrapper.findAll('button').find((one) => (typeof words === 'string' ? one.text() === words : words.test(one.text())))!

/** Words as read: amounts hold their unit with a space that does not break. */
const textOf = (part: { text: () => string }) => part.text().replaceAll('\u00A0', ' ')

describe('an earlier observation asked again', () => {
  const row = (more = {}, props = {}) => mount(AskedAgainRow, { props: { observation: shown(more), sampleNumber: 2, mayMark: true, busy: false, problem: '', ...props }, global: global() })
  it('shows what was foretold and the old amount struck', () => {
    const seen = row({ predicted: { sampleNumber: 2, expectedMm: 4, changeMm: 20, text: '' } })
    expect(textOf(seen)).toContain('should have 0.2 cm left')
    expect(textOf(seen.find('s'))).toContain('1.2 cm')
  })
  it('is settled with one press', async () => {
    const seen = row()
    await button(seen, 'Gone').trigger('click')
    expect(seen.emitted('read')).toEqual([[{ gone: true, amount: null }]])
  })
  it('asks for the amount when it is still there, starting from what was foretold', async () => {
    const seen = row({ predicted: { sampleNumber: 2, expectedMm: 4, changeMm: 20, text: '' } })
    await button(seen, 'Still there').trigger('click')
    expect(textOf(seen)).toContain('How deep is the fold?')
    await button(seen, 'Keep this reading').trigger('click')
    expect(seen.emitted('read')).toEqual([[{ gone: false, reversed: false, amount: { mm: 2, as: 'fold-depth' } }]])
  })
  it('notes a change that went too far as the other way', async () => {
    const seen = row()
    await button(seen, 'It went too far').trigger('click')
    await button(seen, 'Keep without an amount').trigger('click')
    expect(seen.emitted('read')).toEqual([[{ gone: false, reversed: true, amount: null }]])
  })
  it('offers nothing to someone who may only look', () => expect(row({}, { mayMark: false }).findAll('button')).toHaveLength(1))
})

describe('the editor of an observation', () => {
  const editor = (props = {}) => mount(ObservationEditor, { props: { observation: shown(), garment: 'bodice', clash: null, message: '', fresh: true, ...props }, global: global() })
  it('picks sign and place from drawings', async () => {
    const open = editor()
    await open.find('button.what').trigger('click')
    await open.find('input[name="sign"][value="tight"]').trigger('change')
    await open.find('input[name="zone"][value="sleeve"]').trigger('change')
    expect(open.emitted('change')).toEqual([[{ sign: 'tight', direction: null, towards: null }], [{ zone: 'sleeve' }]])
  })
  it('takes an amount back with "Not sure" and keeps the mark', async () => {
    const open = editor()
    await button(open, 'Not sure').trigger('click')
    expect(open.emitted('change')).toEqual([[{ amount: null }]])
    expect(open.emitted('remove')).toBeUndefined()
  })
  it('keeps typed words once the fingers rest', async () => {
    vi.useFakeTimers()
    const open = editor()
    await open.find('textarea').setValue('only when she sits')
    expect(open.emitted('change')).toBeUndefined()
    vi.advanceTimersByTime(1000)
    expect(open.emitted('change')).toEqual([[{ note: 'only when she sits' }]])
    vi.useRealTimers()
  })
  it('shows both states of a clash and lets the person pick', async () => {
    const theirs = shown({ note: 'hers', amount: { mm: 10, as: 'fold-depth' }, by: { id: 'r', name: 'Rosalind' }, version: 4 })
    const open = editor({ clash: { id: 'o1', mine: { note: 'mine', amount: { mm: 15, as: 'fold-depth' } }, theirs } })
    expect(open.text()).toContain('Observation 1 was changed by someone else meanwhile')
    for (const words of ['hers', 'mine', '1.0 cm', '1.5 cm']) expect(textOf(open.find('.clash'))).toContain(words)
    await button(open, 'Keep mine').trigger('click')
    expect(open.emitted('clash')).toEqual([['mine']])
  })
})

describe('a suggestion', () => {
  const card = (props = {}, of = finding()) => mount(SuggestionCard, {
    props: { card: { id: 'full-bust~both', finding: of, change: null, explains: of.explains, notches: 1 }, observations: [shown()], selectedId: 'o1', answers: {}, mayDecide: true, mayMark: true, busy: false, problem: '', to: '/x', ...props }, global: global(),
  })
  it('says what it would settle, how much, and both sides of why', () => {
    const text = textOf(card())
    for (const words of ['Would settle', '+3.0 cm', 'measured on the sample', 'Speaks for it', 'Speaks against it', 'The back is as tight', 'common practice']) expect(text).toContain(words)
  })
  it('is accepted, or declined with a reason', async () => {
    const one = card()
    await button(one, 'Accept').trigger('click')
    expect(one.emitted('accept')).toHaveLength(1)
    await button(one, 'Decline').trigger('click')
    await one.find('input[value="style"]').setValue(true)
    await one.find('form').trigger('submit')
    expect(one.emitted('decline')).toEqual([['style', '']])
  })
  it('answers a check, and takes the answer back by pressing it again', async () => {
    const one = card()
    await button(one, 'Look at the shoulder.').trigger('click')
    await one.setProps({ answers: { 'full-bust~slope': 'no' } })
    await button(one, 'Look at the shoulder.').trigger('click')
    expect(one.emitted('answer')).toEqual([['full-bust~slope', 'no'], ['full-bust~slope', null]])
    expect(textOf(one)).toContain('Open 6.0 cm of side seam')
  })
  it('warns beyond its limits and still lets the person decide', async () => {
    const one = card()
    await button(one, 'Alter').trigger('click')
    for (let i = 0; i < 25; i++) await one.find('button[aria-label="More: Amount"]').trigger('click')
    expect(textOf(one)).toContain('5.5 cm is more than this change should take (at most 5.0 cm). Take a larger size.')
    await one.find('form').trigger('submit')
    expect(one.emitted('alter')).toEqual([[{ amountMm: 55, pieceRoles: ['bodice-front'], note: '' }]])
  })
  it('shows an altered amount with the old one struck, and can be taken back', async () => {
    const of = finding()
    const one = card({ card: { id: 'full-bust~both', finding: of, change: changeOf(of, { decision: 'altered', amountMm: 20 }), explains: of.explains, notches: 1 } })
    expect(textOf(one.find('s'))).toBe('+3.0 cm')
    expect(textOf(one)).toContain('+2.0 cm')
    await button(one, 'Take back').trigger('click')
    expect(one.emitted('takeBack')).toHaveLength(1)
  })
  it('offers no decision to someone who may not decide', () => {
    const one = card({ mayDecide: false, mayMark: false })
    for (const words of ['Accept', 'Alter', 'Decline', 'Look at the shoulder.']) expect(button(one, words)).toBeUndefined()
  })
  it('offers no change where the amount is too small', () => expect(button(card({}, finding({ advice: 'leave-it' })), 'Accept')).toBeUndefined())
})

describe('photographs on their way', () => {
  it('tell each failure in place by the name of its file, with its own retry', async () => {
    const base = { view: 'front' as const, sentView: null, part: 0, preview: '' }
    const queue = mount(PhotographQueue, { props: { items: [
      { ...base, key: 'a', file: new File(['x'], 'front.jpg'), state: 'sending', part: 0.4, message: '' },
      { ...base, key: 'b', file: new File(['x'], 'back.jpg'), state: 'failed', message: 'The connection dropped at 62 %.' },
    ] }, global: global() })
    const rows = queue.findAll('li')
    expect(rows[0]!.find('progress').attributes('value')).toBe('0.4')
    expect(rows[1]!.find('[role="alert"]').text()).toContain('The connection dropped at 62 %.')
    await button(queue, 'Send it again').trigger('click')
    expect(queue.emitted('retry')).toEqual([['b']])
  })
})
