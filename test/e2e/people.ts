import { type Page, expect } from '@playwright/test'

const demoPassword = 'chalk dots and tacking'

/** Signs a member of the demo studio in. */
export async function signIn(page: Page, who: 'ilse' | 'rosalind' | 'jonah' | 'tamsin'): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(`${who}@alderlane.example`)
  await page.getByLabel('Password', { exact: true }).fill(demoPassword)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('On the rail')
}

/** Ids of the demo's garments by their first word: `tidemark`, `larkrise` … */
export async function garments(page: Page): Promise<Record<string, string>> {
  return page.evaluate(async () => {
    const me = await (await fetch('/api/me')).json()
    const { projects } = await (await fetch(`/api/studios/${me.memberships[0].studioId}/projects`)).json()
    return Object.fromEntries(projects.map(({ id, name }: { id: string; name: string }) => [name.split(' ')[0]!.toLowerCase(), id]))
  })
}
