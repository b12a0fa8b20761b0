import { afterAll, beforeAll, expect, it } from 'vitest'
import { makeProject } from '../../support/makeProject.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
let patterns: string
beforeAll(async () => {
  t = await testApp()
  patterns = `/api/studios/${t.studioId}/patterns`
})
afterAll(() => t.close())

const skirt = (fields: object = {}) => ({ name: 'Panel skirt', garment: { kind: 'skirt', waist: 'elastic' }, chart: [{ label: '12', body: { waist: 700, hip: 960 } }], ...fields })
const add = async (fields: object = {}) => (await t.maker.post(patterns).send(skirt(fields)).expect(201)).body

it('adds a pattern with its chart and what is usual for the rest', async () => {
  const made = await add()
  expect(made).toMatchObject({ ...skirt(), origin: '', view: '', draftedCupMm: null, allowanceMm: 15, note: '', version: 1, projectCount: 0 })
  expect((await t.fitter.get(`${patterns}/${made.id}`).expect(200)).body).toEqual(made)
  expect((await t.fitter.get(patterns).expect(200)).body.patterns).toContainEqual(made)
})

it('changes it at its version only', async () => {
  const made = await add()
  const { body: theirs } = await t.owner.put(`${patterns}/${made.id}`).send({ ...skirt({ note: 'net, no allowance', allowanceMm: 0 }), version: 1 }).expect(200)
  expect(theirs).toMatchObject({ allowanceMm: 0, version: 2 })
  const { body } = await t.maker.put(`${patterns}/${made.id}`).send({ ...skirt({ name: 'Gored skirt' }), version: 1 }).expect(409)
  expect(body.error).toMatchObject({ code: 'version.stale', details: { theirs } })
  expect((await t.maker.get(`${patterns}/${made.id}`)).body).toEqual(theirs)
})

it('refuses a chart with one label twice, whatever the case', async () => {
  const { body } = await t.maker.post(patterns).send(skirt({ chart: [{ label: 'xl', body: {} }, { label: 'XL', body: {} }] })).expect(400)
  expect(body.error.details.chart).toContain('XL')
})

it('refuses a garment that is none', async () => {
  await t.maker.post(patterns).send(skirt({ garment: { kind: 'hat' } })).expect(400)
})

it('keeps a pattern a project uses, and removes one nobody uses', async () => {
  const { patternId } = await makeProject(t.db, { studioId: t.studioId, wearerId: t.wearerId })
  const { body } = await t.maker.delete(`${patterns}/${patternId}`).expect(409)
  expect(body.error.code).toBe('state.wrong')
  expect((await t.maker.get(`${patterns}/${patternId}`).expect(200)).body.projectCount).toBe(1)
  const made = await add()
  await t.maker.delete(`${patterns}/${made.id}`).expect(204)
  await t.maker.delete(`${patterns}/${made.id}`).expect(404)
})
