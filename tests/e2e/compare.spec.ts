import { expect, test } from '@playwright/test'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const TWO = '/compare?with=ostler-plain-7,tamber-reed-7'
const FOUR = '/compare?with=ostler-plain-7,tamber-reed-7,quayle-margin-10,pellow-broadsheet-13-colour'

test('two pages are compared in words, with thresholds stated and doubts given', async ({ page }) => {
  await page.goto(TWO)
  await expect(page).toHaveTitle(/^Ostler Plain 7 and Tamber Reed 7 compared/)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Ostler Plain 7 and Tamber Reed 7')
  const differences = page.getByRole('region', { name: 'How far the pages differ' })
  await expect(differences.getByRole('listitem')).toHaveText(
    /^Ostler Plain 7 and Tamber Reed 7: (hard to tell apart side by side|told apart)/,
  )
  await expect(differences).toContainText('a convention of this house')
  const row = differences.getByRole('row').nth(1)
  expect(((await row.textContent()) ?? '').match(/±/g)).toHaveLength(5)
})

// Both stand in the demonstration as pages of nearly the same whiteness: 45 and 46, each ± 2.
test('a difference within its doubt is too close to call', async ({ page }) => {
  await page.goto(TWO)
  const row = page.getByRole('region', { name: 'How far the pages differ' }).getByRole('row').nth(1)
  await expect(row.getByRole('cell').nth(2)).toContainText('too close to call')
})

test('every pair of four is compared', async ({ page }) => {
  await page.goto(FOUR)
  const differences = page.getByRole('region', { name: 'How far the pages differ' })
  await expect(differences.getByRole('listitem')).toHaveCount(6)
  await expect(differences.getByRole('rowheader')).toHaveCount(6)
})

test('what differs comes first, and what is the same for all can be opened', async ({ page }) => {
  await page.goto(TWO)
  const specs = page.getByRole('region', { name: 'What else differs' })
  await expect(specs.getByRole('rowheader', { name: 'Weight' })).toBeVisible()
  await expect(specs.getByRole('rowheader', { name: 'Colour' })).toBeHidden()
  await specs.getByText(/^The same for all/).click()
  await expect(specs.getByRole('rowheader', { name: 'Colour' })).toBeVisible()
})

test('the light strips give their figures as a table', async ({ page }) => {
  await page.goto(TWO)
  const light = page.getByRole('region', { name: 'In the light one reads by' })
  await light.getByText('The same figures as a table').click()
  await expect(light.getByRole('rowheader', { name: 'Tamber Reed 7' })).toBeVisible()
})

test('the address of a comparison can be copied, and is the one to be found by', async ({ page, baseURL }) => {
  await page.goto(TWO)
  await expect(page.getByLabel('Address of this comparison')).toHaveValue(
    /\/compare\?with=ostler-plain-7,tamber-reed-7$/,
  )
  const canonical = page.locator('link[rel="canonical"]')
  await expect(canonical).toHaveAttribute('href', /with=ostler-plain-7,tamber-reed-7$/)
  await expect(page.locator('meta[name="robots"]')).toHaveAttribute('content', /^index/)
  await page.goto(new URL('/compare?with=tamber-reed-7,ostler-plain-7', baseURL).href)
  await expect(canonical).toHaveAttribute('href', /with=ostler-plain-7,tamber-reed-7$/)
  await expect(page.locator('meta[name="robots"]')).toHaveAttribute('content', /^noindex/)
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a reader chooses, adds, replaces and removes devices', async ({ page }) => {
    await page.goto('/compare')
    await expect(page.getByText('Choose two to four devices')).toBeVisible()
    await page.getByLabel('First device').selectOption('Ostler Plain 7')
    await page.getByLabel('Third device').selectOption('Wexby Vesper 6')
    await page.getByRole('button', { name: 'Compare' }).click()
    await expect(page).toHaveURL(/\/compare\?with=ostler-plain-7,wexby-vesper-6$/)
    await page.getByLabel('Second device').selectOption('Tamber Reed 7')
    await page.getByLabel('Third device').selectOption('Quayle Margin 10')
    await page.getByRole('button', { name: 'Compare' }).click()
    await expect(page).toHaveURL(/\/compare\?with=ostler-plain-7,tamber-reed-7,quayle-margin-10$/)
    await page.getByRole('link', { name: 'Remove Tamber Reed 7' }).click()
    await expect(page).toHaveURL(/\/compare\?with=ostler-plain-7,quayle-margin-10$/)
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('Ostler Plain 7 and Quayle Margin 10')
  })
})

for (const { what, address, words } of [
  { what: 'one device', address: 'with=ostler-plain-7', words: 'choose at least one more' },
  { what: 'a device nobody knows', address: 'with=ostler-plain-7,nobody', words: 'has no device at “nobody”' },
  { what: 'a device named twice', address: 'with=ostler-plain-7,ostler-plain-7', words: 'was named twice' },
  {
    what: 'five devices, ticked in the list',
    address: 'with=ostler-plain-7&with=tamber-reed-7&with=quayle-margin-10&with=wexby-vesper-6&with=wexby-vesper-8',
    words: 'so Wexby Vesper 8 is left out',
  },
  { what: 'a script', address: 'with=%3Cscript%3Ealert(1)%3C/script%3E', words: 'has no device at' },
  { what: 'broken text', address: 'with=%FF%00,%F0%9F', words: 'has no device at' },
  { what: 'no end of names', address: `with=${'x,'.repeat(900)}y`, words: 'has no device at' },
  { what: 'a blank', address: 'with=', words: 'Choose two to four devices' },
  { what: 'commas', address: 'with=,,,', words: 'Choose two to four devices' },
]) {
  test(`${what} gets a kind answer`, async ({ page }) => {
    expect((await page.goto(`/compare?${address}`))?.status()).toBe(200)
    await expect(page.getByRole('main')).toContainText(words)
    await expect(page.getByLabel('First device')).toBeVisible()
    await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1)
  })
}

test('a reader adds a device by keyboard alone', async ({ page }) => {
  await page.goto(TWO)
  await page.getByLabel('Third device').focus()
  await page.keyboard.type('Corrin Octavo')
  await page.getByLabel('Fourth device').focus()
  await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/,corrin-octavo-8$/)
})

test('before the first release the room says so kindly', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/compare?with=a,b`)
  await expect(page.getByRole('main')).toContainText('No edition has been released yet')
})

test('the room is accessible in every theme, empty and full', async ({ page }) => {
  test.setTimeout(240_000)
  await expectAccessible(page, '/compare')
  await expectAccessible(page, FOUR)
  await expectAccessible(page, '/compare?with=nobody,ostler-plain-7,ostler-plain-7')
})

test('at 320 px nothing scrolls sideways', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 700 })
  for (const address of ['/compare', TWO, FOUR]) {
    await page.goto(address)
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    )
    expect(sideways, address).toBe(0)
  }
})
