import { z } from 'zod'
import { apiError } from '#shared/contracts/common.ts'
import { type Route } from '#shared/contracts/route.ts'

const schema = (type: z.ZodType, io: 'input' | 'output') => z.toJSONSchema(type, { io, unrepresentable: 'any', target: 'openapi-3.0' })
const json = (type: z.ZodType, io: 'input' | 'output') => ({ content: { 'application/json': { schema: schema(type, io) } } })

/** The OpenAPI description of all routes, made from their contracts alone. */
export function openApi(routes: readonly Route[]): Record<string, unknown> {
  const paths: Record<string, Record<string, unknown>> = {}
  for (const route of routes) {
    const path = route.path.replaceAll(/:(\w+)/g, '{$1}')
    paths[path] = { ...paths[path], [route.method]: operation(route) }
  }
  return {
    openapi: '3.0.3',
    info: { title: 'Proofcloth', version: '1', description: 'Lengths are millimetres. Errors have one shape everywhere. A creating request may be repeated with the same Idempotency-Key.' },
    components: { securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'proofcloth', description: 'Set by POST /api/sign-in. Named __Host-proofcloth over https.' } } },
    paths,
  }
}

function operation(route: Route): Record<string, unknown> {
  return {
    operationId: route.id, summary: route.summary, tags: [route.id.split('.')[0]],
    security: route.access === 'public' ? [] : [{ session: [] }],
    'x-access': route.access,
    parameters: [...parameters(route.params, 'path'), ...parameters(route.query, 'query'), ...(route.idempotent ? [idempotencyKey] : [])],
    ...(route.body && { requestBody: { required: true, ...body(route, route.body) } }),
    responses: {
      [route.status ?? (route.response || route.produces ? 200 : 204)]: { description: 'Done', ...answer(route) },
      default: { description: 'What happened and what to do', ...json(apiError, 'output') },
    },
  }
}

const idempotencyKey = { name: 'Idempotency-Key', in: 'header', required: false, schema: { type: 'string', pattern: '^[\\w-]{8,100}$' } }

function parameters(object: z.ZodObject | undefined, place: 'path' | 'query') {
  return Object.entries(object?.shape ?? {}).map(([name, type]) => ({
    name, in: place, required: place === 'path' || !(type as z.ZodType).safeParse(undefined).success, schema: schema(type as z.ZodType, 'input'),
  }))
}

function body(route: Route, type: z.ZodType) {
  if (!route.upload) return json(type, 'input')
  const fields = schema(type, 'input') as { properties?: Record<string, unknown>; required?: string[] }
  return {
    content: { 'multipart/form-data': { schema: {
      ...fields, properties: { ...fields.properties, photograph: { type: 'string', format: 'binary' } }, required: [...(fields.required ?? []), 'photograph'],
    } } },
  }
}

function answer(route: Route) {
  if (route.response) return json(route.response, 'output')
  return route.produces ? { content: { [route.produces]: { schema: { type: 'string', format: 'binary' } } } } : {}
}
