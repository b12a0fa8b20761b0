import { z } from 'zod'
import { defineRoute } from './route.ts'

export const health = defineRoute({
  id: 'service.health', method: 'get', path: '/api/health', access: 'public', summary: 'The server is running',
  response: z.object({ status: z.literal('ok') }),
})
export const ready = defineRoute({
  id: 'service.ready', method: 'get', path: '/api/ready', access: 'public', summary: 'Database and storage answer',
  response: z.object({ status: z.literal('ready'), database: z.literal('ok'), storage: z.literal('ok') }),
})
export const openApi = defineRoute({
  id: 'service.openapi', method: 'get', path: '/api/openapi.json', access: 'public', summary: 'This description',
  response: z.record(z.string(), z.unknown()),
})
