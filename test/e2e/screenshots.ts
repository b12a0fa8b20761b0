import { mkdirSync } from 'node:fs'
import { chromium } from '@playwright/test'
import { garments, signIn } from './people.ts'

// The README's pictures, from a running demo at BASE_URL.
const folder = 'test/e2e/screenshots'
mkdirSync(folder, { recursive: true })
const browser = await chromium.launch({ executablePath: process.env.CHROMIUM, args: ['--no-sandbox', '--disable-gpu'] })

async function pictures(viewport: { width: number; height: number }, colorScheme: 'light' | 'dark', shots: Record<string, (ids: Record<string, string>) => string>) {
  const context = await browser.newContext({ baseURL: process.env.BASE_URL, viewport, colorScheme, hasTouch: viewport.width < 700, reducedMotion: 'reduce' })
  const page = await context.newPage()
  await signIn(page, 'ilse')
  const ids = await garments(page)
  for (const [name, path] of Object.entries(shots)) {
    await page.goto(path(ids))
    await page.waitForLoadState('networkidle')
    await page.screenshot({ path: `${folder}/${name}.jpg`, type: 'jpeg', quality: 82 })
  }
  await context.close()
}

await pictures({ width: 1440, height: 900 }, 'light', {
  'rail': () => '/',
  'fitting': ({ tidemark }) => `/p/${tidemark}/samples/2`,
  'overview': ({ tidemark }) => `/p/${tidemark}`,
})
await pictures({ width: 390, height: 844 }, 'dark', { 'fitting-phone-dark': ({ tidemark }) => `/p/${tidemark}/samples/2` })
await browser.close()
