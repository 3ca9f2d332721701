import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

const known = (page: Page) => page.getByRole('table', { name: /^\d+ devices?( that match)?, by/ })

/** Names in the order of the table's rows, or of the cards it becomes on a phone. */
const namesIn = (page: Page) => known(page).getByRole('rowheader').getByRole('link').allTextContents()

/** Selects an order, by the head of its column or, where the table is cards, in the list above them. */
async function orderBy(page: Page, head: RegExp, words: string) {
  const column = page.getByRole('columnheader').getByRole('link', { name: head })
  await expect(known(page)).toBeVisible()
  if (await column.isVisible()) await column.click()
  else await page.getByRole('navigation', { name: 'Order by' }).getByRole('link', { name: words }).click()
}

/** Brings the filters into view where they are behind a line. */
async function openFilters(page: Page) {
  const line = page.getByText(/^Filters/).first()
  if ((await line.isVisible()) && !(await page.getByLabel('Pen', { exact: true }).isVisible())) await line.click()
}

const by =
  <T>(value: (one: T) => number | string) =>
  (one: T, other: T) =>
    value(one) < value(other) ? -1 : 1

const names = (devices: readonly EditionDevice[]) => devices.map(({ name }) => name)
const lightestFirst = (devices: readonly EditionDevice[]) => names([...devices].sort(by(({ page }) => -page.L)))

test('the list has every device of the edition, the lightest page first', async ({ page, request }) => {
  const { devices } = await latest(request)
  await page.goto('/devices')
  await expect(page).toHaveTitle(/^Devices/)
  await expect.poll(() => namesIn(page)).toEqual(lightestFirst(devices))
})

test('the list is ordered by what a reader selects, and back again by selecting it once more', async ({
  page,
  request,
}) => {
  const { devices } = await latest(request)
  await page.goto('/devices')
  await orderBy(page, /^Chroma/, 'chroma')
  await expect(page).toHaveURL(/sort=chroma/)
  const leastTinted = names([...devices].sort(by(({ page: { a, b } }) => Math.hypot(a, b))))
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
  const rows = known(page).getByRole('row')
  for (const device of devices) {
    const row = rows.filter({ has: page.getByRole('link', { name: device.name, exact: true }) })
    const text = ((await row.textContent()) ?? '').replace(/\s+/g, ' ')
    expect(text).toContain(device.page.L.toFixed(1))
    expect(text.match(/±/g)).toHaveLength(5)
    expect(text.match(/†/g)).toHaveLength(2)
    const { diagonal, weight, colour, pen, water, frontLight, onSale, price } = device
    // What is known to be sold no longer has no price, and nobody needs to state one.
    const facts = [diagonal, weight, colour, pen, water, frontLight, onSale, onSale === false ? 'none' : price]
    const unknown = facts.filter((fact) => fact === null)
    expect(text.match(/not stated/g)?.length ?? 0, device.name).toBe(unknown.length)
    if (device.provisional) expect(text).toContain('provisional: one unit')
    if (device.onSale === false) expect(text).toContain('no longer on sale')
  }
})

test('a reader finds a device by its name', async ({ page }) => {
  await page.goto('/devices')
  await page.getByRole('searchbox', { name: 'Find a device' }).fill('reed colour')
  await page.getByRole('button', { name: 'Search' }).click()
  await expect(page).toHaveURL(/\/devices\?q=reed\+colour$/)
  await expect.poll(() => namesIn(page)).toEqual(['Tamber Reed 7 Colour'])
})

test('a choice shows its list at once, and its link takes it out again', async ({ page, request }) => {
  const { devices } = await latest(request)
  const withPen = devices.filter(({ pen }) => pen)
  await page.goto('/devices')
  await openFilters(page)
  await page.getByLabel('Pen', { exact: true }).selectOption('With a pen')
  await expect(page).toHaveURL(/\/devices\?pen=yes$/)
  await expect(page.getByRole('status').filter({ hasText: 'match' })).toContainText(
    `${withPen.length} of ${devices.length} devices match`,
  )
  await expect.poll(() => namesIn(page)).toEqual(lightestFirst(withPen))
  await expect(page.getByLabel('Pen', { exact: true })).toBeFocused()
  await page.getByRole('navigation', { name: 'Filters in force' }).getByRole('link', { name: 'with a pen' }).click()
  await expect(page).toHaveURL(/\/devices$/)
  await expect.poll(() => namesIn(page)).toHaveLength(devices.length)
  await expect(page.getByLabel('Pen', { exact: true })).toHaveValue('')
})

test('several makers are chosen, and the back button brings the lists before', async ({ page, request }) => {
  const { devices } = await latest(request)
  const of = (...makers: string[]) => lightestFirst(devices.filter(({ maker }) => makers.includes(maker)))
  await page.goto('/devices')
  await openFilters(page)
  await page.getByRole('checkbox', { name: 'Tamber', exact: true }).check()
  await expect.poll(() => namesIn(page)).toEqual(of('Tamber'))
  await openFilters(page)
  await page.getByRole('checkbox', { name: 'Ostler', exact: true }).check()
  await expect(page).toHaveURL(/\/devices\?maker=ostler,tamber$/)
  await expect.poll(() => namesIn(page)).toEqual(of('Ostler', 'Tamber'))
  await page.goBack()
  await expect(page).toHaveURL(/\/devices\?maker=tamber$/)
  await expect.poll(() => namesIn(page)).toEqual(of('Tamber'))
})

test('a device that does not state what is asked stands apart, neither ruled in nor out', async ({ page, request }) => {
  const { devices } = await latest(request)
  const silent = devices.filter(({ weight }) => weight === null)
  expect(silent.length).toBeGreaterThan(0)
  await page.goto('/devices?max-weight=200')
  await expect
    .poll(() => namesIn(page))
    .toEqual(lightestFirst(devices.filter(({ weight }) => weight !== null && weight <= 200)))
  const apart = page.getByRole('region', { name: 'Not stated, so neither ruled in nor out' })
  await expect(apart.getByRole('rowheader').getByRole('link')).toHaveText(lightestFirst(silent))
  await expect(apart.getByRole('rowheader').first()).toContainText('not stated: weight')
})

test('where nothing is left the filter that rules out most is named, and leads to what is left without it', async ({
  page,
}) => {
  await page.goto('/devices?q=wayside&min-size=10')
  await expect(page.getByRole('heading', { name: 'No device in this edition is left' })).toBeVisible()
  await expect(page.getByText('The filter that rules out most is “wayside” in the name')).toBeVisible()
  await page.getByRole('link', { name: 'Leave that filter out' }).click()
  await expect(page).toHaveURL(/\/devices\?min-size=10$/)
  await expect.poll(() => namesIn(page)).not.toHaveLength(0)
})

test('devices ticked in the list are compared', async ({ page }) => {
  await page.goto('/devices')
  await page.getByRole('checkbox', { name: 'Compare Ostler Plain 7' }).check()
  await page.getByRole('checkbox', { name: 'Compare Tamber Reed 7', exact: true }).check()
  await page.getByRole('button', { name: 'Compare', exact: true }).click()
  await expect(page).toHaveURL(
    /\/compare\?with=ostler-plain-7,tamber-reed-7$|\/compare\?with=tamber-reed-7,ostler-plain-7$/,
  )
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Tamber Reed 7')
})

test('sizes and weights are in the reader’s units', async ({ page, context, baseURL }) => {
  await page.goto('/devices?q=plain+7')
  await expect(known(page)).toContainText('17.8')
  await expect(known(page)).toContainText('186')
  await context.addCookies([{ name: 'look', value: 'auto-inch', url: baseURL! }])
  await page.goto('/devices?q=plain+7')
  await expect(known(page)).toContainText('6.6')
  await expect(known(page)).not.toContainText('17.8')
})

test('for electronic paper the list is numbered pages', async ({ page, context, baseURL, request }) => {
  const { devices } = await latest(request)
  await context.addCookies([{ name: 'look', value: 'paper-metric', url: baseURL! }])
  await page.goto('/devices')
  const first = await namesIn(page)
  expect(first.length).toBeLessThan(devices.length)
  await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Next page' }).click()
  await expect(page).toHaveURL(/\/devices\?page=2$/)
  await expect.poll(() => namesIn(page)).not.toContain(first[0])
  expect([...first, ...(await namesIn(page))]).toEqual(lightestFirst(devices))
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a reader orders the list and opens a device', async ({ page }) => {
    await page.goto('/devices')
    await orderBy(page, /^Device/, 'name')
    await page.getByRole('link', { name: 'Ostler Plain 7', exact: true }).click()
    await expect(page.getByRole('heading', { level: 1, name: 'Ostler Plain 7' })).toBeVisible()
  })

  test('a reader filters the list by its button, and gets the short address', async ({ page, request }) => {
    const { devices } = await latest(request)
    await page.goto('/devices?sort=price')
    await openFilters(page)
    await page.getByLabel('Price up to').fill('£200')
    await page.getByLabel('Colour', { exact: true }).selectOption('Without colour')
    await page.getByRole('checkbox', { name: 'Ostler', exact: true }).check()
    await page.getByRole('checkbox', { name: 'Tamber', exact: true }).check()
    await page.getByRole('button', { name: 'Show devices' }).click()
    await expect(page).toHaveURL(/\/devices\?maker=ostler,tamber&max-price=200&colour=no&sort=price$/)
    const wanted = devices.filter(
      ({ maker, price, colour }) =>
        ['Ostler', 'Tamber'].includes(maker) && price !== null && price.amount <= 20_000 && colour === false,
    )
    expect(await namesIn(page)).toEqual(names(wanted.sort(by(({ price }) => price!.amount))))
  })
})

test('a reader filters by keyboard alone', async ({ page }) => {
  await page.goto('/devices')
  await page.getByRole('searchbox', { name: 'Find a device' }).focus()
  await page.keyboard.type('wexby')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/q=wexby/)
  await expect.poll(() => namesIn(page)).toHaveLength(2)
})

for (const odd of [
  'sort=constructor',
  'sort=price&sort=name',
  'min-size=9&max-size=8',
  'max-price=%00',
  'q=%F0%9F%A6%8A%FF',
  'page=99999999',
  'pen=%3Cscript%3E',
  'water=12',
  `maker=${'a,'.repeat(200)}`,
]) {
  test(`an odd address is answered kindly: ${odd.slice(0, 24)}`, async ({ page }) => {
    expect((await page.goto(`/devices?${odd}`))?.status()).toBe(200)
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Devices')
    await expect(page.getByText(/not understood and is left out|No device in this edition is left/)).toBeVisible()
  })
}

test('before the first release the list says so kindly', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/devices`)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Devices')
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
})

test('the list is accessible in every theme, filtered, whole and empty', async ({ page }) => {
  test.setTimeout(240_000)
  await expectAccessible(page, '/devices')
  await expectAccessible(page, '/devices?max-weight=200&sort=price')
  await expectAccessible(page, '/devices?q=nothing&pen=maybe')
})

test('at 320 px the list is cards, and nothing scrolls sideways', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 700 })
  for (const address of ['/devices', '/devices?max-weight=200', '/devices?q=nothing&min-size=10']) {
    await page.goto(address)
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    )
    expect(sideways, address).toBe(0)
  }
})
