import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { makeProject } from '../../support/makeProject.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
let wearers: string
beforeAll(async () => {
  t = await testApp()
  wearers = `/api/studios/${t.studioId}/wearers`
})
afterAll(() => t.close())

const add = async (name = 'Tamsin') => (await t.maker.post(wearers).send({ name }).expect(201)).body
const sheet = (fields: object = {}) => ({ takenOn: '2026-11-02', takenBy: 'Finn', measurements: [], ...fields })
const addSet = async (wearerId: string, fields: object = {}) => (await t.maker.post(`${wearers}/${wearerId}/measurement-sets`).send(sheet(fields)).expect(201)).body

describe('a wearer', () => {
  it('is added, read, renamed and removed', async () => {
    const made = await add()
    expect(made).toMatchObject({ name: 'Tamsin', note: '', hasAccount: false, version: 1, projectCount: 0, latestSetOn: null, studioId: t.studioId })
    const { body: renamed } = await t.maker.patch(`${wearers}/${made.id}`).send({ name: 'Tamsin Obi', version: 1 }).expect(200)
    expect(renamed).toEqual({ ...made, name: 'Tamsin Obi', version: 2 })
    expect((await t.maker.get(`${wearers}/${made.id}`).expect(200)).body).toEqual({ wearer: renamed, sets: [] })
    await t.maker.delete(`${wearers}/${made.id}`).expect(204)
    await t.maker.get(`${wearers}/${made.id}`).expect(404)
  })
  it('changed by two people at once keeps the first change and shows it to the second', async () => {
    const made = await add()
    const { body: theirs } = await t.owner.patch(`${wearers}/${made.id}`).send({ note: 'left shoulder lower', version: 1 }).expect(200)
    const { body } = await t.maker.patch(`${wearers}/${made.id}`).send({ note: 'prefers long sleeves', version: 1 }).expect(409)
    expect(body.error).toMatchObject({ code: 'version.stale', details: { theirs } })
    expect((await t.maker.get(`${wearers}/${made.id}`)).body.wearer).toEqual(theirs)
  })
  it('changed by many at once is changed by exactly one', async () => {
    const made = await add()
    const answers = await Promise.all(Array.from({ length: 6 }, (_, i) => t.maker.patch(`${wearers}/${made.id}`).send({ note: `note ${i}`, version: 1 })))
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409, 409, 409, 409, 409])
  })
  it('for whom a project is made stays, with a sentence that says why', async () => {
    const made = await add()
    await makeProject(t.db, { studioId: t.studioId, wearerId: made.id })
    const { body } = await t.maker.delete(`${wearers}/${made.id}`).expect(409)
    expect(body.error).toMatchObject({ code: 'state.wrong', message: expect.stringContaining('project') })
    expect((await t.maker.get(`${wearers}/${made.id}`).expect(200)).body.wearer.projectCount).toBe(1)
  })
  it('is removed with every set of measurements', async () => {
    const made = await add()
    await addSet(made.id)
    await t.maker.delete(`${wearers}/${made.id}`).expect(204)
  })
})

describe('a dated set', () => {
  it('uses the reading, the mean of two and the median of three', async () => {
    const made = await add()
    const set = await addSet(made.id, { measurements: [
      { code: 'waist', readingsMm: [712] }, { code: 'hip', readingsMm: [980, 986] }, { code: 'bust', readingsMm: [912, 880, 916] },
    ] })
    expect(set.measurements).toEqual([
      { code: 'waist', readingsMm: [712], valueMm: 712 }, { code: 'hip', readingsMm: [980, 986], valueMm: 983 }, { code: 'bust', readingsMm: [912, 880, 916], valueMm: 912 },
    ])
  })
  it('takes no value from outside', async () => {
    const made = await add()
    await t.maker.post(`${wearers}/${made.id}/measurement-sets`).send(sheet({ measurements: [{ code: 'waist', readingsMm: [712], valueMm: 600 }] })).expect(400)
  })
  it('refuses a measurement that is there twice, a reading that cannot be, and a day that is none', async () => {
    const made = await add()
    const post = (fields: object) => t.maker.post(`${wearers}/${made.id}/measurement-sets`).send(sheet(fields))
    await post({ measurements: [{ code: 'hip', readingsMm: [980] }, { code: 'hip', readingsMm: [990] }] }).expect(400)
    await post({ measurements: [{ code: 'hip', readingsMm: [9800] }] }).expect(400)
    await post({ measurements: [{ code: 'hip', readingsMm: [] }] }).expect(400)
    await post({ measurements: [{ code: 'hip', readingsMm: [980, 981, 982, 983] }] }).expect(400)
    await post({ takenOn: '2026-02-30' }).expect(400)
  })
  it('is listed newest first, and the wearer says when the latest was taken', async () => {
    const made = await add()
    for (const takenOn of ['2026-03-01', '2026-11-02', '2025-12-24']) await addSet(made.id, { takenOn })
    const { body } = await t.fitter.get(`${wearers}/${made.id}`).expect(200)
    expect(body.sets.map((set: { takenOn: string }) => set.takenOn)).toEqual(['2026-11-02', '2026-03-01', '2025-12-24'])
    expect(body.wearer.latestSetOn).toBe('2026-11-02')
  })
  it('is corrected at its version only', async () => {
    const made = await add()
    const set = await addSet(made.id)
    const url = `${wearers}/${made.id}/measurement-sets/${set.id}`
    const { body: corrected } = await t.maker.put(url).send(sheet({ note: 'over a slip', version: 1 })).expect(200)
    expect(corrected).toMatchObject({ note: 'over a slip', version: 2 })
    const { body } = await t.owner.put(url).send(sheet({ note: 'over a vest', version: 1 })).expect(409)
    expect(body.error.details.theirs).toEqual(corrected)
    await t.maker.delete(url).expect(204)
    await t.maker.put(url).send(sheet({ version: 2 })).expect(404)
  })
  it('is not reached through another wearer', async () => {
    const [one, other] = [await add(), await add()]
    const set = await addSet(one.id)
    await t.maker.put(`${wearers}/${other.id}/measurement-sets/${set.id}`).send(sheet({ version: 1 })).expect(404)
    await t.maker.delete(`${wearers}/${other.id}/measurement-sets/${set.id}`).expect(404)
    expect((await t.maker.get(`${wearers}/${one.id}`)).body.sets).toHaveLength(1)
  })
})
