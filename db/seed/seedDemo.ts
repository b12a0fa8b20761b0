import { eq, sql } from 'drizzle-orm'
import { type Db, type Queryable } from '#db/client.ts'
import { studios } from '#db/schema/studios.ts'
import { users } from '#db/schema/users.ts'
import { accountService } from '#server/account/accountService.ts'
import { type PhotographStore } from '#server/storage/store.ts'
import { studioService } from '#server/studios/studioService.ts'
import { wearerService } from '#server/wearers/wearerService.ts'
import { hangAlmanac, hangLarkrise, hangLedger, hangTidemark, hangTowpath } from './demoProjects.ts'
import { type People, SeedStudio, daysAgo } from './SeedStudio.ts'

export type SignIn = { email: string; password: string; who: string }
const password = 'chalk dots and tacking'
const signIns: readonly SignIn[] = [
  { email: 'ilse@alderlane.example', password, who: 'owner and maker' },
  { email: 'rosalind@alderlane.example', password, who: 'fitter' },
  { email: 'jonah@alderlane.example', password, who: 'maker, and wearer of the Towpath trousers' },
  { email: 'tamsin@alderlane.example', password, who: 'wearer: sees what is made for her' },
]

/**
 * Fills an empty database with the demo studio, through the services a person goes through; everything or nothing.
 * @returns the sign-ins of the demo studio; none where the database holds somebody's own work instead
 */
export async function seedDemo(db: Db, storage: PhotographStore): Promise<readonly SignIn[]> {
  const [known] = await db.select({ people: sql<number>`count(*)::int`, demo: sql<number>`(count(*) filter (where ${users.email} = ${signIns[0]!.email}))::int` }).from(users)
  if (known!.people > 0) return known!.demo ? signIns : []
  console.log('Hanging the demo studio.')
  await db.transaction((tx) => fill(tx, storage))
  return signIns
}

async function fill(db: Queryable, storage: PhotographStore): Promise<void> {
  const accounts = accountService({ db, sendResetMail: () => {} })
  const signUp = (name: string, email: string, studioName?: string) => accounts.signUp({ name, email, password, units: 'cm', ...(studioName && { studioName }) })
  const ilse = await signUp('Ilse Marchetti-Brandt', signIns[0]!.email, 'Alder Lane Sewing Room')
  const studioId = (await accounts.me(ilse)).memberships[0]!.studioId

  const join = async (name: string, email: string, role: 'fitter' | 'maker' | 'wearer') => {
    const userId = await signUp(name, email)
    const own = (await accounts.me(userId)).memberships[0]!.studioId
    await studioService({ db }).addMember(studioId, userId, role)
    // Their own empty studio would only stand in the way of the demo.
    await db.delete(studios).where(eq(studios.id, own))
    return userId
  }
  const people: People = {
    ilse, rosalind: await join('Rosalind Achterberg', signIns[1]!.email, 'fitter'), jonah: await join('Jonah Vail', signIns[2]!.email, 'maker'), tamsin: await join('Tamsin Obi', signIns[3]!.email, 'wearer'),
  }

  const wearers = wearerService({ db })
  const self = (await wearers.list(studioId, { userId: ilse, role: 'owner' }))[0]!
  const wearer = async (name: string, account?: string) => {
    const { id } = await wearers.create(studioId, { name, note: '' })
    if (account) await wearers.linkAccount(studioId, id, account)
    return id
  }
  const [tamsin, wren, jonah] = [await wearer('Tamsin Obi', people.tamsin), await wearer('Wren Castellan'), await wearer('Jonah Vail', people.jonah)]

  const studio = new SeedStudio(db, storage, studioId, people)
  await studio.measure(tamsin, daysAgo(62), { bust: 974, 'high-bust': 894, waist: 801, hip: 1066 })
  await studio.measure(tamsin, daysAgo(12), { bust: 970, 'high-bust': 890, underbust: 820, waist: 795, hip: 1060, 'waist-to-hip': 205, 'back-waist-length': 402, shoulder: 122, 'upper-arm': 300 })
  await studio.measure(wren, daysAgo(40), { bust: 920, 'high-bust': 870, waist: 742, hip: 1008, 'back-waist-length': 408 })
  await studio.measure(jonah, daysAgo(9), { waist: 846, hip: 1016, thigh: 592, 'crotch-depth': 268, 'inside-leg': 800 })
  await studio.measure(self.id, daysAgo(18), { waist: 838, hip: 1012, 'waist-to-hip': 200 })

  await hangAlmanac(studio, wren)
  await hangLedger(studio, tamsin)
  await hangLarkrise(studio, self.id)
  await hangTowpath(studio, jonah)
  await hangTidemark(studio, tamsin)
}
