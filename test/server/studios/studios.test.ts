import { desc, eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { auditEntries } from '#db/schema/auditEntries.ts'
import { photographs } from '#db/schema/photographs.ts'
import { samples } from '#db/schema/samples.ts'
import { makeProject } from '../../support/makeProject.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
let studio: string
beforeAll(async () => {
  t = await testApp()
  studio = `/api/studios/${t.studioId}`
})
afterAll(() => t.close())

it('shows its members with their roles, oldest first', async () => {
  const { body } = await t.maker.get(studio).expect(200)
  expect(body.members.map(({ name, role }: { name: string; role: string }) => [name, role])).toEqual([['Orla', 'owner'], ['Mara', 'maker'], ['Finn', 'fitter'], ['Wilma', 'wearer']])
})

it('counts the photographs that are stored and not removed', async () => {
  const { projectId } = await makeProject(t.db, { studioId: t.studioId, wearerId: t.wearerId })
  const [sample] = await t.db.insert(samples).values({ projectId, number: 1, answers: {} }).returning()
  const photograph = { sampleId: sample!.id, view: 'front', bytes: 1000, storedAt: new Date() } as const
  await t.db.insert(photographs).values([photograph, { ...photograph, bytes: 2500 }, { ...photograph, storedAt: null }, { ...photograph, removedAt: new Date() }])
  expect((await t.owner.get(studio)).body.photographs).toEqual({ count: 2, bytes: 3500, quotaBytes: 5 * 1024 ** 3 })
})

it('is renamed by an owner', async () => {
  expect((await t.owner.patch(studio).send({ name: 'Alder Lane Sewing Room' }).expect(200)).body.name).toBe('Alder Lane Sewing Room')
})

it('changes a role at once and notes who did it', async () => {
  const { userId } = await t.member('Nils', 'fitter')
  await t.owner.patch(`${studio}/members/${userId}`).send({ role: 'maker' }).expect(200)
  const [entry] = await t.db.select().from(auditEntries).where(eq(auditEntries.event, 'member.role')).orderBy(desc(auditEntries.at)).limit(1)
  expect(entry).toMatchObject({ userId: t.owner.userId, studioId: t.studioId, details: { member: userId, role: 'maker' } })
})

it('removes a member, who then sees nothing of it', async () => {
  const nora = await t.member('Nora', 'maker')
  await nora.get(studio).expect(200)
  const { body } = await t.owner.delete(`${studio}/members/${nora.userId}`).expect(200)
  expect(body.members.map(({ userId }: { userId: string }) => userId)).not.toContain(nora.userId)
  await nora.get(studio).expect(404)
})

it('knows no member of another studio', async () => {
  await t.owner.patch(`${studio}/members/${t.stranger.userId}`).send({ role: 'maker' }).expect(404)
  await t.owner.delete(`${studio}/members/${t.stranger.userId}`).expect(404)
})

it('keeps at least one owner, also when two step down at once', async () => {
  const { body } = await t.owner.patch(`${studio}/members/${t.owner.userId}`).send({ role: 'maker' }).expect(409)
  expect(body.error.code).toBe('state.wrong')
  await t.owner.delete(`${studio}/members/${t.owner.userId}`).expect(409)

  const second = await t.member('Otto', 'owner')
  const answers = await Promise.all([
    t.owner.patch(`${studio}/members/${t.owner.userId}`).send({ role: 'maker' }),
    second.patch(`${studio}/members/${second.userId}`).send({ role: 'maker' }),
  ])
  expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409])
})
