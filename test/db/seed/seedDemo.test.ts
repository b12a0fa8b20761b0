import { afterAll, beforeAll, expect, it } from 'vitest'
import { connect } from '#db/client.ts'
import { projects } from '#db/schema/projects.ts'
import { users } from '#db/schema/users.ts'
import { seedDemo } from '#db/seed/seedDemo.ts'
import { accountService } from '#server/account/accountService.ts'
import { type FreshDatabase, freshDatabase } from '../../support/freshDatabase.ts'
import { memoryStore } from '../../support/memoryStore.ts'

let databases: FreshDatabase[]
beforeAll(async () => { databases = [await freshDatabase(), await freshDatabase()] })
afterAll(() => Promise.all(databases.map(({ drop }) => drop())))

it('hangs the demo studio on an empty database, once', async () => {
  const { db, pool } = connect(databases[0]!.url)
  const storage = memoryStore()
  const signIns = await seedDemo(db, storage)
  const count = async () => [await db.$count(users), await db.$count(projects), storage.files.size]
  const first = await count()
  expect(first).toEqual([signIns.length, 5, expect.any(Number)])
  expect(await seedDemo(db, storage)).toEqual(signIns)
  expect(await count()).toEqual(first)
  const known = (await db.select({ email: users.email }).from(users)).map(({ email }) => email)
  expect(known.sort()).toEqual(signIns.map(({ email }) => email).sort())
  await pool.end()
})

it('leaves a database alone in which somebody works', async () => {
  const { db, pool } = connect(databases[1]!.url)
  await accountService({ db, sendResetMail: () => {} }).signUp({ name: 'Orla', email: 'orla@example.org', password: 'seven quiet lanterns over water', units: 'cm' })
  expect(await seedDemo(db, memoryStore())).toEqual([])
  expect(await db.$count(users)).toBe(1)
  await pool.end()
})
