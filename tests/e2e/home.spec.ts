import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import type { Edition } from '@/lib/method/types'
import { makeAnswers } from '../fixtures/edition'
import { workOut } from '../fixtures/second-route'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

/**
 * The first five names and whole fits in this light, worked from the published edition by the second route: one spot,
 * front light under 100 lux, everything else as the method assumes.
 */
function bestFive({ devices }: Edition, lux: number): string[] {
  const answers = makeAnswers({ spots: [{ lux, hours: 1, frontLight: lux < 100 }] })
  return workOut(devices, answers)
    .rows.slice(0, 5)
    .map(({ slug, fit }) => `${devices.find((device) => device.slug === slug)?.name} ${Math.round(fit)}`)
}

const pages = (page: Page) => page.getByRole('list', { name: /pages that fit best/ }).getByRole('listitem')

/** Names and fits as they stand, best first. */
const standing = async (page: Page): Promise<string[]> =>
  (await pages(page).allInnerTexts()).map((text) => text.replace(/\s+/g, ' ').match(/^.*? \d+(?= of 100)/)?.[0] ?? text)

const slider = (page: Page) => page.getByRole('slider', { name: 'Light on the page' })

test('the home page opens under a bedside lamp with the pages that fit best there', async ({ page, request }) => {
  const edition = await latest(request)
  await page.goto('/')
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Find the page that suits your light')
  await expect(page.getByRole('status')).toContainText('Bedside lamp, about 80 lux: the 5 closest fits of 16 devices')
  expect(await standing(page)).toEqual(bestFive(edition, 80))
})

test('the slider turns the light from lights off to full sun, and the order follows it', async ({ page, request }) => {
  const edition = await latest(request)
  await page.goto('/')
  await slider(page).focus()
  for (const [key, words, lux] of [
    ['Home', 'Lights off, about 0.1 lux', 0.1],
    ['End', 'Full sun, about 80,000 lux', 80_000],
  ] as const) {
    await page.keyboard.press(key)
    await expect(page.getByRole('status')).toContainText(words)
    await expect(slider(page)).toHaveAttribute('aria-valuetext', words)
    await expect.poll(() => standing(page)).toEqual(bestFive(edition, lux))
  }
  expect(bestFive(edition, 0.1)).not.toEqual(bestFive(edition, 80_000))
})

test('the light stays in the address, so that it can be shared', async ({ page }) => {
  await page.goto('/')
  await page.getByRole('link', { name: 'Desk' }).click()
  await expect(page.getByRole('status')).toContainText('Desk, about 400 lux')
  await expect(page).toHaveURL(/\?lux=400$/)
  await page.reload()
  await expect(page.getByRole('status')).toContainText('Desk, about 400 lux')
  await page.getByRole('link', { name: 'Lampleaf' }).click()
  await expect(page).toHaveURL(/\/$/)
  await expect(page.getByRole('status')).toContainText('Bedside lamp, about 80 lux')
})

test('a number of lux can be typed, and what is no number is told so', async ({ page, request }) => {
  const edition = await latest(request)
  await page.goto('/')
  const box = page.getByRole('textbox', { name: 'Lux' })
  await box.fill('1,500')
  await page.getByRole('button', { name: 'Set' }).click()
  await expect(page.getByRole('status')).toContainText('Beside a window, about 1,500 lux')
  await expect.poll(() => standing(page)).toEqual(bestFive(edition, 1500))
  await box.fill('bright')
  await box.press('Enter')
  await expect(page.getByRole('alert').filter({ hasText: 'Give a number' })).toBeVisible()
  await expect(box).toHaveAttribute('aria-invalid', 'true')
  await expect(page.getByRole('status')).toContainText('1,500 lux')
})

test('in the dark the pages with a front light say that it is on', async ({ page }) => {
  await page.goto('/?lux=0.1')
  await expect(pages(page).filter({ hasText: 'front light on' })).toHaveCount(5)
  await page.goto('/?lux=400')
  await expect(pages(page).filter({ hasText: 'front light on' })).toHaveCount(0)
})

for (const asked of ['?lux=bright', '?lux=-3', '?lux=5&lux=6', '?step=x', '?lux=%00', '?lux=1e999']) {
  test(`an address that asks for no light we understand, ${asked}, opens under the bedside lamp`, async ({ page }) => {
    expect((await page.goto(`/${asked}`))?.status()).toBe(200)
    await expect(page.getByRole('status')).toContainText('Bedside lamp')
  })
}

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('links, number and slider each turn the lamp', async ({ page, request }) => {
    const edition = await latest(request)
    await page.goto('/')
    await page.getByRole('link', { name: 'Full sun' }).click()
    await expect(page.getByRole('status')).toContainText('Full sun, about 80,000 lux')
    expect(await standing(page)).toEqual(bestFive(edition, 80_000))

    await page.getByRole('textbox', { name: 'Lux' }).fill('0.1')
    await page.getByRole('button', { name: 'Set' }).click()
    await expect(page.getByRole('status')).toContainText('Lights off')
    expect(await standing(page)).toEqual(bestFive(edition, 0.1))

    await slider(page).press('End')
    await page.getByRole('button', { name: 'Show this light' }).click()
    await expect(page.getByRole('status')).toContainText('Full sun')
  })
})

test('the bench’s findings are those of the edition, each with its doubt', async ({ page, request }) => {
  const { devices, number } = await latest(request)
  const lightest = devices.reduce((best, device) => (device.page.L > best.page.L ? device : best))
  const chroma = ({ page: { a, b } }: (typeof devices)[number]) => Math.hypot(a, b)
  const leastTinted = devices.reduce((best, device) => (chroma(device) < chroma(best) ? device : best))
  await page.goto('/')
  await expect(page.getByText(`16 devices on the bench · Edition ${number}`)).toBeVisible()
  const findings = page.getByRole('region', { name: 'What the bench found this edition' })
  await expect(findings.getByRole('link', { name: lightest.name })).toBeVisible()
  await expect(findings.getByText(lightest.page.L.toFixed(1), { exact: true })).toBeVisible()
  await expect(findings.getByRole('link', { name: leastTinted.name })).toBeVisible()
  await expect(findings.getByText(chroma(leastTinted).toFixed(1), { exact: true })).toBeVisible()
  await expect(findings.getByText(/±.*at about 95/)).toHaveCount(2)
})

test('the ladder gives its figures as a table, too', async ({ page }) => {
  await page.goto('/')
  const section = page.getByRole('region', { name: 'Same page, different light' })
  await section.getByText('The same figures as a table').click()
  await expect(section.getByRole('row')).toHaveCount(17)
})

test('there is one thing to do first: the quiz', async ({ page }) => {
  await page.goto('/')
  await page.getByRole('link', { name: /^Take the quiz/ }).click()
  await expect(page).toHaveURL(/\/quiz/)
})

test('before the first release the home page says so kindly, and still leads to the method', async ({ page }) => {
  await page.goto(fromAddress('EMPTY_URL'))
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
  await expect(page.getByRole('slider')).toHaveCount(0)
})

test('the home page is accessible in every theme', async ({ page }) => {
  await expectAccessible(page, '/')
  await expectAccessible(page, '/?lux=0.1')
})
