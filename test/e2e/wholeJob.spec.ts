import { type Page, expect, test } from '@playwright/test'
import { photograph } from '../support/job.ts'

// The whole job as a new person does it: account, measurements, pattern, size, tracing, sample 1, photographs with marks, a suggestion
// accepted, sample 2 with it carried in, settled, final cut, cutting sheet. On a desk and on a phone.
test.describe.configure({ mode: 'serial' })

test('a maker takes a skirt from the tape to the cleared cut', async ({ page }, info) => {
  test.setTimeout(240_000)
  const phone = info.project.name === 'phone'
  const name = `Ada ${info.project.name}`

  await test.step('makes an account and hangs a garment', async () => {
    await page.goto('/sign-up')
    await page.getByLabel('Your name').fill(name)
    await page.getByLabel('E-mail address').fill(`ada-${info.project.name}-${Date.now()}@example.org`)
    await page.getByLabel('Password', { exact: true }).fill('three quiet looms in the rain')
    await page.getByRole('button', { name: 'Make the account' }).click()
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('On the rail')
    await page.goto('/new')
    await page.getByLabel('Name of the garment').fill('Bramble skirt')
    await page.getByText('Skirt', { exact: true }).click()
    await page.getByRole('button', { name: 'Hang it on the rail' }).click()
    await expect(page).toHaveURL(/\/p\/[^/]+\/size$/)
  })
  const project = new URL(page.url()).pathname.replace('/size', '')

  await test.step('pastes a size chart', async () => {
    await page.getByRole('link', { name: 'Type the size chart' }).click()
    await page.getByRole('button', { name: 'Paste from a spreadsheet' }).click()
    await page.getByLabel('Paste the chart with its headings').fill('Size\tWaist\tHip\n12\t70\t96\n14\t74\t100\n16\t78\t104')
    await page.getByRole('button', { name: 'Take these 3 sizes' }).click()
    await expect(page.getByLabel('Hip of size 16')).toHaveValue('104')
    await expect(page.getByText('Saved', { exact: true })).toBeVisible()
  })

  await test.step('takes the measurements, twice each', async () => {
    await page.goto(`${project}/size`)
    await page.getByRole('link', { name: 'Take the measurements' }).click()
    await page.getByRole('button', { name: 'Take the measurements' }).first().click()
    for (const [measurement, first, second] of [['Waist', '74', '74.4'], ['Full hip', '103.8', '104.2']] as const) {
      const group = page.getByRole('group', { name: measurement, exact: true })
      await group.getByLabel('First reading').fill(first)
      await group.getByLabel('Second reading').fill(second)
      await group.getByLabel('Second reading').press('Tab')
    }
    await page.getByRole('button', { name: 'Save the set' }).click()
    await expect(page.getByText('The set is saved.')).toBeVisible()
  })

  await test.step('keeps a size that blends from 14 to 16', async () => {
    await page.goto(`${project}/size`)
    await expect(page.getByLabel('The size you cut')).toContainText('16')
    await page.getByRole('button', { name: 'Keep this size' }).click()
    await expect(page.getByText(/^Kept on/)).toBeVisible()
  })

  await test.step('traces every piece with its marks and takes the last look', async () => {
    await page.goto(`${project}/pieces`)
    await page.getByRole('button', { name: 'Start with the usual pieces' }).click()
    const cards = page.getByRole('article')
    await expect(cards.first()).toBeVisible()
    for (let i = 0; i < await cards.count(); i++) {
      const card = cards.nth(i)
      for (const kind of ['notches', 'darts']) {
        const count = card.getByLabel(new RegExp(`How many ${kind}`))
        if (await count.count()) {
          await count.fill('2')
          await count.press('Tab')
          await expect(page.getByText('Saved', { exact: true })).toBeVisible()
        }
      }
      await card.getByRole('button', { name: 'Tick all that is there' }).click()
      await expect(card.getByText('Every mark is on it')).toBeVisible()
      await expect(page.getByText('Saved', { exact: true })).toBeVisible()
    }
    await page.getByRole('button', { name: 'Take the last look' }).click()
    await page.getByRole('button', { name: 'Everything is on it' }).click()
    await page.getByRole('button', { name: 'Sew sample 1 from it' }).click()
    await expect(page).toHaveURL(/samples\/1$/)
  })

  await test.step('photographs the sample, one picture turned by EXIF with a place inside', async () => {
    await upload(page, await photograph({ width: 1200, height: 900, orientation: 6, place: true }), 'front.jpg')
    await expect(page.getByRole('img', { name: /front/i }).first()).toBeVisible()
    const kept = await page.evaluate(async (path) => {
      const fitting = await (await fetch(`/api/projects/${path}/samples/1`)).json()
      const file = await (await fetch(`/api/projects/${path}/photographs/${fitting.photographs[0].id}/full`)).arrayBuffer()
      return { width: fitting.photographs[0].width, height: fitting.photographs[0].height, exif: new TextDecoder('latin1').decode(file).includes('Exif') }
    }, project.replace('/p/', ''))
    expect(kept).toEqual({ width: 900, height: 1200, exif: false })
  })

  await test.step('marks the strain at the hip and accepts what is suggested', async () => {
    await moveOn(page, project, 1, ['to-photograph'])
    await observe(page, project, 1, { sign: 'tight', zone: 'hip', line: 'side-seam', amount: { mm: 40, as: 'cloth' } })
    await page.reload()
    if (phone) await openSuggestions(page)
    await page.getByRole('button', { name: 'Accept' }).first().click()
    await expect(page.getByText('You accepted this').first()).toBeVisible()
  })

  await test.step('carries the change into sample 2 and settles it there', async () => {
    await moveOn(page, project, 1, ['with-fitter', 'reviewed'])
    await page.evaluate((path) => fetch(`/api/projects/${path}/samples`, { method: 'POST', headers: { 'Content-Type': 'application/json' }, body: '{}' }), project.replace('/p/', ''))
    await page.goto(`${project}/samples/2`)
    if (phone) await page.getByRole('button', { name: 'All observations' }).click()
    await page.getByRole('button', { name: 'Gone', exact: true }).first().click()
    await expect(page.getByRole('button', { name: 'Look again' }).first()).toBeVisible()
    await moveOn(page, project, 2, ['to-photograph', 'reviewed'])
  })

  await test.step('draws the change on the pieces, ticks the list and clears the cut', async () => {
    await page.goto(`${project}/pieces`)
    const toDraw = page.getByRole('checkbox', { name: /Let the side seams out/ })
    await expect(toDraw.first()).toBeVisible()
    for (let i = 0; i < await toDraw.count(); i++) {
      await toDraw.nth(i).check({ force: true })
      await expect(page.getByText('Saved', { exact: true })).toBeVisible()
    }
    await page.goto(`${project}/final-cut`)
    await expect(page.getByText('The final cut is not open yet')).toHaveCount(0)
    const list = page.getByRole('region', { name: 'Before the scissors' })
    const boxes = list.getByRole('checkbox')
    for (let i = 0; i < await boxes.count(); i++) await boxes.nth(i).check({ force: true })
    await expect(page.getByText('Saved', { exact: true })).toBeVisible()
    await page.getByRole('button', { name: 'Clear to cut' }).click()
    await page.getByRole('dialog').getByRole('button', { name: 'Clear to cut' }).click()
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Cleared to cut')
  })

  await test.step('prints the cutting sheet', async () => {
    await page.getByRole('link', { name: 'Print cutting sheet' }).click()
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Bramble skirt')
    await expect(page.getByRole('row', { name: /Front/ }).first()).toContainText('Let the side seams out')
    const square = await page.getByText('Measure me:').locator('..').boundingBox()
    expect(square!.width).toBeCloseTo((50 / 25.4) * 96, 0) // 50 mm at 96 CSS pixels to 25.4 mm
  })
})

async function upload(page: Page, buffer: Buffer, name: string): Promise<void> {
  await page.locator('input[type=file]').first().setInputFiles({ name, mimeType: 'image/jpeg', buffer })
}
async function openSuggestions(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'All observations' }).click()
}
/** Moves a sample on through the API, as its buttons do. */
async function moveOn(page: Page, project: string, number: number, states: readonly string[]): Promise<void> {
  await page.evaluate(async ({ path, wanted }) => {
    for (const state of wanted) {
      const { sample } = await (await fetch(path)).json()
      const answer = await fetch(path, { method: 'PATCH', headers: { 'Content-Type': 'application/json' }, body: JSON.stringify({ state, version: sample.version }) })
      if (!answer.ok) throw new Error(await answer.text())
    }
  }, { path: `/api/projects/${project.replace('/p/', '')}/samples/${number}`, wanted: states })
}
/** Notes an observation with a mark on the first photograph through the API. */
async function observe(page: Page, project: string, number: number, seen: object): Promise<void> {
  await page.evaluate(async ({ path, given }) => {
    const { photographs } = await (await fetch(path)).json()
    const body = { photographId: photographs[0].id, mark: { kind: 'tight', shape: 'stroke', points: [[0.3, 0.5], [0.7, 0.5]] }, view: 'front', side: 'both', direction: null, towards: null, severity: 2, note: '', ...given }
    const answer = await fetch(`${path}/observations`, { method: 'POST', headers: { 'Content-Type': 'application/json' }, body: JSON.stringify(body) })
    if (!answer.ok) throw new Error(await answer.text())
  }, { path: `/api/projects/${project.replace('/p/', '')}/samples/${number}`, given: seen })
}
