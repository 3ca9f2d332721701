import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { reserve } from '../fixtures/second-route'
import reference from '../reference/spectra.json' with { type: 'json' }
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

const slider = (page: Page) => page.getByRole('slider', { name: 'Light on the page' })
const status = (page: Page) => page.getByRole('status')
const pages = (page: Page) => page.getByRole('list', { name: /^The pages in this light/ }).getByRole('listitem')
const names = (page: Page) => pages(page).getByRole('link').allTextContents()
const figures = (page: Page) => page.getByRole('table', { name: /^For .* text and eyes with/ })
const row = (page: Page, name: string) =>
  figures(page)
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name, exact: true }) })
const plain = (text: string | null) => (text ?? '').replace(/\s+/g, ' ')

type Asked = { lux: number; front?: boolean; age?: number; size?: number }

/** Contrast reserve by tests/fixtures/second-route.ts, straight from Method 1, sections 2 and 3. */
function reserveOf({ page, ink, frontLight }: EditionDevice, { lux, front = false, age = 25, size = 4.8 }: Asked) {
  const surface = { ...page, ink: ink.L, front: frontLight ? frontLight.max : 0 }
  return reserve(surface, lux, front, age, size)
}

function inOrder({ devices }: Edition, asked: Asked): string[] {
  return [...devices]
    .sort((one, other) => reserveOf(other, asked) - reserveOf(one, asked) || (one.slug < other.slug ? -1 : 1))
    .map(({ name }) => name)
}

// Y = 100·((L* + 16)/116)³ for these pages, ISO/CIE 11664-4; L = E·Y/(100π).
const y = (L: number) => 100 * ((L + 16) / 116) ** 3

test('the page opens in daylight of 80 lux with every page in the order of its contrast', async ({ page, request }) => {
  const edition = await latest(request)
  await page.goto('/light')
  await expect(page).toHaveTitle(/^In your light/)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('In your light')
  await expect(status(page)).toContainText('Bedside lamp, about 80 lux in daylight (CIE D65)')
  expect(await names(page)).toEqual(inOrder(edition, { lux: 80 }))
})

test('each figure is that of an independent recomputation', async ({ page, request }) => {
  const { devices, control } = await latest(request)
  await page.goto('/light?lux=250&lamp=A')
  for (const device of devices) {
    const text = plain(await row(page, device.name).textContent())
    expect(text).toContain(`${reserveOf(device, { lux: 250 }).toFixed(1)}×`)
    const luminance = (250 * y(device.page.L)) / (100 * Math.PI)
    expect(text).toContain(`${luminance.toFixed(1)} ±`)
    expect(text).toContain(`${(y(device.page.L) / y(control.paper.L)).toFixed(2)}× the paper`)
    expect(text).toContain(`${(y(control.paper.L) / y(device.page.L)).toFixed(2)}× ±`)
  }
})

test('eyes and text count as the method has them', async ({ page, request }) => {
  const edition = await latest(request)
  const asked = { lux: 80, age: 65, size: 2 }
  await page.goto('/light?light-need=much-more&type-size=small')
  await expect(figures(page)).toContainText('For small text and eyes with a need of much more light (worked as at 65')
  expect(await names(page)).toEqual(inOrder(edition, asked))
  const [first] = edition.devices
  await expect(row(page, first!.name)).toContainText(`${reserveOf(first!, asked).toFixed(1)}×`)
})

// CIELAB of the chromaticity shown, against the lamp's white of tests/reference/spectra.json; ISO/CIE 11664-4.
test('the colours under a lamp agree with their chromaticity and the white of the CIE lamp', async ({ page }) => {
  await page.goto('/light?lamp=LED-B1')
  const section = page.getByRole('region', { name: 'What the lamp does to the colours' })
  await section.getByText(/^The colours in figures/).click()
  const rows = section.getByRole('table').getByRole('row')
  await expect(rows).toHaveCount(16)
  const [Xn, Yn, Zn] = reference.whites['LED-B1'] as [number, number, number]
  const f = (t: number) => (t > (6 / 29) ** 3 ? Math.cbrt(t) : (841 / 108) * t + 4 / 29)
  for (const text of (await rows.allInnerTexts()).slice(1)) {
    const numbers = text
      .replaceAll('−', '-')
      .match(/-?\d+\.\d+/g)!
      .map(Number)
    const [L, a, b, x, yy] = numbers.slice(-6, -1) as [number, number, number, number, number]
    const Y = y(L)
    const [X, Z] = [(Y * x) / yy, (Y * (1 - x - yy)) / yy]
    // Four decimals of x and y and one of L* leave a* and b* some tenths.
    expect(Math.abs(500 * (f(X / Xn) - f(Y / Yn)) - a)).toBeLessThan(0.3)
    expect(Math.abs(200 * (f(Y / Yn) - f(Z / Zn)) - b)).toBeLessThan(0.3)
  }
})

test('a page without a spectrum is marked, and the assumption is said', async ({ page }) => {
  await page.goto('/light?lamp=A')
  await expect(pages(page).filter({ hasText: 'colour as in daylight*' })).toHaveText(/Tamber Almanac 6/)
  await expect(page.getByText(/No reflectance spectrum is known of Tamber Almanac 6/)).toContainText('constant colour')
  await page.goto('/light')
  await expect(pages(page).filter({ hasText: 'colour as in daylight' })).toHaveCount(0)
})

test('the slider is turned by keyboard, and order, figures and address follow', async ({ page, request }) => {
  const edition = await latest(request)
  await page.goto('/light?lamp=A&front=on')
  await slider(page).focus()
  await page.keyboard.press('End')
  await expect(status(page)).toContainText('Full sun, about 80,000 lux under an incandescent bulb')
  await expect.poll(() => names(page)).toEqual(inOrder(edition, { lux: 80_000, front: true }))
  await page.keyboard.press('Home')
  await expect(status(page)).toContainText('Lights off, about 0.1 lux')
  await page.keyboard.press('ArrowRight')
  await expect(status(page)).toContainText('about 0.11 lux')
  await expect.poll(() => names(page)).toEqual(inOrder(edition, { lux: 0.11, front: true }))
  await expect(page).toHaveURL(/\/light\?lux=0\.11&lamp=A&front=on$/)
  await page.reload()
  await expect(status(page)).toContainText('about 0.11 lux')
})

test('a light is set by its number or its name, and what is no number is told so', async ({ page }) => {
  await page.goto('/light')
  const box = page.getByRole('textbox', { name: 'Lux' })
  await box.fill('1,500')
  await page.getByRole('button', { name: 'Set' }).click()
  await expect(status(page)).toContainText('about 1,500 lux')
  await box.fill('bright')
  await box.press('Enter')
  await expect(page.getByRole('alert').filter({ hasText: 'Give a number' })).toBeVisible()
  await page.getByRole('link', { name: 'Desk', exact: true }).click()
  await expect(status(page)).toContainText('Desk, about 400 lux')
  await expect(page).toHaveURL(/\/light\?lux=400$/)
})

test('lamp, front light and pages are chosen in the form, and the light that was set stays', async ({ page }) => {
  await page.goto('/light')
  await slider(page).focus()
  await page.keyboard.press('Home')
  await expect(status(page)).toContainText('0.1 lux')
  const form = page.getByRole('form', { name: 'Lamp, front light, eyes and pages' })
  await form.getByRole('radio', { name: /^Fluorescent tube/ }).check()
  await form.getByRole('radio', { name: 'On', exact: true }).check()
  await form.getByText(/^Pages: all/).click()
  await form.getByRole('checkbox', { name: 'Wexby Vesper 6' }).check()
  await form.getByRole('checkbox', { name: 'Ostler Plain 7', exact: true }).check()
  await form.getByRole('button', { name: 'Show it so' }).click()
  await expect(page).toHaveURL(/\/light\?lux=0\.1&lamp=FL11&front=on&with=ostler-plain-7,wexby-vesper-6$/)
  await expect(status(page)).toContainText('three-band fluorescent tube (CIE FL11), front lights on')
  await expect(pages(page)).toHaveCount(2)
  await expect(row(page, 'Wexby Vesper 6')).toContainText('front light on')
  await expect(row(page, 'Ostler Plain 7')).toContainText('cannot be read')
  await expect(page.getByText('1 of the 2 cannot be read there.')).toBeVisible()
  await page.goBack()
  await expect(pages(page)).toHaveCount(16)
})

test('a link followed at once after the light was moved leads there, and Back finds the light', async ({ page }) => {
  await page.goto('/light')
  await slider(page).focus()
  await page.keyboard.press('End')
  await page.getByRole('link', { name: 'Ostler Plain 7', exact: true }).first().click()
  await expect(page).toHaveURL(/\/devices\/ostler-plain-7$/)
  await page.goBack()
  await expect(page).toHaveURL(/\/light\?lux=80000$/)
  await expect(status(page)).toContainText('about 80,000 lux')
})

test('in the dark without a front light it says that nothing can be read', async ({ page }) => {
  await page.goto('/light?lux=0.1')
  await expect(page.getByText(/^Nothing can be read on any of these pages/)).toBeVisible()
  await expect(page.getByText(/let the front lights be on/)).toBeVisible()
  await expect(pages(page).filter({ hasText: 'cannot be read' })).toHaveCount(16)
})

test('each page leads to its device, the first ones to their comparison, and the light into the quiz', async ({
  page,
}) => {
  await page.goto('/light?lux=93&with=ostler-plain-7,tamber-reed-7&front=on')
  await expect(page.getByRole('link', { name: 'Compare these' })).toHaveAttribute(
    'href',
    /^\/compare\?with=(ostler-plain-7,tamber-reed-7|tamber-reed-7,ostler-plain-7)$/,
  )
  await pages(page).getByRole('link', { name: 'Ostler Plain 7' }).click()
  await expect(page).toHaveURL(/\/devices\/ostler-plain-7$/)
  await page.goBack()
  await page.getByRole('link', { name: 'Take this light into the quiz' }).click()
  await expect(page).toHaveURL(/\/quiz\?step=2&own1=7&own1\.name=In\+my\+light&own1\.lux=93$/)
})

test('another way of writing an address leads to the short one', async ({ page }) => {
  for (const [asked, short] of [
    ['?lux=80&lamp=D65&front=off', ''],
    ['?with=wexby-vesper-6&with=ostler-plain-7&lux=5', '?lux=5&with=ostler-plain-7,wexby-vesper-6'],
    ['?step=0', '?lux=0.1'],
    ['?lux=&utm=x', ''],
  ]) {
    await page.goto(`/light${asked}`)
    expect(page.url()).toMatch(new RegExp(`/light${short!.replace(/[?.]/g, '\\$&')}$`))
  }
})

for (const [asked, said] of [
  ['?lux=bright', '"bright" is not a number of lux'],
  ['?lux=1e999', 'is not a number of lux'],
  ['?lux=-3', 'is not a number of lux'],
  ['?lux=0', 'shown is 0.1 lux'],
  ['?lux=99999999', 'shown is 80,000 lux'],
  ['?lux=5&lux=6', 'is given 2 times'],
  ['?lamp=D75', 'is not one of the lamps'],
  ['?lamp=%00', 'is not one of the lamps'],
  ['?front=maybe', 'is not on or off'],
  ['?with=no-such', 'There is no device "no-such"'],
  [`?with=${'x,'.repeat(900)}`, 'There is no device "x"'],
  ['?page=-1', 'is not a number of a page'],
] as const) {
  test(`an odd address, ${asked.slice(0, 24)}, is answered and explained`, async ({ page }) => {
    expect((await page.goto(`/light${asked}`))?.status()).toBe(200)
    await expect(page.getByText(said)).toBeVisible()
    await expect(pages(page)).toHaveCount(16)
  })
}

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('links, number, slider and form each show the light asked for, and keep the rest', async ({ page, request }) => {
    const edition = await latest(request)
    await page.goto('/light?lamp=A')
    await page.getByRole('link', { name: 'Full sun' }).click()
    await expect(page).toHaveURL(/lux=80000&lamp=A$/)
    expect(await names(page)).toEqual(inOrder(edition, { lux: 80_000 }))

    await page.getByRole('textbox', { name: 'Lux' }).fill('5')
    await page.getByRole('button', { name: 'Set' }).click()
    await expect(status(page)).toContainText('about 5 lux under an incandescent bulb')

    await slider(page).press('End')
    await page.getByRole('button', { name: 'Show this light' }).click()
    await expect(status(page)).toContainText('Full sun, about 80,000 lux under an incandescent bulb')

    await page.getByRole('radio', { name: /^Warm white LED/ }).check()
    await page.getByText(/^Pages: all/).click()
    await page.getByRole('checkbox', { name: 'Quayle Margin 10' }).check()
    await page.getByRole('button', { name: 'Show it so' }).click()
    await expect(page).toHaveURL(/\/light\?lux=80000&lamp=LED-B1&with=quayle-margin-10$/)
    await expect(pages(page)).toHaveCount(1)
  })
})

test('the paper theme has numbered pages in place of a long list', async ({ page, request, baseURL }) => {
  const edition = await latest(request)
  await page.context().addCookies([{ name: 'look', value: 'paper-metric', url: baseURL! }])
  await page.goto('/light?lamp=A')
  const shown = () => figures(page).getByRole('rowheader').allTextContents()
  expect(await shown()).toEqual(inOrder(edition, { lux: 80 }).slice(0, 8))
  await page.getByRole('link', { name: 'Next page' }).click()
  await expect(page).toHaveURL(/\/light\?lamp=A&page=2$/)
  await expect.poll(shown).toEqual(inOrder(edition, { lux: 80 }).slice(8))
  await page.goto('/light?page=99')
  await expect(page.getByText('Pages 9–16 of 16, page 2 of 2')).toBeVisible()
})

test('before the first release the page says so kindly', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/light?lux=5`)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('In your light')
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
})

test('the page is accessible in every theme, and at 320 px nothing scrolls sideways', async ({ page }) => {
  test.setTimeout(120_000)
  await expectAccessible(page, '/light?lamp=FL11')
  await page.setViewportSize({ width: 320, height: 800 })
  await expectAccessible(page, '/light?lux=0.1&lamp=A&front=on&with=ostler-plain-7,tamber-almanac-6,wexby-vesper-6')
})
