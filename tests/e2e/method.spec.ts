import { expect, type Page, test } from '@playwright/test'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

test('the method page describes every part of the method, from readings to what is not known', async ({ page }) => {
  await page.goto('/method')
  await expect(page).toHaveTitle(/Method 1/)
  const contents = page.getByRole('navigation', { name: 'On this page' }).getByRole('link')
  await expect(contents).toHaveCount(13)
  for (const link of await contents.all()) {
    const title = ((await link.textContent()) ?? '').trim()
    await link.click()
    await expect(page.getByRole('heading', { level: 2, name: title })).toBeInViewport()
  }
})

test('the method page says of each constant where it is from and how far to trust it', async ({ page }) => {
  await page.goto('/method')
  const table = page.getByRole('table', { name: 'Constants of the contrast reserve' })
  const row = table.getByRole('row').filter({ hasText: 'Reserve for fluent reading' })
  await expect(row.getByRole('cell')).toContainText(['10', 'Lovie-Kitchin', 'from memory'])
  await expect(page.getByRole('row').filter({ hasText: 'Page luminance a front light is turned up to' })).toContainText(
    'house',
  )
})

const form = (page: Page) => page.getByRole('form', { name: 'Worked example' })
const short = (page: Page) => page.getByRole('region', { name: 'In short' })
/** The result of a step, in its list. */
const step = (page: Page, list: string, name: string) =>
  page.getByRole('list', { name: list }).getByRole('listitem').filter({ hasText: name })

/** Three numbers each, written into the form: CIE 15 by hand for L* 70, a* −1.5, b* 2 gives W 28.93 and T 2.22. */
async function typeKnownPage(page: Page) {
  await form(page).getByText('Three numbers each').click()
  await form(page).getByLabel('L* of the page').fill('70')
  await form(page).getByLabel('a* of the page').fill('−1.5')
  await form(page).getByLabel('b* of the page').fill('2')
  await form(page).getByLabel('L* of the ink').fill('22')
}

test('the worked example answers while one types, and its address can be shared', async ({ page, context }) => {
  await page.goto('/method')
  const before = await short(page).textContent()
  await typeKnownPage(page)
  await expect(step(page, 'From the colour to whiteness', 'CIE whiteness')).toContainText('W₁₀ 28.93†')
  await expect(step(page, 'From the colour to whiteness', 'CIE tint')).toContainText(/T₁₀ 2\.22†\s±.+, greenish/)
  await expect(page.getByRole('status').filter({ hasText: 'Worked out: L* 70.0' })).toBeVisible()
  expect(await short(page).textContent()).not.toBe(before)
  await expect(page).toHaveURL(/pageL=70/)

  const link = form(page).getByRole('link', { name: 'Address of this example' })
  const shared = await context.newPage()
  await shared.goto((await link.getAttribute('href')) ?? '')
  await expect(shared.getByRole('heading', { level: 1, name: 'A worked example' })).toBeVisible()
  await expect(step(shared, 'From the colour to whiteness', 'CIE whiteness')).toContainText('W₁₀ 28.93†')

  await page.reload()
  await expect(form(page).getByLabel('L* of the page')).toHaveValue('70')
  await expect(step(page, 'From the colour to whiteness', 'CIE whiteness')).toContainText('W₁₀ 28.93†')
})

test('a list of readings is tested for one that stands out', async ({ page }) => {
  await page.goto('/method/try')
  await form(page)
    .getByLabel('Readings of the page')
    .fill('70.1 -1.5 2\n70.1 -1.5 2\n70.2 -1.5 2\n70 -1.5 2\n74 -1.5 2')
  await expect(step(page, 'From readings to a colour', 'Grubbs’ test')).toContainText('reading 5 stands out')
  // By hand: (70.1 + 70.1 + 70.2 + 70 + 74)/5 = 70.88.
  await expect(step(page, 'From readings to a colour', 'Mean of the readings')).toContainText('L* 70.880')
})

test('what cannot be is refused at its field, and the figures stay those from before', async ({ page }) => {
  await page.goto('/method/try')
  const figures = await short(page).getByRole('definition').allTextContents()
  const lux = form(page).getByLabel('Light on the page')
  await lux.fill('as bright as day')
  await expect(form(page).getByText('is not a number of lux').first()).toBeVisible()
  await expect(lux).toHaveAttribute('aria-invalid', 'true')
  expect(await short(page).getByRole('definition').allTextContents()).toEqual(figures)
  await form(page).getByRole('button', { name: 'Work it out' }).click()
  const summary = page.getByRole('alert').filter({ hasText: 'Please look at this again' })
  await expect(summary).toBeFocused()
  await summary.getByRole('link', { name: /Light on the page/ }).click()
  await expect(lux).toBeFocused()
  await lux.fill('400')
  await expect(summary).toBeHidden()
})

test('absurd addresses never break the example', async ({ page }) => {
  const absurd = [
    'lux=1e99&from=numbers&pageL=NaN',
    `from=readings&pageReadings=${encodeURIComponent('☃ \u202e'.repeat(300))}`,
    'lux=5&lux=6&start=no-such-device',
    'from=numbers&pageL=20&pageA=-60&pageB=60&inkL=100&inkA=0&inkB=0&age=65&text=large&lux=200000&units=20&positions=100&frontLight=1000',
  ]
  for (const query of absurd) {
    const response = await page.goto(`/method/try?${query}`)
    expect(response?.status()).toBe(200)
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('A worked example')
    for (const list of await page.getByRole('main').getByRole('list').all()) {
      await expect(list).not.toContainText(/ NaN|Infinity|undefined/)
    }
  }
})

test('the example can start from another device', async ({ page }) => {
  await page.goto('/method')
  const start = page.getByRole('form', { name: 'Start from a device' })
  await start.getByLabel('Start from').selectOption('Ostler Plain 7')
  await start.getByRole('button', { name: 'Fill in its readings' }).click()
  await expect(page).toHaveURL(/\/method\/try\?start=ostler-plain-7$/)
  await expect(page.getByText(/real set: Ostler Plain 7, unit/)).toBeVisible()
  await expect(form(page).getByLabel('Readings of the page')).toHaveValue(/^\d+(\.\d+)?, /)
})

test('the budget names the largest part and what all of them make', async ({ page }) => {
  await page.goto('/method#budget')
  const table = page.getByRole('table', { name: /what each part brings to its figures/ })
  for (const part of ['Scatter of readings', 'Places on a page', 'Units of a model', 'Calibration and certificate']) {
    await expect(table.getByRole('rowheader', { name: part })).toBeVisible()
  }
  await expect(table.getByRole('rowheader', { name: 'Expanded, k = 2' })).toBeVisible()
  await expect(page.getByText(/The largest part of L\*: .+ of the variance\./)).toBeVisible()
})

test('a control chart is read point by point with the arrow keys, and as a table', async ({ page }) => {
  await page.goto('/method#controls')
  const chart = page
    .getByRole('group', { name: 'White ceramic tile: mean L* of each session' })
    .filter({ visible: true })
  const points = chart.getByRole('img')
  // Once the script has come, the chart is one stop of the Tab key.
  await expect(points.nth(1)).toHaveAttribute('tabindex', '-1')
  await points.first().focus()
  await page.keyboard.press('ArrowRight')
  await expect(points.nth(1)).toBeFocused()
  await expect(points.nth(1)).toHaveAccessibleName(/^L\*: 9\d\.\d\d on \d+ \w+ 20\d\d, session \S+, /)
  await page.keyboard.press('End')
  await expect(points.last()).toBeFocused()

  const figure = page.getByRole('figure', { name: /White ceramic tile: mean L\*/ })
  await figure.getByText('The same figures as a table').click()
  const rows = figure.getByRole('table').getByRole('row')
  await expect(rows).toHaveCount((await points.count()) + 1)
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })
  test('the method page is all there', async ({ page }) => {
    await page.goto('/method')
    await expect(page.getByRole('heading', { level: 2 })).toContainText(['Reading spots', 'What we do not know'])
    await expect(step(page, 'In this light', 'Contrast reserve')).toContainText('times')
  })

  test('the worked example is sent and comes back worked out', async ({ page }) => {
    await page.goto('/method')
    await typeKnownPage(page)
    await form(page).getByRole('button', { name: 'Work it out' }).click()
    await expect(page).toHaveURL(/\/method\/try\?/)
    await expect(step(page, 'From the colour to whiteness', 'CIE whiteness')).toContainText('W₁₀ 28.93†')
    await expect(form(page).getByLabel('L* of the page')).toHaveValue('70')

    await form(page).getByLabel('Light on the page').fill('bright')
    await form(page).getByRole('button', { name: 'Work it out' }).click()
    await expect(page.getByRole('alert')).toContainText('"bright" is not a number of lux')
    await expect(form(page).getByLabel('Light on the page')).toHaveValue('bright')
  })
})

test('the worked example is filled in and sent with the keyboard alone', async ({ page }) => {
  await page.goto('/method/try')
  await form(page).getByRole('radio', { name: 'Lists of readings' }).focus()
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('Tab')
  await expect(form(page).getByLabel('L* of the page')).toBeFocused()
  await page.keyboard.press('ControlOrMeta+a')
  await page.keyboard.type('70')
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { name: 'In short' })).toBeFocused()
  await expect(short(page)).toContainText('70.0')
})

test('nothing scrolls sideways on the narrowest phone', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 700 })
  for (const path of ['/method', '/method/try']) {
    await page.goto(path)
    const beyond = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
    expect(beyond, path).toBeLessThanOrEqual(0)
  }
})

test('before the first edition the method is all there, and the example starts from its reference page', async ({
  page,
}) => {
  const empty = fromAddress('EMPTY_URL')
  await page.goto(`${empty}/method`)
  await expect(page.getByText('so there is nothing to budget')).toBeVisible()
  await expect(page.getByText('so there are no control charts')).toBeVisible()
  await expect(form(page).getByLabel('L* of the page')).toHaveValue('80')
  await page.goto(`${empty}/method/try?start=ostler-plain-7`)
  await expect(short(page)).toContainText('No doubts')
})

test('the method page is accessible in every theme', async ({ page }) => {
  test.slow()
  await expectAccessible(page, '/method')
})
test('the worked example is accessible in every theme', async ({ page }) => {
  await expectAccessible(page, '/method/try')
})
