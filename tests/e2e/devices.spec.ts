import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

const deviceIn = ({ devices }: Edition, slug: string): EditionDevice => devices.find((device) => device.slug === slug)!

const section = (page: Page, name: string) => page.getByRole('region', { name, exact: true })

test('a device’s page gives its figures, each with its doubt, and leads from each to its method', async ({
  page,
  request,
}) => {
  const device = deviceIn(await latest(request), 'ostler-plain-7')
  await page.goto('/devices/ostler-plain-7')
  await expect(page).toHaveTitle(/^Ostler Plain 7/)
  await expect(page.locator('meta[name="description"]')).toHaveAttribute('content', /L\* \d+\.\d ±\s\d/)
  await expect(page.locator('link[rel="canonical"]')).toHaveAttribute('href', /\/devices\/ostler-plain-7$/)
  const figures = section(page, 'Figures of the page')
  for (const figure of [
    device.page.L.toFixed(1),
    `${Math.round(device.whiteness)}†`,
    `${device.tint.toFixed(1)}†`,
    device.contrast.toFixed(1),
  ]) {
    await expect(figures.getByText(figure)).toBeVisible()
  }
  await expect(figures.getByText(/^±/)).toHaveCount(5)
  await figures.getByRole('link', { name: 'Whiteness W10' }).click()
  await expect(page).toHaveURL(/\/method#q-whiteness$/)
  await expect(page.locator('#q-whiteness')).toBeInViewport()
})

// Two pages within the doubt of their difference share a band: so each must stand inside the other's.
test('a device’s rank is a band wherever others are too close to call', async ({ page, request }) => {
  const { devices } = await latest(request)
  const lightest = [...devices].sort((one, other) => other.page.L - one.page.L)
  const bands: [number, number][] = []
  for (const { slug } of lightest.slice(0, 4)) {
    await page.goto(`/devices/${slug}`)
    const words =
      (await section(page, 'Figures of the page')
        .getByText(/of 16 by lightness/)
        .textContent()) ?? ''
    const [, best, , worst = best] =
      /^(\d+)(?:st|nd|rd|th)( to (\d+)(?:st|nd|rd|th))? of 16 by lightness/.exec(words) ?? []
    bands.push([Number(best), Number(worst)])
    expect(words).toContain(best === worst ? 'clear of the others' : 'too close to call')
  }
  bands.forEach(([best, worst], i) => {
    expect(best).toBeLessThanOrEqual(i + 1)
    expect(worst).toBeGreaterThanOrEqual(i + 1)
  })
  expect(bands.some(([best, worst]) => worst > best)).toBe(true)
})

test('every figure published is on the page, those of the ink among them', async ({ page, request }) => {
  const device = deviceIn(await latest(request), 'tamber-reed-7')
  await page.goto('/devices/tamber-reed-7')
  await page.getByText('Every figure with its doubt').click()
  const table = page.getByRole('table', { name: /^Figures of page and ink/ })
  await expect(table.getByRole('rowheader')).toHaveCount(15)
  await expect(table.getByText(/^±\s[\d.]+$/)).toHaveCount(15)
  const ink = table.getByRole('row').filter({ has: page.getByRole('rowheader', { name: 'Lightness L* of the ink' }) })
  await expect(ink).toContainText(device.ink.L.toFixed(1))
})

// ((L* + 16)/116)³ is Y/100 (ISO/CIE 11664-4): Y of the control paper over Y of the page.
test('a device’s page says how many times the light of the control paper it needs', async ({ page, request }) => {
  const edition = await latest(request)
  const y = (L: number) => ((L + 16) / 116) ** 3
  await page.goto('/devices/pellow-broadsheet-13-colour')
  const { L } = deviceIn(edition, 'pellow-broadsheet-13-colour').page
  const times = (y(edition.control.paper.L) / y(L)).toFixed(2)
  await expect(section(page, 'In your light')).toContainText(`${times} ±`)
})

test('a device known from one unit is marked provisional', async ({ page }) => {
  await page.goto('/devices/pellow-broadsheet-13-colour')
  await expect(page.getByText('Provisional: measured on a single unit')).toBeVisible()
  await expect(section(page, 'How we know')).toContainText('one unit only')
  await expect(section(page, 'Between units and positions')).toContainText('One unit was measured')
})

test('a device no longer on sale says so and has no price', async ({ page }) => {
  await page.goto('/devices/tamber-almanac-6')
  await expect(page.getByText('Not on sale when this edition was released')).toBeVisible()
  await expect(page.getByRole('heading', { level: 1 }).locator('xpath=following-sibling::p[1]')).not.toContainText('£')
})

test('each unit and each position shows how far it lies from the others, and how it was obtained', async ({ page }) => {
  await page.goto('/devices/tamber-reed-7')
  const units = page.getByRole('table', { name: /^By unit/ })
  await expect(units.getByRole('rowheader')).toHaveText(['TR7-A2', 'TR7-A1'])
  await expect(page.getByRole('table', { name: /^By position/ }).getByRole('rowheader')).toHaveCount(3)
  const obtained = page.getByRole('table', { name: 'Units on the bench' })
  await expect(obtained.getByText(/^(bought from|lent by) .+, \d+ \w+ 20\d\d$/)).toHaveCount(2)
})

test('the control’s state is told for every session the device was read in', async ({ page }) => {
  await page.goto('/devices/tamber-reed-7')
  const control = section(page, 'The control on those days')
  await expect(control).toContainText('within its limits in all 3 sessions')
  await control.getByText('The 3 sessions').click()
  const rows = control.getByRole('table').getByRole('row')
  await expect(rows).toHaveCount(4)
  for (const row of (await rows.all()).slice(1)) {
    await expect(row.getByText(/^limits ±/)).toHaveCount(3)
    await expect(row).toContainText(/\d+\smin before, on MQ-TILE/)
  }
})

test('a corrected figure is marked in its history, and its note and the replies are kept', async ({ page }) => {
  await page.goto('/devices/tamber-reed-7')
  const history = page.getByRole('table', { name: /^Figures in each edition/ })
  await expect(history.getByRole('rowheader')).toHaveCount(3)
  const row = (edition: string) => history.getByRole('row').filter({ has: page.getByRole('link', { name: edition }) })
  await expect(row('Edition 3')).toContainText('Same readings as before')
  await expect(row('Edition 2').getByRole('link', { name: 'Corrected' })).toHaveAttribute('href', /\/corrections#\S+/)
  await expect(row('Edition 2').getByText(/^change −1\.\d ±\s0\.\d$/)).toBeVisible()
  await expect(row('Edition 1').getByRole('link', { name: 'Wrong, corrected later' })).toBeVisible()
  await expect(row('Edition 1').getByRole('link', { name: 'Edition 1' })).toHaveAttribute('href', '/editions/1')
  const corrections = section(page, 'Corrections and replies')
  await expect(corrections).toContainText('wrong in edition 1, put right in edition 2')
  await expect(corrections.locator('blockquote')).toHaveCount(2)
})

test('a model with two revisions shows both pages, and says which one the figures are of', async ({ page }) => {
  await page.goto('/devices/ostler-plain-6')
  const revisions = section(page, 'Revisions')
  await expect(revisions.getByRole('table')).toContainText('B (the one these figures are of)')
  await expect(revisions).toContainText('The page of revision A is darker by')
  await expect(revisions.getByText(/^Revision [AB], edition \d: L\*/)).toHaveCount(2)
  await expect(page.getByRole('table', { name: /^Figures in each edition/ })).toContainText('Now revision B')
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

test('sizes and weights are in the units a reader chose, prices as they were seen', async ({ page, baseURL }) => {
  const facts = page.getByRole('table', { name: /^Facts/ })
  const weight = facts.getByRole('row').filter({ has: page.getByRole('rowheader', { name: 'Weight' }) })
  await page.goto('/devices/tamber-reed-7')
  await expect(weight).toContainText(/\d+\sg/)
  await page.context().addCookies([{ name: 'look', value: 'day-inch', url: baseURL! }])
  await page.goto('/devices/tamber-reed-7')
  await expect(weight).toContainText(/\d\.\d\soz/)
  await expect(page.getByRole('table', { name: /^Prices as seen/ })).toContainText('£199')
})

test('the white map and the ladder give their figures as tables', async ({ page }) => {
  await page.goto('/devices/ostler-plain-7')
  for (const name of ['Where its page sits among the whites', 'In your light']) {
    const chart = section(page, name)
    await chart.getByText('The same figures as a table').click()
    await expect(chart.getByRole('rowheader', { name: 'Ostler Plain 7' })).toBeVisible()
  }
})

test('the points of a chart are reached and walked by the keyboard', async ({ page }) => {
  await page.goto('/devices/ostler-plain-7')
  const ladder = section(page, 'In your light')
  const marks = ladder.getByRole('img', { name: /: \d+\.\d× at [\d,]+ lux$/ })
  await expect(marks).toHaveCount(6)
  // The script makes the drawing one stop: only then do the arrow keys walk.
  await expect(marks.nth(1)).toHaveAttribute('tabindex', '-1')
  await marks.first().focus()
  await page.keyboard.press('ArrowRight')
  await expect(marks.nth(1)).toBeFocused()
  await page.keyboard.press('End')
  await expect(marks.last()).toBeFocused()
  const value = (await marks.last().getAttribute('aria-label')) ?? ''
  await expect(ladder.locator('p').getByText(value)).toBeVisible()
})

test('the list of contents leads to every part of the page', async ({ page }) => {
  await page.goto('/devices/ostler-plain-6')
  const links = page.getByRole('navigation', { name: 'On this page' }).getByRole('link')
  const names = await links.allTextContents()
  expect(names).toHaveLength(11)
  for (const name of names) {
    const target = await links.filter({ hasText: name }).getAttribute('href')
    await expect(page.locator(target!)).toHaveCount(1)
    await expect(page.locator(target!)).toHaveRole('heading')
  }
})

test('the figures can be cited by a person and by a program', async ({ page }) => {
  await page.goto('/devices/tamber-reed-7')
  const cite = section(page, 'How to cite')
  await expect(cite).toContainText(
    /Lampleaf \(2026\)\. Tamber Reed 7.+Edition 3, released 20 November 2026\..+\/devices\/tamber-reed-7/,
  )
  await cite.getByText('For reference managers').click()
  await expect(cite.getByText(/^@misc\{/)).toBeVisible()
  await expect(cite.getByText(/^cff-version: 1\.2\.0/)).toBeVisible()
})

test('machines find the device, its figures with their doubts, and a review without a rating', async ({
  page,
  request,
}) => {
  const device = deviceIn(await latest(request), 'tamber-reed-7')
  await page.goto('/devices/tamber-reed-7')
  const scripts = await page.locator('script[type="application/ld+json"]').allTextContents()
  const data = scripts.map((text) => JSON.parse(text)).find((one) => one['@graph']?.[0]?.['@type'] === 'Product')
  const [product, review] = data['@graph']
  const lightness = product.additionalProperty[0]
  expect(lightness.value).toBe(Number(device.page.L.toFixed(1)))
  expect(lightness.minValue).toBeLessThan(lightness.value)
  expect(product.offers).toMatchObject({ price: '199.00', priceCurrency: 'GBP' })
  expect(review).toMatchObject({ '@type': 'Review', author: { name: 'Lampleaf' } })
  expect(JSON.stringify(data)).not.toMatch(/rating/i)
})

test('every reading is on numbered pages, the withdrawn and those left out among them, with why', async ({ page }) => {
  await page.goto('/devices/tamber-reed-7')
  await page.getByRole('link', { name: /^All 96 readings/ }).click()
  await expect(page).toHaveURL('/devices/tamber-reed-7/readings')
  await expect(page.getByRole('heading', { level: 1, name: 'Readings of Tamber Reed 7' })).toBeVisible()
  const table = page.getByRole('table', { name: /by D65/ })
  await expect(table.getByText(/withdrawn: The front light was on/).first()).toBeVisible()
  const first = await table.getByRole('rowheader').count()
  await page.getByRole('link', { name: 'Next page' }).click()
  await expect(page).toHaveURL('/devices/tamber-reed-7/readings/2')
  await expect(page.getByText('page 2 of 2')).toBeVisible()
  expect(first + (await table.getByRole('rowheader').count())).toBe(96)
  await page.getByRole('link', { name: 'Previous page' }).click()
  await expect(page).toHaveURL('/devices/tamber-reed-7/readings')
})

test('a reading left out stays, with the reason', async ({ page }) => {
  await page.goto('/devices/haldon-copybook-10')
  await expect(section(page, 'Readings')).toContainText('1 left out')
  for (const path of ['', '/2']) {
    await page.goto(`/devices/haldon-copybook-10/readings${path}`)
    if (await page.getByText(/left out: Stands out by Grubbs/).count()) return
  }
  throw new Error('the reading left out is on none of the pages')
})

for (const path of [
  'readings/1',
  'readings/0',
  'readings/99',
  'readings/02',
  'readings/two',
  'readings/2/3',
  'other',
]) {
  test(`there is no page of a device at “${path}”`, async ({ page }) => {
    expect((await page.goto(`/devices/ostler-plain-7/${path}`))?.status()).toBe(404)
  })
}

for (const slug of ['no-such-device', 'Ostler-Plain-7', '%00', 'ostler-plain-7%20', "x'--", 'a'.repeat(500)]) {
  test(`there is no device at “${slug.slice(0, 20)}”`, async ({ page }) => {
    expect((await page.goto(`/devices/${slug}`))?.status()).toBe(404)
    expect((await page.goto(`/devices/${slug}/readings`))?.status()).toBe(404)
  })
}

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a device’s page is whole: tables open, its readings are reached, chart points are stops', async ({ page }) => {
    await page.goto('/devices/ostler-plain-7')
    await page.getByText(/^The \d+ sets$/).click()
    await expect(page.getByRole('table', { name: /^Means and standard deviations/ })).toBeVisible()
    const mark = section(page, 'In your light').getByRole('img', { name: /lux$/ }).first()
    await mark.focus()
    await expect(mark).toBeFocused()
    await page.getByRole('link', { name: /^All \d+ readings/ }).click()
    await expect(page.getByRole('table', { name: /by D65/ })).toBeVisible()
  })
})

test('before the first release there is no device, and nothing breaks', async ({ page }) => {
  const answer = await page.goto(`${fromAddress('EMPTY_URL')}/devices/ostler-plain-7`)
  expect(answer?.status()).toBe(404)
})

for (const format of ['A4', 'Letter'] as const) {
  test(`a device prints on one page of ${format}, with its address, edition and date`, async ({ page }) => {
    for (const slug of ['tamber-reed-7', 'pellow-broadsheet-13-colour', 'tamber-almanac-6', 'ostler-plain-6']) {
      await page.goto(`/devices/${slug}`)
      const pdf = await page.pdf({ format })
      expect(pdf.toString('latin1').match(/\/Type\s*\/Page\b(?!s)/g), slug).toHaveLength(1)
    }
    await page.emulateMedia({ media: 'print' })
    await expect(
      page.getByText(/^Lampleaf, edition 3, released 20 November 2026\. http.+\/devices\/ostler-plain-6$/),
    ).toBeVisible()
    await expect(page.getByText('Not medical advice').first()).toBeVisible()
    await expect(section(page, 'Readings')).toBeHidden()
  })
}

test('a device’s page and its readings are accessible in every theme', async ({ page }) => {
  test.setTimeout(240_000)
  await expectAccessible(page, '/devices/tamber-reed-7')
  await expectAccessible(page, '/devices/ostler-plain-6')
  await expectAccessible(page, '/devices/tamber-reed-7/readings/2')
})

test('at 320 px nothing scrolls sideways, with everything that opens opened', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 640 })
  for (const path of ['/devices/ostler-plain-6', '/devices/tamber-reed-7/readings']) {
    await page.goto(path)
    const sideways = await page.evaluate(() => {
      for (const details of document.querySelectorAll('details')) details.open = true
      return document.documentElement.scrollWidth - document.documentElement.clientWidth
    })
    expect(sideways, path).toBe(0)
  }
})
