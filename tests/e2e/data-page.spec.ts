import { expect, test } from '@playwright/test'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

test('a visitor finds the files of the newest edition and loads one', async ({ page }) => {
  await page.goto('/data')
  await expect(page).toHaveTitle(/Data/)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('The data')
  const files = page.getByRole('table', { name: /Each table as CSV and as JSON/ })
  await expect(files.getByRole('row')).toHaveCount(10)
  const loading = page.waitForEvent('download')
  await files.getByRole('link', { name: /^figures\.csv/ }).click()
  expect((await loading).suggestedFilename()).toBe('lampleaf-edition-3-figures.csv')
})

test('every file named on the page is there', async ({ page, request }) => {
  await page.goto('/data')
  const links = await page
    .locator('a[href^="/data/3/"]')
    .evaluateAll((all) => all.map((one) => one.getAttribute('href')!))
  expect(links.length).toBeGreaterThan(20)
  for (const path of links) expect((await request.get(path)).status(), path).toBe(200)
})

test('earlier editions keep their own data, with their own citation', async ({ page }) => {
  await page.goto('/data')
  await page.getByRole('link', { name: /^Data of edition 1,/ }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Data of edition 1')
  await expect(page.getByText(/Edition 1, released 27 February 2026/).first()).toBeVisible()
  await page.getByText('BibTeX', { exact: true }).click()
  await expect(page.getByRole('region', { name: 'BibTeX of edition 1' })).toContainText('@misc{')
})

test('an edition that was never released has no page of data', async ({ page }) => {
  expect((await page.goto('/data/9'))!.status()).toBe(404)
  expect((await page.goto('/data/01'))!.status()).toBe(404)
})

test('the dictionary says of a column its unit, its meaning and what empty means', async ({ page }) => {
  await page.goto('/data')
  await page.getByRole('link', { name: 'Readings', exact: true }).click()
  await page.getByText('Columns of readings, 8').click()
  const row = page
    .getByRole('table', { name: /Columns of readings/ })
    .getByRole('row')
    .filter({ hasText: 'instrument_whiteness' })
  await expect(row).toContainText('CIE whiteness W10 as the instrument gave it')
  await expect(row).toContainText('The instrument gave none.')
})

test('the page carries the data set in a form machines read', async ({ page }) => {
  await page.goto('/data')
  const blocks = await page.locator('script[type="application/ld+json"]').allTextContents()
  const data = blocks.map((text) => JSON.parse(text)).find((block) => block['@type'] === 'Dataset')
  expect(data.license).toBe('https://creativecommons.org/licenses/by/4.0/')
  expect(data.distribution.length).toBe(21)
})

test('the API page shows each address with an example that works', async ({ page, request }) => {
  await page.goto('/data/api')
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('The API')
  const lines = await page.getByRole('region', { name: /^Example: / }).allTextContents()
  expect(lines).toHaveLength(8)
  for (const line of lines) {
    const [, address] = /^curl -s '([^']+)'/.exec(line)!
    const [, body] = /-d '([^']+)'$/.exec(line) ?? []
    const { pathname, search } = new URL(address!)
    const answer = await request.fetch(pathname + search, {
      method: body ? 'POST' : 'GET',
      ...(body && { data: body, headers: { 'content-type': 'application/json' } }),
    })
    expect(answer.status(), line).toBe(200)
  }
  await page.getByText(/^Fields of the question/).click()
  await expect(page.getByRole('table', { name: 'What POST /api/v1/match is sent' })).toContainText(
    'Hours a week, 0 to 168.',
  )
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })
  test('files, dictionary and API are all there', async ({ page }) => {
    await page.goto('/data')
    await expect(page.getByRole('link', { name: /^readings\.csv/ })).toBeVisible()
    await page.getByText('Columns of sets, 7').click()
    await expect(page.getByRole('table', { name: /Columns of sets/ })).toBeVisible()
    await page.goto('/data/api')
    await expect(
      page.getByRole('heading', { level: 2, name: 'Rank the devices for one reader’s answers' }),
    ).toBeVisible()
  })
})

test('before the first release the page says so, and still explains the columns', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/data`)
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
  await expect(page.getByRole('heading', { name: 'Data dictionary' })).toBeVisible()
})

test.describe('on a narrow screen', () => {
  test.use({ viewport: { width: 320, height: 700 } })
  for (const path of ['/data', '/data/2', '/data/api']) {
    test(`${path} does not scroll sideways, opened up`, async ({ page }) => {
      await page.goto(path)
      await page.locator('details').evaluateAll((all) => {
        for (const one of all) (one as HTMLDetailsElement).open = true
      })
      const sideways = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      )
      expect(sideways).toBe(0)
    })
  }
})

for (const path of ['/data', '/data/2', '/data/api']) {
  test(`${path} is accessible in every theme`, async ({ page }) => {
    await expectAccessible(page, path)
  })
}
