import { expect, test } from '@playwright/test'
import { garments, signIn } from './people.ts'

// An unstyled page passes every click test: one look at computed styles, under the policy the server sends.
test('pages are styled and nothing is refused under the strict content security policy', async ({ page }) => {
  const refused: string[] = []
  page.on('console', (message) => { if (/Content Security Policy/i.test(message.text())) refused.push(message.text()) })
  const answer = await page.goto('/sign-in')
  expect(answer?.headers()['content-security-policy']).not.toContain("script-src 'self' 'unsafe-inline'")
  const button = page.getByRole('button', { name: 'Sign in' })
  await expect(button).toHaveCSS('background-color', 'rgb(36, 80, 122)') // woad, the tokens' #24507A
  await expect(button).toHaveCSS('font-family', /Work Sans/)
  await signIn(page, 'ilse')
  const { tidemark } = await garments(page)
  for (const path of ['', '/size', '/pieces', '/samples/1', '/final-cut', '/story']) {
    await page.goto(`/p/${tidemark}${path}`)
    await expect(page.getByRole('heading').first()).toBeVisible()
  }
  expect(refused).toEqual([])
})
