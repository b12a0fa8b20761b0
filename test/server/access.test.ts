import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { type Role, may, roles } from '#shared/contracts/permissions.ts'
import { type Route } from '#shared/contracts/route.ts'
import { contracts, pathOf } from '../support/contracts.ts'
import { makeProject } from '../support/makeProject.ts'
import { type Browser, type TestApp, testApp } from '../support/testApp.ts'

let t: TestApp
let ids: Record<string, string>
let otherIds: Record<string, string>
beforeAll(async () => {
  t = await testApp()
  const project = await makeProject(t.db, { studioId: t.studioId, wearerId: t.wearerId })
  const other = await makeProject(t.db, { studioId: t.studioId, wearerId: t.otherWearerId })
  ids = { studioId: t.studioId, ...project, wearerId: t.wearerId, userId: t.maker.userId }
  otherIds = { ...ids, ...other, wearerId: t.otherWearerId }
})
afterAll(() => t.close())

const permissionOf = ({ access }: Route) => (typeof access === 'string' ? null : 'studio' in access ? access.studio : access.project)
const guarded = contracts.filter((route) => route.access !== 'public')
const scoped = contracts.filter((route) => permissionOf(route) !== null)
const ofProject = contracts.filter(({ access }) => typeof access === 'object' && 'project' in access)
const send = (browser: Browser, route: Route, filled: Record<string, string>) => browser[route.method](pathOf(route, filled))

describe('every route, by its contract', () => {
  it('covers routes of every kind', () => {
    expect(guarded.length).toBeGreaterThan(50)
    expect(scoped.length).toBeGreaterThan(ofProject.length)
  })
  it.each(guarded)('$id asks who is signed out to sign in', async (route) => {
    const { body } = await send(t.anonymous, route, ids).expect(401)
    expect(body.error.code).toBe('sign-in.needed')
  })
  it.each(scoped)('$id does not exist for a stranger', async (route) => {
    const { body } = await send(t.stranger, route, ids).expect(404)
    expect(body.error.code).toBe('not-found')
  })
  // Not even whether a body would have been accepted may tell that something is there.
  it.each(scoped)('$id answers a stranger before it reads the body', async (route) => {
    if (route.method === 'get') return
    await send(t.stranger, route, ids).set('Content-Type', 'application/json').send('{"broken').expect(404)
  })
  it.each(scoped.flatMap((route) => roles.filter((role) => !may(role, permissionOf(route)!)).map((role) => ({ id: route.id, role, route }))))(
    '$id refuses a $role', async ({ route, role }) => {
      const { body } = await send(t[role], route, ids).expect(403)
      expect(body.error.code).toBe('not-allowed')
      expect(body.error.message).toContain(role)
    })
  it.each(ofProject)('$id hides another wearer’s project from a wearer', async (route) => {
    await send(t.wearer, route, otherIds).expect(404)
  })
  it.each(scoped)('$id treats an id that is none like one that is not theirs', async (route) => {
    await send(t.owner, route, { ...ids, studioId: 'not-an-id', projectId: '0' }).expect(404)
  })
})

describe('a project of one studio', () => {
  it('is read by every role that may', async () => {
    for (const role of roles.filter((r: Role) => may(r, 'project.read'))) await t[role].get(`/api/projects/${ids.projectId}`).expect(200)
  })
})

describe('a thing of another studio', () => {
  it('is not reached through one’s own studio’s address', async () => {
    const mine = (await t.stranger.get('/api/me').expect(200)).body.memberships[0].studioId
    await t.stranger.get(`/api/studios/${mine}/patterns/${ids.patternId}`).expect(404)
    await t.stranger.delete(`/api/studios/${mine}/patterns/${ids.patternId}`).expect(404)
    await t.stranger.get(`/api/studios/${mine}/wearers/${ids.wearerId}`).expect(404)
    await t.stranger.patch(`/api/studios/${mine}/wearers/${ids.wearerId}`).send({ name: 'Mine', version: 1 }).expect(404)
    await t.stranger.post(`/api/studios/${mine}/wearers/${ids.wearerId}/measurement-sets`).send({ takenOn: '2026-11-02', takenBy: 'me', measurements: [] }).expect(404)
    await t.stranger.patch(`/api/studios/${mine}/members/${t.maker.userId}`).send({ role: 'owner' }).expect(404)
  })
})

describe('a member with the role wearer', () => {
  it('lists and reads only the wearer that is they', async () => {
    const { body } = await t.wearer.get(`/api/studios/${t.studioId}/wearers`).expect(200)
    expect(body.wearers.map(({ id }: { id: string }) => id)).toEqual([t.wearerId])
    await t.wearer.get(`/api/studios/${t.studioId}/wearers/${t.wearerId}`).expect(200)
    await t.wearer.get(`/api/studios/${t.studioId}/wearers/${t.otherWearerId}`).expect(404)
    await t.wearer.get(`/api/studios/${t.studioId}/wearers/${t.otherWearerId}/usual-changes`).expect(404)
  })
})

describe('an address without a contract', () => {
  it.each(['get', 'post', 'put', 'patch', 'delete'] as const)('answers %s with 404 in JSON', async (method) => {
    const { body } = await t.owner[method]('/api/no-such-thing').expect(404)
    expect(body.error.code).toBe('not-found')
  })
  it('does not tell by OPTIONS which methods an address has', async () => {
    await t.owner.options('/api/me').expect(404)
  })
})
