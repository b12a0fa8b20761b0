import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { changeObservations, changes } from '#db/schema/changes.ts'
import { observations } from '#db/schema/observations.ts'
import { projects } from '#db/schema/projects.ts'
import { samples } from '#db/schema/samples.ts'
import { type PaperChange } from '#shared/fit/types.ts'
import { makeProject } from '../../support/makeProject.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

type Past = { cause: string | null; amountMm: number; state?: 'settled' | 'carried'; stage?: 'cut' | 'cleared' | 'sample'; decision?: 'accepted' | 'declined'; carriedTo?: number | null }
/** A project of this wearer with one change and the observation it answers. */
async function past(wearerId: string, { cause, amountMm, state = 'settled', stage = 'cut', decision = 'accepted', carriedTo = 2 }: Past) {
  const { projectId } = await makeProject(t.db, { studioId: t.studioId, wearerId })
  await t.db.update(projects).set({ stage }).where(eq(projects.id, projectId))
  const [sample] = await t.db.insert(samples).values({ projectId, number: 1, answers: {} }).returning()
  const [observation] = await t.db.insert(observations).values({ projectId, sampleId: sample!.id, number: 1, sign: 'excess', zone: 'waist', view: 'back', side: 'both', severity: 2, state }).returning()
  const [change] = await t.db.insert(changes).values({
    projectId, sampleId: sample!.id, cause, decision, title: 'Take a fold out across the back waist', amountMm, paper: {} as PaperChange, predictions: [], carriedTo,
  }).returning()
  await t.db.insert(changeObservations).values({ changeId: change!.id, observationId: observation!.id })
}
const wearer = async () => (await t.maker.post(`/api/studios/${t.studioId}/wearers`).send({ name: 'Tamsin' }).expect(201)).body.id as string
const usual = async (wearerId: string) => (await t.maker.get(`/api/studios/${t.studioId}/wearers/${wearerId}/usual-changes`).expect(200)).body.usualChanges

it('offers what settled at least twice, with how often and how much', async () => {
  const id = await wearer()
  await past(id, { cause: 'back-waist-long', amountMm: -12 })
  expect(await usual(id)).toEqual([])
  await past(id, { cause: 'back-waist-long', amountMm: -16, stage: 'cleared' })
  await past(id, { cause: 'back-waist-long', amountMm: -15 })
  await past(id, { cause: 'hip-tight', amountMm: 20 })
  expect(await usual(id)).toEqual([expect.objectContaining({ cause: 'back-waist-long', title: 'Take a fold out across the back waist', count: 3, medianMm: -15, leastMm: -16, mostMm: -12 })])
})

it.each<[string, Partial<Past>]>([
  ['is not settled yet', { state: 'carried' }], ['belongs to a project that is not finished', { stage: 'sample' }], ['was declined', { decision: 'declined' }],
  ['was never sewn', { carriedTo: null }], ['is of one’s own making, without a cause', { cause: null }],
])('does not count a change that %s', async (_name, difference) => {
  const id = await wearer()
  await past(id, { cause: 'back-waist-long', amountMm: -12 })
  await past(id, { cause: 'back-waist-long', amountMm: -12, ...difference })
  expect(await usual(id)).toEqual([])
})

it('keeps wearers apart', async () => {
  const [one, other] = [await wearer(), await wearer()]
  await past(one, { cause: 'back-waist-long', amountMm: -12 })
  await past(other, { cause: 'back-waist-long', amountMm: -12 })
  expect(await usual(one)).toEqual([])
})
