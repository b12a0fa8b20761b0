import { type AddressInfo } from 'node:net'
import { type ParsedMail, simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { smtpMailer } from '#server/mail/smtpMailer.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

const received: ParsedMail[] = []
const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  onData(stream, _session, done) {
    simpleParser(stream).then((mail) => { received.push(mail); done() }, done)
  },
})
let t: TestApp
beforeAll(async () => {
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve) })
  const { port } = server.server.address() as AddressInfo
  t = await testApp({ given: { mailer: smtpMailer(`smtp://127.0.0.1:${port}`, 'Proofcloth <no-reply@example.org>') } })
})
afterAll(async () => {
  await t.close()
  await new Promise<void>((resolve) => { server.close(() => resolve()) })
})

describe('the mail for a new password', () => {
  it('reaches the mail server with a link that works', async () => {
    await t.anonymous.post('/api/password-resets').send({ email: t.owner.email }).expect(204)
    await vi.waitFor(() => expect(received).toHaveLength(1))
    const [mail] = received
    expect(mail!.from!.text).toContain('no-reply@example.org')
    expect(mail!.to).toMatchObject({ text: t.owner.email })
    const link = new URL(/https?:\S+/.exec(mail!.text!)![0])
    expect(link.origin).toBe(t.settings.publicUrl)
    // Behind the # it is sent to no server.
    expect(link.search).toBe('')
    await t.anonymous.post('/api/password-resets/use').send({ token: link.hash.slice(1), password: 'nine green bottles on a shelf' }).expect(204)
  })
})

it('answers as always while the mail server is away, and says so in the log without the address', async () => {
  const lines: string[] = []
  const without = await testApp({ log: (line) => lines.push(line), given: { mailer: smtpMailer('smtp://127.0.0.1:1', 'x@example.org') } })
  await without.anonymous.post('/api/password-resets').send({ email: without.owner.email }).expect(204)
  await vi.waitFor(() => expect(lines.join('')).toContain('could not be sent'))
  expect(lines.join('')).not.toContain(without.owner.email)
  await without.close()
})
