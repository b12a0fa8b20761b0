import { expect, it } from 'vitest'
import { readPhotographFile } from '#shared/contracts/photograph.ts'
import { addressOf } from '../../../src/api/call.ts'
import { photographUrl } from '../../../src/api/photographUrl.ts'

it('is the address the contract gives', () => {
  expect(photographUrl('a', 'b', 'thumb')).toBe(addressOf(readPhotographFile, { projectId: 'a', photographId: 'b', size: 'thumb' }))
})
