import AxeBuilder from '@axe-core/playwright'
import { expect, type Page, test } from '@playwright/test'
import { THEMES } from '@/lib/look'
import { fromAddress } from './site'

const heading = (page: Page) => page.getByRole('heading', { level: 1 })
const points = (page: Page) => page.getByRole('table', { name: /Points of each device by aim/ })
const RESULT = '/quiz/result?bed-lamp=7&train=4'
const QUESTION = {
  spots: [
    { lux: 80, hours: 7, frontLight: true },
    { lux: 200, hours: 4, frontLight: false },
  ],
}

type Ranked = { slug: string; fit: number; sd: number; first: number; tiedWith: string[]; unreadable: number }

/** The API's answer to a question, and the names of the devices. */
async function asked(page: Page, question: object) {
  const [answer, edition] = await Promise.all([
    page.request.post('/api/v1/match', { data: question }),
    page.request.get('/api/v1/editions/latest'),
  ])
  const { devices, number } = await edition.json()
  const { ranked } = (await answer.json()) as { ranked: Ranked[] }
  const nameOf = (slug: string): string => devices.find((device: { slug: string }) => device.slug === slug).name
  return { ranked, nameOf, devices, number }
}

test('the result says who is closest, by how much, why, and on what it rests, as the API answers', async ({ page }) => {
  await page.goto(`${RESULT}&page=all`)
  const { ranked, nameOf, number } = await asked(page, QUESTION)
  const [first] = ranked
  await expect(heading(page)).toContainText(nameOf(first!.slug).replace(/ (\d+)$/, '\u00a0$1'))
  await expect(page.getByText('Fit with your answers').locator('..')).toContainText(
    `${Math.round(first!.fit)} ±\u202f${Math.round(2 * first!.sd)}`,
  )
  await expect(page.getByText(/keeps \d+\.\d times the contrast your eyes need/)).toBeVisible()
  const names = await points(page).getByRole('rowheader').getByRole('link').allTextContents()
  expect(names).toEqual(ranked.map(({ slug }) => nameOf(slug)))
  await expect(page.getByRole('link', { name: `Edition ${number}` })).toHaveAttribute(
    'href',
    `/api/v1/editions/${number}`,
  )
  await expect(page.getByRole('link', { name: 'Method 1' })).toHaveAttribute('href', '/method')
  for (const title of [
    'In the light you read by',
    'What would change this',
    'What this rests on',
    'Please keep in mind',
  ]) {
    await expect(page.getByRole('heading', { name: title })).toBeVisible()
  }
  await expect(page.getByText('You did not say, so we assumed mostly novels and a few articles')).toBeVisible()
})

test('points add up to the fit of each row', async ({ page }) => {
  await page.goto(`${RESULT}&page=all`)
  for (const row of await points(page).locator('tbody tr:not(.points-group)').all()) {
    const [clarity, whiteness, tint, handling, fit] = (await row.getByRole('cell').allTextContents()).map((text) =>
      Number.parseInt(text, 10),
    )
    expect(clarity! + whiteness! + tint! + handling!).toBe(fit)
  }
})

test('devices too close to call are named with their share of the draws, and none wins by fiat', async ({ page }) => {
  await page.goto(RESULT)
  const { ranked, nameOf } = await asked(page, QUESTION)
  const rivals = ranked[0]!.tiedWith
  expect(rivals.length).toBeGreaterThan(0)
  await expect(page.getByText(/devices are too close to call for you/)).toBeVisible()
  await expect(heading(page)).toHaveText(/, by a (whisker|little)$/)
  await expect(page.getByText(/Allowing for what we cannot measure better/)).toContainText(nameOf(rivals[0]!))
})

test('weights moved by hand reorder the result, live and in the address', async ({ page }) => {
  await page.goto(RESULT)
  await page.getByText('Move the weights yourself').click()
  await page.getByRole('textbox', { name: 'Clear in your light' }).fill('0')
  await page.getByRole('textbox', { name: 'White, not grey' }).fill('0')
  await page.getByRole('textbox', { name: 'Free of tint' }).fill('1')
  await page.getByRole('textbox', { name: 'Size, weight, sharpness' }).fill('0')
  await expect(page).toHaveURL(`${RESULT}&weight.clarity=0&weight.whiteness=0&weight.tint=1&weight.handling=0`)
  const { ranked, nameOf } = await asked(page, {
    ...QUESTION,
    weights: { clarity: 0, whiteness: 0, tint: 1, handling: 0 },
  })
  await expect(heading(page)).toContainText(nameOf(ranked[0]!.slug).replace(/ (\d+)$/, '\u00a0$1'))
  await expect(page.getByText('The ranking above follows your weights.')).toBeVisible()
  await expect(page.getByRole('textbox', { name: 'Size, weight, sharpness' })).toBeFocused()

  await page.getByRole('textbox', { name: 'Free of tint' }).fill('0')
  await expect(page.getByText('all four are 0; give at least one above 0')).toBeVisible()
  await page.getByRole('link', { name: 'Back to my order of aims and my light' }).click()
  await expect(page).toHaveURL(RESULT)
})

test('the link is copied, and says so', async ({ page, context, baseURL }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'], { origin: new URL(baseURL!).origin })
  await page.goto(RESULT)
  await page.getByRole('button', { name: 'Copy link' }).click()
  await expect(page.getByText('Copied. Whoever opens it sees this result.')).toBeVisible()
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(page.url())
})

test('where the browser will not copy, the address is shown to be copied by hand', async ({ page }) => {
  await page.addInitScript(() => Object.defineProperty(navigator, 'clipboard', { value: undefined }))
  await page.goto(RESULT)
  await page.getByRole('button', { name: 'Copy link' }).click()
  await expect(page.getByRole('textbox', { name: 'Address of this result' })).toHaveValue(page.url())
})

test('the result prints on one page of A4 or Letter, with its address, edition and date', async ({ page }) => {
  for (const query of ['&page=all', '&budget=250&min-size=6&colour=must-not&bed-dark=1&bed-dark.light=off']) {
    await page.goto(`${RESULT}${query}`)
    for (const format of ['A4', 'Letter']) {
      const pdf = await page.pdf({ format, preferCSSPageSize: true })
      expect(pdf.toString('latin1').match(/\/Type\s*\/Page\b(?!s)/g), `${format} ${query}`).toHaveLength(1)
    }
    await page.emulateMedia({ media: 'print' })
    await expect(page.getByText(/^https?:\/\/\S+\/quiz\/result\?/)).toBeVisible()
    await expect(page.getByText(/Edition 3, released \d{1,2} \w+ \d{4}/)).toBeVisible()
    await page.emulateMedia({ media: null })
  }
})

test('the answers can be changed, and the quiz opens with them', async ({ page }) => {
  await page.goto(`${RESULT}&hold=table`)
  await page.getByRole('link', { name: 'Change my answers' }).click()
  await expect(page.getByRole('radio', { name: 'On a table or a stand' })).toBeChecked()
  await expect(page).toHaveURL('/quiz?hold=table&bed-lamp=7&train=4')
})

test('near misses are named with what they miss by, and what their fit would be', async ({ page }) => {
  await page.goto(`${RESULT}&budget=150`)
  await expect(page.getByRole('heading', { name: 'Nearly made it' })).toBeVisible()
  await expect(page.getByText(/costs £\d+, £\d+ over your budget\. Its fit would be \d+\./).first()).toBeVisible()
})

test('a device whose maker does not state something is kept, and the page says so', async ({ page }) => {
  await page.goto(`${RESULT}&budget=50`)
  await expect(page.getByRole('heading', { name: 'Not stated' })).toBeVisible()
  await expect(page.getByText(/Price in pounds of .+: kept, though it may be over your budget\./)).toBeVisible()
})

test.describe('where nothing can be read', () => {
  test('in any spot, there is no ranking at all', async ({ page }) => {
    await page.goto('/quiz/result?bed-dark=7&bed-dark.light=off')
    await expect(heading(page)).toHaveText('Nothing can be read in that light')
    await expect(page.getByRole('table')).toHaveCount(0)
    await page.getByRole('link', { name: 'Change where I read' }).click()
    await expect(page.getByRole('textbox', { name: 'Hours a week: In bed, lights off' })).toHaveValue('7')
  })

  test('in one spot, a notice names it and the others are ranked', async ({ page }) => {
    await page.goto('/quiz/result?bed-dark=2&bed-dark.light=off&train=4')
    await expect(page.getByText('“In bed, lights off”: none of these pages can be read there')).toBeVisible()
    await expect(points(page)).toBeVisible()
  })

  test('by a device without a front light, it is named apart and not ranked', async ({ page }) => {
    await page.goto('/quiz/result?bed-dark=7&page=all')
    const { ranked, nameOf } = await asked(page, { spots: [{ lux: 0.1, hours: 7, frontLight: true }] })
    const unreadable = ranked.filter((device) => device.unreadable === 1).map(({ slug }) => nameOf(slug))
    expect(unreadable.length).toBeGreaterThan(0)
    const notice = page.getByText(/^Not ranked, since/)
    const names = await points(page).getByRole('rowheader').getByRole('link').allTextContents()
    for (const name of unreadable) {
      await expect(notice).toContainText(name)
      expect(names).not.toContain(name)
    }
    expect(names).toHaveLength(ranked.length - unreadable.length)
  })
})

test('limits that no device meets are answered by what each took away and who came nearest', async ({ page }) => {
  await page.goto('/quiz/result?min-size=12&max-weight=200&water=8')
  await expect(heading(page)).toHaveText('No device meets all of your limits')
  await expect(page.getByText(/the smallest size \(\d+\)/)).toBeVisible()
  await page.getByRole('link', { name: 'Change my limits' }).click()
  await expect(page.getByRole('textbox', { name: 'Size from' })).toHaveValue('12')
})

test('an address that makes no sense names the fields and leads to them', async ({ page }) => {
  await page.goto('/quiz/result?train=abc&budget=lots&desk=3')
  const summary = page.getByRole('alert').filter({ hasText: 'do not make sense' })
  await expect(summary).toBeFocused()
  await expect(page.getByRole('table')).toHaveCount(0)
  await summary.getByRole('link', { name: /"abc" is not a number of hours/ }).click()
  await expect(page.getByRole('textbox', { name: 'Hours a week: Train' })).toHaveValue('abc')
  await page.goBack()
  await page.getByRole('link', { name: 'Leave these out and show the result' }).click()
  await expect(page).toHaveURL('/quiz/result?desk=3')
})

test('whatever order an address is written in, it is shown in one', async ({ page }) => {
  await page.goto('/quiz/result?train=4.0&bed-lamp=7&novels=&budget=%C2%A3300')
  await expect(page).toHaveURL('/quiz/result?bed-lamp=7&train=4&budget=300')
  await page.goto('/quiz/result?train=4&utm_source=x')
  await expect(page.getByText('Parts of the address we do not know were left out: utm_source.')).toBeVisible()
})

test('the result is nobody else’s to find', async ({ page }) => {
  await page.goto(RESULT)
  await expect(page.locator('meta[name="robots"]')).toHaveAttribute('content', /noindex/)
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('the whole result is there, and the weights can be moved by a form', async ({ page }) => {
    await page.goto(RESULT)
    await expect(points(page)).toBeVisible()
    await expect(page.getByRole('button', { name: 'Copy link' })).toHaveCount(0)
    await page.getByText('Move the weights yourself').click()
    await page.getByRole('textbox', { name: 'Free of tint' }).fill('100')
    await page.getByRole('button', { name: 'Use these weights' }).click()
    await expect(page).toHaveURL(/\/quiz\/result\?bed-lamp=7&train=4&weight\.clarity=\d+&.*weight\.tint=100/)
    await page.getByRole('link', { name: 'Next page' }).click()
    await expect(page.getByText(/page 2 of \d/)).toBeVisible()
  })
})

test.describe('on a narrow page', () => {
  test.use({ viewport: { width: 320, height: 640 } })

  test('the result is no wider than 320 px', async ({ page }) => {
    for (const address of [
      RESULT,
      '/quiz/result?bed-dark=7&bed-dark.light=off',
      '/quiz/result?min-size=12&max-weight=200',
    ]) {
      await page.goto(address)
      expect(await page.evaluate(() => document.documentElement.scrollWidth), address).toBeLessThanOrEqual(320)
    }
  })
})

for (const theme of THEMES) {
  test(`every kind of result is free of accessibility violations in the ${theme} theme`, async ({
    page,
    context,
    baseURL,
  }) => {
    test.slow()
    await context.addCookies([{ name: 'look', value: `${theme}-metric`, url: baseURL! }])
    for (const query of [
      'bed-lamp=7&train=4&budget=250&bed-dark=1&bed-dark.light=off',
      'bed-lamp=7&weight.tint=1',
      'bed-dark=7&bed-dark.light=off',
      'min-size=12&max-weight=200&water=8',
      'train=abc',
    ]) {
      await page.goto(`/quiz/result?${query}`)
      await expect(heading(page)).toBeVisible()
      for (const summary of await page.locator('main summary').all()) {
        if (await summary.isVisible()) await summary.click()
      }
      const { violations } = await new AxeBuilder({ page }).analyze()
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`),
        query,
      ).toEqual([])
    }
  })
}

test('the paper theme has numbered pages in place of a long scroll', async ({ page, context, baseURL }) => {
  await context.addCookies([{ name: 'look', value: 'paper-metric', url: baseURL! }])
  await page.goto(RESULT)
  await expect(page.getByText(/Devices 1–6 of \d+, page 1 of \d/)).toBeVisible()
  await page.getByRole('link', { name: 'Next page' }).click()
  await expect(page.getByText(/Devices 7–12 of \d+, page 2 of \d/)).toBeVisible()
})

test('before the first release the result says that there is nothing to rank yet', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}${RESULT}`)
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
})
