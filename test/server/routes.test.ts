import { type Express } from 'express'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { type Route } from '#shared/contracts/route.ts'
import { contracts } from '../support/contracts.ts'
import { type TestApp, testApp } from '../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

const named = ({ method, path }: { method: string; path: string }) => `${method} ${path}`

type Layer = { route?: { path: string; methods: Record<string, boolean> }; handle?: { stack?: Layer[] } }
/** What Express itself would answer, whatever was registered how. */
const registered = (app: Express): string[] => {
  const walk = (layers: readonly Layer[]): string[] => layers.flatMap(({ route, handle }) => [
    ...(route ? Object.keys(route.methods).map((method) => named({ method, path: route.path })) : []),
    ...walk(handle?.stack ?? []),
  ])
  return walk((app.router as unknown as { stack: Layer[] }).stack).filter((name) => name.includes(' /api'))
}

it('serves every contract', () => {
  const served = (t.app.locals.routes as Route[]).map(named)
  expect(contracts.map(named).filter((name) => !served.includes(name))).toEqual([])
})

it('has no route without a contract, and none twice', () => {
  expect(registered(t.app).toSorted()).toEqual(contracts.map(named).toSorted())
})

it('gives every contract an id of its own', () => {
  expect(new Set(contracts.map(({ id }) => id)).size).toBe(contracts.length)
})

it('names the studio or project in the path of every route that is guarded by one', () => {
  for (const { access, path, id } of contracts) {
    if (typeof access !== 'object') continue
    expect(path, id).toContain('studio' in access ? '/:studioId' : '/:projectId')
  }
})

it('describes every contract in OpenAPI, with access, parameters, body and answer', async () => {
  const { body } = await t.anonymous.get('/api/openapi.json').expect(200)
  expect(body.openapi).toMatch(/^3\./)
  for (const route of contracts) {
    const operation = body.paths[route.path.replaceAll(/:(\w+)/g, '{$1}')]?.[route.method]
    expect(operation, route.id).toMatchObject({ operationId: route.id, 'x-access': route.access })
    const inPath = operation.parameters.filter((parameter: { in: string }) => parameter.in === 'path').map(({ name }: { name: string }) => name)
    expect(inPath.toSorted(), route.id).toEqual([...route.path.matchAll(/:(\w+)/g)].map(([, name]) => name).toSorted())
    expect(Boolean(operation.requestBody), route.id).toBe(Boolean(route.body))
    expect(Object.keys(operation.responses), route.id).toEqual([String(route.status ?? 200), 'default'])
  }
})
