import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import type { Edition } from '@/lib/method/types'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

/** Names in the order of the table's rows, or of the cards it becomes on a phone. */
const namesIn = (page: Page) =>
  page
    .getByRole('table', { name: /^16 devices/ })
    .getByRole('rowheader')
    .getByRole('link')
    .allTextContents()

/** Selects an order, by the head of its column or, where the table is cards, in the list above them. */
async function orderBy(page: Page, head: RegExp, words: string) {
  const column = page.getByRole('columnheader').getByRole('link', { name: head })
  await expect(page.getByRole('table', { name: /^16 devices/ })).toBeVisible()
  if (await column.isVisible()) await column.click()
  else await page.getByRole('navigation', { name: 'Order by' }).getByRole('link', { name: words }).click()
}

const by =
  <T>(value: (one: T) => number | string) =>
  (one: T, other: T) =>
    value(one) < value(other) ? -1 : 1

test('the list has every device of the edition, the lightest page first', async ({ page, request }) => {
  const { devices } = await latest(request)
  await page.goto('/devices')
  await expect(page).toHaveTitle(/^Devices/)
  const lightestFirst = [...devices].sort(by(({ page }) => -page.L)).map(({ name }) => name)
  await expect.poll(() => namesIn(page)).toEqual(lightestFirst)
})

test('the list is ordered by what a reader selects, and back again by selecting it once more', async ({
  page,
  request,
}) => {
  const { devices } = await latest(request)
  await page.goto('/devices')
  await orderBy(page, /^Chroma/, 'chroma')
  await expect(page).toHaveURL(/sort=chroma/)
  const leastTinted = [...devices].sort(by(({ page: { a, b } }) => Math.hypot(a, b))).map(({ name }) => name)
  await expect.poll(() => namesIn(page)).toEqual(leastTinted)
  await orderBy(page, /^Chroma/, 'chroma')
  await expect(page).toHaveURL(/order=descending/)
  await expect.poll(() => namesIn(page)).toEqual(leastTinted.toReversed())
})

test('the column the list is ordered by says so to assistive technology', async ({ page }) => {
  await page.goto('/devices?sort=name')
  await expect(page.locator('th[aria-sort]')).toHaveText(/^Device/)
  await expect(page.locator('th[aria-sort]')).toHaveAttribute('aria-sort', 'ascending')
})

test('every figure has its doubt, whiteness and tint their dagger, and what is unknown is said', async ({
  page,
  request,
}) => {
  const { devices } = await latest(request)
  await page.goto('/devices')
  const rows = page.getByRole('table', { name: /^16 devices/ }).getByRole('row')
  for (const device of devices) {
    const row = rows.filter({ has: page.getByRole('link', { name: device.name, exact: true }) })
    const text = ((await row.textContent()) ?? '').replace(/\s+/g, ' ')
    expect(text).toContain(device.page.L.toFixed(1))
    expect(text.match(/±/g)).toHaveLength(5)
    expect(text.match(/†/g)).toHaveLength(2)
    const unknown = [device.diagonal, device.colour, device.frontLight, device.price].filter((fact) => fact === null)
    expect(text.match(/not stated/g)?.length ?? 0, device.name).toBe(unknown.length)
    if (device.provisional) expect(text).toContain('provisional: one unit')
  }
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a reader orders the list and opens a device', async ({ page }) => {
    await page.goto('/devices')
    await orderBy(page, /^Device/, 'name')
    await page.getByRole('link', { name: 'Ostler Plain 7' }).click()
    await expect(page.getByRole('heading', { level: 1, name: 'Ostler Plain 7' })).toBeVisible()
    await page.getByText(/^All \d+ readings/).click()
    await expect(page.getByRole('table', { name: /by D65/ })).toBeVisible()
  })
})

test('a device’s page gives its figures, each with its doubt, and leads from each to its method', async ({
  page,
  request,
}) => {
  const { devices } = await latest(request)
  const device = devices.find(({ slug }) => slug === 'ostler-plain-7')!
  await page.goto('/devices/ostler-plain-7')
  await expect(page).toHaveTitle(/^Ostler Plain 7/)
  await expect(page.locator('meta[name="description"]')).toHaveAttribute('content', /L\* \d+\.\d ±\s\d/)
  const figures = page.getByRole('region', { name: 'Figures of the page' })
  for (const figure of [
    device.page.L.toFixed(1),
    `${Math.round(device.whiteness)}†`,
    `${device.tint.toFixed(1)}†`,
    device.contrast.toFixed(1),
  ]) {
    await expect(figures.getByText(figure)).toBeVisible()
  }
  await expect(figures.getByText(/^±/)).toHaveCount(5)
  await expect(figures.getByText(/^\d+(st|nd|rd|th) of 16, rank \d+/)).toBeVisible()
  await figures.getByRole('link', { name: 'Whiteness W10' }).click()
  await expect(page).toHaveURL(/\/method#q-whiteness$/)
  await expect(page.getByText('CIE whiteness of the page')).toBeInViewport()
})

// 1 + 0 + (94.6 + 16)/116 and so on, the cube root scale undone by hand: Y of the control paper over Y of the page.
test('a device’s page says how many times the light of the control paper it needs', async ({ page, request }) => {
  const { devices, control } = await latest(request)
  const device = devices.find(({ slug }) => slug === 'pellow-broadsheet-13-colour')!
  const y = (L: number) => ((L + 16) / 116) ** 3
  await page.goto('/devices/pellow-broadsheet-13-colour')
  const times = (y(control.paper.L) / y(device.page.L)).toFixed(2)
  await expect(page.getByRole('region', { name: 'In your light' })).toContainText(`${times} ±`)
})

test('a device known from one unit is marked provisional', async ({ page }) => {
  await page.goto('/devices/pellow-broadsheet-13-colour')
  await expect(page.getByText('Provisional: measured on a single unit')).toBeVisible()
  await expect(page.getByRole('region', { name: 'How we know' })).toContainText('one unit only')
})

test('a corrected figure keeps its note and the replies to it, and the withdrawn readings stay visible', async ({
  page,
}) => {
  await page.goto('/devices/tamber-reed-7')
  const corrections = page.getByRole('region', { name: 'Corrections and replies' })
  await expect(corrections).toContainText('wrong in edition 1, put right in edition 2')
  await expect(corrections.locator('blockquote')).toHaveCount(2)
  await page.getByText(/^All \d+ readings/).click()
  await expect(page.getByText(/withdrawn: The front light was on/).first()).toBeVisible()
})

test('a reading left out stays, with the reason', async ({ page }) => {
  await page.goto('/devices/haldon-copybook-10')
  await page.getByText(/^All \d+ readings/).click()
  await expect(page.getByText(/left out: Stands out by Grubbs/)).toBeVisible()
})

test('a model with two revisions says which one the figures are of', async ({ page }) => {
  await page.goto('/devices/ostler-plain-6')
  await expect(page.getByRole('table', { name: /^Revisions/ })).toContainText('B (the one these figures are of)')
})

test('each fact has its source and date, and what nobody states is not taken as no', async ({ page, request }) => {
  const { devices } = await latest(request)
  const device = devices.find(({ weight }) => weight === null)!
  await page.goto(`/devices/${device.slug}`)
  const facts = page.getByRole('table', { name: /^Facts/ })
  await expect(facts.getByRole('row')).toHaveCount(13)
  await expect(facts.getByRole('row').filter({ has: page.getByRole('rowheader', { name: 'Weight' }) })).toContainText(
    'not stated',
  )
})

test('the white map and the ladder give their figures as tables', async ({ page }) => {
  await page.goto('/devices/ostler-plain-7')
  for (const name of ['Where its page sits among the whites', 'In your light']) {
    const section = page.getByRole('region', { name })
    await section.getByText('The same figures as a table').click()
    await expect(section.getByRole('rowheader', { name: 'Ostler Plain 7' })).toBeVisible()
  }
})

for (const slug of ['no-such-device', 'Ostler-Plain-7', '%00', 'ostler-plain-7%20', "x'--", 'a'.repeat(500)]) {
  test(`there is no device at “${slug.slice(0, 20)}”`, async ({ page }) => {
    expect((await page.goto(`/devices/${slug}`))?.status()).toBe(404)
  })
}

test('before the first release the list says so kindly', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/devices`)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Devices')
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
})

test('the list and a device’s page are accessible in every theme', async ({ page }) => {
  test.setTimeout(120_000)
  await expectAccessible(page, '/devices')
  await expectAccessible(page, '/devices/tamber-reed-7')
})
