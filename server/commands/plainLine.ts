import { CommandError } from '#db/local/CommandError.ts'
import { SettingsError } from '../settings.ts'

type Facts = { code?: string; path?: string; address?: string; port?: number; severity?: string; message?: string; cause?: unknown; errors?: unknown[] }

/** The line a person can act on, for everything that goes wrong because of the machine or the settings; null for a bug of ours. */
export function plainLine(error: unknown): string | null {
  if (error instanceof CommandError || error instanceof SettingsError) return error.message
  if (typeof error !== 'object' || error === null) return null
  const { code, path, address, port, severity, message, cause, errors } = error as Facts
  if (code === 'ENOSPC') return 'The disk is full. Make room and start again.'
  if (code === 'EACCES' && port) return `Port ${port} is kept for root. Choose another above 1023.`
  if (code === 'EADDRINUSE') return portInUse(port)
  if (code === 'EADDRNOTAVAIL') return `This machine has no address ${address}. Set HOST to one it has.`
  if ((code === 'EACCES' || code === 'EPERM' || code === 'EROFS') && path) return `${path} cannot be written. Start as the user it belongs to.`
  if (code === 'ECONNREFUSED' || code === 'ENOTFOUND' || code === 'ETIMEDOUT') return `The database does not answer (${message || code}). Start it, or correct DATABASE_URL.`
  if (severity === 'FATAL') return `The database refuses: ${message}. Correct DATABASE_URL or the database.`
  // Wrapped by the driver, or one try for each address of a name.
  for (const inner of [cause, ...(errors ?? [])]) {
    const line = plainLine(inner)
    if (line) return line
  }
  return null
}

export const portInUse = (port: number | undefined) => `Port ${port} is in use. Stop what listens there, or choose another: PORT=${(port ?? 4310) + 1} npm start`
