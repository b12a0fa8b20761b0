import { mkdir, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { type Mail, type Mailer } from './mailer.ts'

/** Mails that were not sent anywhere: kept in memory for tests. */
export type Outbox = Mailer & { mails: Mail[] }

export function memoryOutbox(): Outbox {
  const mails: Mail[] = []
  return { mails, async send(mail) { mails.push(mail) } }
}

/** Writes each mail as a text file, so that a start on one's own machine needs no mail server. */
export function folderOutbox(folder: string): Mailer {
  return {
    async send({ to, subject, text }) {
      await mkdir(folder, { recursive: true, mode: 0o700 })
      const name = `${new Date().toISOString().replaceAll(':', '-')}.txt`
      await writeFile(join(folder, name), `To: ${to}\nSubject: ${subject}\n\n${text}\n`, { mode: 0o600 })
    },
  }
}
