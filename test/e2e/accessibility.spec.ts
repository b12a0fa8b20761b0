import AxeBuilder from '@axe-core/playwright'
import { type Page, expect, test } from '@playwright/test'
import { garments, signIn } from './people.ts'

const outside = ['/sign-in', '/sign-up', '/reset', '/reset-password']
const inside = ['/', '/new', '/people', '/patterns', '/studio', '/account', '/nothing-here']
const ofProject = ['', '/size', '/pieces', '/samples/1', '/samples/2', '/compare', '/final-cut', '/story', '/print/cutting-sheet']

for (const theme of ['light', 'dark'] as const) {
  test.describe(`axe finds nothing in the ${theme} theme`, () => {
    test.use({ colorScheme: theme })

    test('in front of the door', async ({ page }) => {
      for (const path of outside) await look(page, path)
    })
    test('on every page of the studio and of a project', async ({ page }) => {
      test.setTimeout(180_000)
      await signIn(page, 'ilse')
      const { tidemark } = await garments(page)
      const person = await page.evaluate(async () => {
        const me = await (await fetch('/api/me')).json()
        const base = `/api/studios/${me.memberships[0].studioId}`
        const [{ wearers }, { patterns }] = await Promise.all([fetch(`${base}/wearers`).then((r) => r.json()), fetch(`${base}/patterns`).then((r) => r.json())])
        return { wearer: wearers.find((one: { name: string }) => one.name === 'Tamsin Obi').id as string, pattern: patterns[0].id as string }
      })
      for (const path of [...inside, `/people/${person.wearer}/measurements`, `/patterns/${person.pattern}`, ...ofProject.map((page) => `/p/${tidemark}${page}`)]) await look(page, path)
    })
  })
}

async function look(page: Page, path: string): Promise<void> {
  await page.goto(path)
  await expect(page.getByRole('heading').first()).toBeVisible()
  await expect(page.locator('[aria-busy=true]')).toHaveCount(0)
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect(violations.map(({ id, nodes }) => `${path}: ${id}: ${nodes.slice(0, 3).map(({ target }) => target.join(' ')).join(' | ')}`)).toEqual([])
}
