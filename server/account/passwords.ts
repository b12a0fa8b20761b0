import { hash, verify } from '@node-rs/argon2'

/** argon2id (the library's default kind). Source: OWASP Password Storage Cheat Sheet: 19 MiB, 2 passes, 1 lane. */
export const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const

export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFC'), parameters)

let decoy: Promise<string> | null = null

/**
 * True when the password belongs to the hash. Without a hash the same work is done and the answer is no, so that the time
 * taken does not tell which addresses have an account.
 */
export async function verifyPassword(storedHash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this password')
  const matches = await verify(storedHash ?? (await decoy), password.normalize('NFC'))
  return matches && storedHash !== null
}

/** True when a stored hash was made with less work than is asked for today. */
export function isOutdated(storedHash: string): boolean {
  const read = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=(\d+)\$/.exec(storedHash)
  if (!read) return true
  const [memory, time, lanes] = read.slice(1).map(Number) as [number, number, number]
  return memory < parameters.memoryCost || time < parameters.timeCost || lanes < parameters.parallelism
}
