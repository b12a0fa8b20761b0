import { expect, it } from 'vitest'
import { plainLine } from '#server/commands/plainLine.ts'

const error = (facts: object) => Object.assign(new Error('inner words'), facts)

it('has a line for what the machine or the settings stand in the way with', () => {
  expect(plainLine(error({ code: 'ENOSPC' }))).toMatch(/disk is full/)
  expect(plainLine(error({ code: 'EADDRINUSE', port: 4310 }))).toBe('Port 4310 is in use. Stop what listens there, or choose another: PORT=4311 npm start')
  expect(plainLine(error({ code: 'EACCES', path: '/srv/photographs' }))).toMatch(/^\/srv\/photographs cannot be written/)
  expect(plainLine(error({ severity: 'FATAL', code: '28P01' }))).toMatch(/The database refuses: inner words/)
})

it('looks into errors that wrap others', () => {
  const refused = error({ code: 'ECONNREFUSED' })
  expect(plainLine(new Error('Failed query', { cause: refused }))).toMatch(/database does not answer/)
  expect(plainLine(new AggregateError([refused, refused]))).toMatch(/database does not answer/)
})

it('has none for a bug', () => {
  expect(plainLine(new TypeError('x is undefined'))).toBeNull()
  expect(plainLine('thrown text')).toBeNull()
})
