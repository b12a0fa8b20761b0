const browsers = [['Edg/', 'Edge'], ['OPR/', 'Opera'], ['Firefox/', 'Firefox'], ['Chrome/', 'Chrome'], ['CriOS/', 'Chrome'], ['Safari/', 'Safari']] as const
const systems = [['iPhone', 'iPhone'], ['iPad', 'iPad'], ['Android', 'Android'], ['Windows', 'Windows'], ['Mac OS X', 'Mac'], ['CrOS', 'Chromebook'], ['Linux', 'Linux']] as const

/** "Firefox on Windows": enough to tell one's own devices apart. Nothing of the header itself is kept. */
export function deviceOf(userAgent: string): string {
  const find = (table: readonly (readonly [string, string])[]) => table.find(([sign]) => userAgent.includes(sign))?.[1]
  const browser = find(browsers)
  const system = find(systems)
  if (browser && system) return `${browser} on ${system}`
  return browser ?? system ?? 'Another program'
}
