import { describe, expect, it } from 'vitest'
import { SettingsError, readSettings } from '#server/settings.ts'

const whole = {
  DATABASE_URL: 'postgres://app:x@db.internal:5432/proofcloth', SESSION_SECRET: 'Zk3vQ9xW1mN7cR5tY8uP2aL6sD4fG0hJ', PUBLIC_URL: 'https://journal.example.org/',
  PHOTO_STORAGE: 'disk:/var/lib/proofcloth/photographs', SMTP_URL: 'smtp://mail.internal:587', MAIL_FROM: 'Proofcloth <no-reply@example.org>',
}
const faults = (env: Record<string, string | undefined>) => {
  try {
    readSettings(env, 'production')
  } catch (error) {
    if (error instanceof SettingsError) return error.lines
    throw error
  }
  return []
}

describe('in production', () => {
  it('reads a whole set', () => {
    expect(readSettings(whole, 'production')).toMatchObject({
      mode: 'production', secure: true, publicUrl: 'https://journal.example.org', photoStorage: { kind: 'disk', folder: '/var/lib/proofcloth/photographs' }, rateLimitScale: 1,
    })
  })
  it('says in one line each what is missing', () => {
    const lines = faults({})
    expect(lines.map((line) => line.split(' ')[0]).toSorted()).toEqual(['DATABASE_URL', 'MAIL_FROM', 'PHOTO_STORAGE', 'PUBLIC_URL', 'SESSION_SECRET', 'SMTP_URL'])
    for (const line of lines) expect(line).not.toContain('\n')
  })
  it('treats an empty variable as a missing one', () => {
    expect(faults({ ...whole, SMTP_URL: '' })).toHaveLength(1)
  })
  it.each(['r7!kQ', 'x'.repeat(64), 'abababababababababababababababababab', '1234567890'.repeat(4)])('refuses the weak secret %s, without repeating it', (secret) => {
    const [line, ...more] = faults({ ...whole, SESSION_SECRET: secret })
    expect(line).toMatch(/^SESSION_SECRET is too (short|simple)/)
    expect(line).not.toContain(secret)
    expect(more).toEqual([])
  })
  it.each([['PUBLIC_URL', 'journal.example.org'], ['PUBLIC_URL', 'http://journal.example.org'], ['PHOTO_STORAGE', '/var/lib/photographs'], ['DATABASE_URL', 'mysql://x'], ['PORT', 'http'], ['SMTP_URL', 'https://mail']])('refuses %s=%s', (name, value) => {
    expect(faults({ ...whole, [name]: value })).toEqual([expect.stringContaining(name)])
  })
})

it('fills in what a start on one’s own machine needs', () => {
  expect(readSettings({ DATABASE_URL: 'postgres://app@127.0.0.1:5432/x', SESSION_SECRET: whole.SESSION_SECRET }, 'local')).toMatchObject({
    mode: 'local', secure: false, publicUrl: null, host: '127.0.0.1', smtpUrl: null, photoStorage: { kind: 'disk' },
  })
})
