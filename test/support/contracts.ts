import { readdirSync } from 'node:fs'
import { type Route } from '#shared/contracts/route.ts'

const folder = new URL('../../shared/contracts/', import.meta.url)
const isRoute = (value: unknown): value is Route => typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'access' in value

/** Every route of every contract file, found by reading the folder: a new file cannot be forgotten. */
export const contracts: readonly Route[] = (await Promise.all(
  readdirSync(folder).filter((file) => file.endsWith('.ts')).map((file): Promise<Record<string, unknown>> => import(new URL(file, folder).href)),
)).flatMap((module) => Object.values(module).filter(isRoute))

/** The path with the given ids filled in; other parameters get a value that is well formed and names nothing. */
export function pathOf(route: Route, ids: Readonly<Record<string, string>>): string {
  return route.path.replaceAll(/:(\w+)/g, (_whole, name: string) => ids[name] ?? unknown[name] ?? crypto.randomUUID())
}
const unknown: Record<string, string> = { number: '1', size: 'thumb', checkId: 'no-such~check', sessionId: 'f'.repeat(64) }
