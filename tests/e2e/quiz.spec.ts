import AxeBuilder from '@axe-core/playwright'
import { expect, type Locator, type Page, test } from '@playwright/test'
import { THEMES } from '@/lib/look'
import { fromAddress } from './site'

const heading = (page: Page) => page.getByRole('heading', { level: 1 })
const hours = (page: Page, where: string) => page.getByRole('textbox', { name: `Hours a week: ${where}` })
const next = (page: Page) => page.getByRole('button', { name: /^Next: |^Show my result$/ })
const TRAIN = 'Train, bus, café by day'
const BEDSIDE = 'In bed, small lamp at arm’s length'

/** The names on the live shortlist, in order. */
const shortlist = (page: Page) => page.getByRole('complementary').getByRole('listitem')

async function choose(page: Page, question: string, answer: string | RegExp) {
  await page.getByRole('group', { name: question }).getByRole('radio', { name: answer, exact: true }).check()
}

/** What the API ranks first, as a second way to the same answer. */
async function firstByApi(page: Page, question: object): Promise<string> {
  const answer = await page.request.post('/api/v1/match', { data: question })
  const edition = await page.request.get('/api/v1/editions/latest')
  const { slug } = (await answer.json()).ranked[0]
  return (await edition.json()).devices.find((device: { slug: string }) => device.slug === slug).name
}

/** Presses Tab until the focus is there. */
async function tabTo(page: Page, target: Locator) {
  for (let presses = 0; presses < 80; presses++) {
    if (await target.evaluate((element) => element === document.activeElement)) return
    await page.keyboard.press('Tab')
  }
  throw new Error('The Tab key does not lead there')
}

test('a reader goes through five steps to the first place that the API gives for the same answers', async ({
  page,
}) => {
  await page.goto('/quiz')
  await choose(page, 'Papers, textbooks, PDFs', 'A lot')
  await choose(page, 'Notes I write or annotate', 'Some')
  await choose(page, 'How do you hold it', 'On a table or a stand')
  await next(page).click()

  await expect(heading(page)).toHaveText('Where do you read, and for how long?')
  await expect(heading(page)).toBeFocused()
  await expect(page).toHaveTitle('Step 2 of 5, where you read · Lampleaf')
  await hours(page, TRAIN).fill('2.5')
  await hours(page, 'Office or study desk').fill('10')
  await next(page).click()

  await choose(page, 'Do you often want more light', 'Yes, more')
  await choose(page, 'How large do you set the type', /^Small/)
  await next(page).click()

  await choose(page, 'Free of tint', '1st')
  await choose(page, 'Clear in your light', '1st')
  await choose(page, 'Size, weight, sharpness', '3rd')
  await choose(page, 'Which white', 'Neutral white')
  await next(page).click()

  await page.getByRole('textbox', { name: 'Most to pay' }).fill('500')
  await choose(page, 'A pen to write with', 'Must')
  await expect(page).toHaveURL(/budget=500&pen=must$/)
  await next(page).click()

  await expect(page).toHaveURL(
    '/quiz/result?documents=3&notes=2&hold=table&train=2.5&desk=10&light-need=more&type-size=small&clarity=1&tint=1&handling=3&white=neutral&budget=500&pen=must',
  )
  const first = await firstByApi(page, {
    spots: [
      { lux: 200, hours: 2.5, frontLight: false },
      { lux: 400, hours: 10, frontLight: false },
    ],
    lightNeed: 'more',
    text: 'small',
    preferredWhite: 'neutral',
    aims: [['clarity', 'tint'], ['handling'], ['whiteness']],
    reads: { documents: 3, notes: 2 },
    hold: 'table',
    limits: { budget: 50_000, currency: 'GBP', pen: true },
  })
  await expect(heading(page)).toContainText(first.replace(/ (\d+)$/, '\u00a0$1'))
})

test('the whole quiz works by keyboard alone', async ({ page }) => {
  await page.goto('/quiz')
  await tabTo(page, page.getByRole('group', { name: 'Novels' }).getByRole('radio', { name: 'None' }))
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('ArrowRight')
  await expect(page.getByRole('group', { name: 'Novels' }).getByRole('radio', { name: 'Some' })).toBeChecked()
  await tabTo(page, next(page))
  await page.keyboard.press('Enter')

  await expect(heading(page)).toBeFocused()
  await tabTo(page, hours(page, BEDSIDE))
  await page.keyboard.press('ArrowUp')
  await page.keyboard.press('ArrowUp')
  await page.keyboard.press('ArrowUp')
  await expect(hours(page, BEDSIDE)).toHaveValue('1.5')
  await page.keyboard.press('Enter')

  await expect(heading(page)).toHaveText('How much light and how large a type do you like?')
  for (const step of [4, 5]) {
    await tabTo(page, page.getByRole('button', { name: 'Not sure, skip' }))
    await page.keyboard.press('Space')
    await expect(page.getByText(`Step ${step} of 5`, { exact: true })).toBeVisible()
    await expect(heading(page)).toBeFocused()
  }
  await tabTo(page, next(page))
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL('/quiz/result?novels=2&bed-lamp=1.5&skipped=3,4')
})

test('answers survive Back, reload and being shared', async ({ page, browser, baseURL }) => {
  await page.goto('/quiz?step=2')
  await hours(page, TRAIN).fill('4')
  await next(page).click()
  await choose(page, 'Do you often want more light', 'Yes, much more')
  await page.goBack()
  await expect(heading(page)).toHaveText('Where do you read, and for how long?')
  await expect(hours(page, TRAIN)).toHaveValue('4')
  await page.goForward()
  await expect(page.getByRole('radio', { name: 'Yes, much more' })).toBeChecked()
  await expect(page).toHaveURL('/quiz?step=3&train=4&light-need=much-more')
  await page.reload()
  await expect(page.getByRole('radio', { name: 'Yes, much more' })).toBeChecked()

  const elsewhere = await browser.newContext({ baseURL })
  const shared = await elsewhere.newPage()
  await shared.goto(page.url())
  await expect(shared.getByRole('radio', { name: 'Yes, much more' })).toBeChecked()
  await shared.getByRole('button', { name: 'Back' }).click()
  await expect(hours(shared, TRAIN)).toHaveValue('4')
  await elsewhere.close()
})

test('going back from the result finds the last step as it was', async ({ page }) => {
  await page.goto('/quiz?step=5&train=4')
  await page.getByRole('textbox', { name: 'Most to pay' }).fill('300')
  await next(page).click()
  await expect(page).toHaveURL('/quiz/result?train=4&budget=300')
  await page.goBack()
  await expect(page.getByRole('textbox', { name: 'Most to pay' })).toHaveValue('300')
})

test('while one answers, nothing is sent and nothing is stored', async ({ page, context }) => {
  await page.goto('/quiz')
  await expect(page.getByText('is the doubt, at about 95')).toBeVisible()
  const sent: string[] = []
  const named: Promise<string | undefined>[] = []
  page.on('request', (request) => {
    sent.push(`${request.method()} ${request.url()}`)
    named.push(request.allHeaders().then(({ referer }) => referer))
  })
  await choose(page, 'Novels and other long prose', 'A lot')
  await next(page).click()
  await hours(page, TRAIN).fill('4')
  await next(page).click()
  await choose(page, 'How large do you set the type', /^Large/)
  await expect(page).toHaveURL('/quiz?step=3&novels=3&train=4&type-size=large')
  await expect(page.getByText('is the doubt, at about 95')).toBeVisible()

  const scripts = /\/_next\/|\/__nextjs|\/icon\.svg/
  expect(sent.filter((request) => !scripts.test(request) && !request.includes('blob:'))).toEqual([])
  // Not even the address of the page, which holds the answers, goes along with a request for an icon.
  for (const referer of await Promise.all(named)) expect(referer ?? '').not.toContain('?')
  expect(await context.cookies()).toEqual([])
  expect(await page.evaluate(() => localStorage.length + sessionStorage.length)).toBe(0)
})

test('the shortlist follows the answers, with doubts, ties, and what fell out and why', async ({ page }) => {
  await page.goto('/quiz?step=5')
  const devices = (await (await page.request.get('/api/v1/editions/latest')).json()).devices
  await expect(page.getByText(`All ${devices.length} devices are left.`)).toBeVisible()
  const before = (await shortlist(page).first().textContent()) ?? ''
  await choose(page, 'Colour', 'Must')
  const inColour = devices.filter((device: { colour: boolean | null }) => device.colour !== false).length
  await expect(
    page.getByText(`${inColour} of ${devices.length} devices are left`, { exact: false }).first(),
  ).toBeVisible()
  await expect(shortlist(page).first()).not.toHaveText(before)
  await page.getByText('left out, and why').click()
  await expect(page.getByRole('complementary').getByText('is not in colour').first()).toBeVisible()
  await expect(shortlist(page).first()).toContainText('give or take')
})

test('more than three limits, and limits that leave little, are warned of in words', async ({ page }) => {
  await page.goto('/quiz?step=5&budget=600&min-size=5&max-size=9')
  await expect(page.getByText('These are more than 3 limits.')).toHaveCount(0)
  await page.getByRole('textbox', { name: 'Weight up to' }).fill('130')
  await expect(page.getByText('These are more than 3 limits.')).toBeVisible()
  await expect(page.getByText('That leaves very few to choose from.')).toBeVisible()
})

test('a wrong number stays as typed, is explained, and the way to it is one link', async ({ page }) => {
  await page.goto('/quiz?step=2')
  await hours(page, TRAIN).fill('lots')
  await hours(page, BEDSIDE).fill('200')
  await next(page).click()
  const summary = page.getByRole('alert').filter({ hasText: 'Please look at this again' })
  await expect(summary).toBeFocused()
  await expect(summary.getByRole('link')).toHaveCount(2)
  await expect(hours(page, TRAIN)).toHaveValue('lots')
  await expect(hours(page, TRAIN)).toHaveAccessibleDescription(/"lots" is not a number of hours a week from 0 to 168/)
  await summary.getByRole('link', { name: /"200"/ }).click()
  await expect(hours(page, BEDSIDE)).toBeFocused()
  await hours(page, BEDSIDE).fill('2')
  await hours(page, TRAIN).fill('1')
  await next(page).click()
  await expect(page).toHaveURL('/quiz?step=3&bed-lamp=2&train=1')
})

test('a step one is not sure of is passed over, and what is assumed instead is said', async ({ page }) => {
  await page.goto('/quiz?step=3&type-size=small')
  await expect(
    page.getByText('If you skip this step we assume the usual need for light and type of normal size.'),
  ).toBeVisible()
  await page.getByRole('button', { name: 'Not sure, skip' }).click()
  await expect(page).toHaveURL('/quiz?step=4&skipped=3')
  await expect(page.getByText('Not sure about: how much light you want and type size.')).toBeVisible()
})

test('the light of a spot can be estimated by a lamp and its distance', async ({ page }) => {
  await page.goto('/quiz?step=2&desk=3')
  await page.getByText('change the light of Office or study desk').locator('..').click()
  await page.getByRole('button', { name: 'Estimate the light for Office or study desk' }).click()
  await expect(heading(page)).toHaveText('How much light is there?')
  await page.getByRole('textbox', { name: 'From bulb to page' }).fill('40')
  await page.getByRole('button', { name: 'Work it out' }).nth(1).click()
  await expect(page.getByText('it may be anything from 120 to 470')).toBeVisible()
  await page.getByRole('button', { name: 'Use it' }).click()
  await expect(page).toHaveURL('/quiz?step=2&desk=3&desk.lux=230')
  await expect(page.getByText(/about 230.lux/)).toBeVisible()
})

test('a spot of one’s own is named, lit and ranked', async ({ page }) => {
  await page.goto('/quiz?step=2')
  await page.getByText('Add a spot of your own').click()
  await page.getByRole('textbox', { name: 'What you call it' }).fill('Kitchen table')
  const own = page.getByRole('group', { name: 'A spot of your own' })
  await own.getByRole('textbox', { name: 'Light on the page' }).fill('150')
  await own.getByRole('textbox', { name: 'Hours a week' }).fill('5')
  await page.getByRole('button', { name: 'Add this spot' }).click()
  await expect(page.getByRole('group', { name: 'Kitchen table' })).toBeVisible()
  await expect(page).toHaveURL('/quiz?step=2&own1=5&own1.name=Kitchen+table&own1.lux=150')
  await page.goto('/quiz/result?own1=5&own1.name=Kitchen+table&own1.lux=150')
  await expect(page.getByText('in “Kitchen table”', { exact: false }).first()).toBeVisible()
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a reader goes through the quiz by plain forms', async ({ page }) => {
    await page.goto('/quiz')
    await choose(page, 'Novels and other long prose', 'A lot')
    await next(page).click()
    await expect(page).toHaveURL('/quiz?step=2&novels=3')
    await hours(page, TRAIN).fill('4')
    await hours(page, BEDSIDE).fill('7.0')
    await page.getByRole('button', { name: 'Update this list' }).click()
    await expect(page).toHaveURL('/quiz?step=2&novels=3&bed-lamp=7&train=4')
    await next(page).click()
    await page.getByRole('button', { name: 'Not sure, skip' }).click()
    await expect(page).toHaveURL('/quiz?step=4&novels=3&bed-lamp=7&train=4&skipped=3')
    await choose(page, 'Free of tint', '1st')
    await page.getByRole('button', { name: 'Back' }).click()
    await expect(page).toHaveURL('/quiz?step=3&novels=3&bed-lamp=7&train=4&tint=1&skipped=3')
    await next(page).click()
    await next(page).click()
    await page.getByRole('textbox', { name: 'Most to pay' }).fill('£250')
    await page.getByRole('checkbox', { name: 'EPUB' }).check()
    await page.getByRole('checkbox', { name: 'PDF' }).check()
    await next(page).click()
    await expect(page).toHaveURL(
      '/quiz/result?novels=3&bed-lamp=7&train=4&tint=1&budget=250&formats=EPUB,PDF&skipped=3',
    )
    await expect(page.getByRole('heading', { name: 'Where the points come from' })).toBeVisible()
  })

  test('the shortlist stands beside each step, worked out by the server', async ({ page }) => {
    await page.goto('/quiz?step=4&colour=must-not')
    await expect(shortlist(page).first()).toBeVisible()
    await expect(page.getByText('The result adds the doubts')).toBeVisible()
  })

  test('a wrong number is explained, and what was typed is kept', async ({ page }) => {
    await page.goto('/quiz?step=2')
    await hours(page, TRAIN).fill('lots')
    await hours(page, BEDSIDE).fill('7')
    await next(page).click()
    await expect(page).toHaveTitle(/^Please correct: step 2 of 5/)
    await expect(page.getByRole('link', { name: /"lots" is not a number/ })).toHaveAttribute('href', '#train')
    await expect(hours(page, TRAIN)).toHaveValue('lots')
    await expect(hours(page, BEDSIDE)).toHaveValue('7')
    await page.getByRole('button', { name: 'Back' }).click()
    await expect(heading(page)).toHaveText('What do you read, and how do you hold it?')
    await next(page).click()
    await expect(hours(page, TRAIN)).toHaveValue('lots')
  })

  test('the light of a spot can be estimated by what one sees', async ({ page }) => {
    await page.goto('/quiz?step=2&estimate=own1&train=4')
    await page.getByRole('radio', { name: 'A printed paperback reads comfortably' }).check()
    await page.getByRole('button', { name: 'Work it out' }).first().click()
    await expect(page.getByText('it may be anything from 100 to 500')).toBeVisible()
    await page.getByRole('button', { name: 'Use it' }).click()
    await expect(page).toHaveURL('/quiz?step=2&train=4&own1.lux=200')
    await expect(page.getByRole('group', { name: 'Your own spot 1' })).toBeVisible()
  })

  test('only what works without it is offered', async ({ page }) => {
    await page.goto('/quiz?step=2')
    await expect(page.getByRole('slider')).toHaveCount(0)
    await expect(page.getByRole('button', { name: 'One hour more' })).toHaveCount(0)
  })
})

test.describe('a hostile address', () => {
  const thousand = Array.from({ length: 1000 }, (_, i) => `train=${i}`).join('&')
  for (const [name, query] of [
    ['a thousand parameters', thousand],
    ['numbers that are none', 'step=2&train=NaN&desk=1e999&window=-5&shade.lux=Infinity'],
    ['names of the prototype', '__proto__=1&constructor=2&step=2&train=abc'],
    ['U+0000 and broken bytes', 'step=2&own1.name=%00&own1.lux=5&hold=%00&train=%FF'],
    ['markup', 'step=2&own1.lux=5&own1.name=%3Cscript%3Ealert(1)%3C%2Fscript%3E&train=%22%3E%3Cimg'],
    ['a step that does not exist', 'step=99&estimate=__proto__&go=%00&use=NaN'],
  ] as const) {
    test(`with ${name} gets a page of the quiz, and no script of its own`, async ({ page }) => {
      page.on('dialog', () => {
        throw new Error('A script of the address ran')
      })
      for (const path of ['/quiz', '/quiz/result']) {
        const answer = await page.goto(`${path}?${query}`)
        expect(answer?.status()).toBe(200)
        await expect(heading(page)).toBeVisible()
      }
    })
  }

  test('is told which fields are wrong', async ({ page }) => {
    await page.goto('/quiz?step=2&train=NaN&desk=1e9')
    await expect(page.getByRole('link', { name: /Train.*"NaN" is not a number of hours/ })).toBeVisible()
    await expect(page.getByRole('link', { name: /desk.*"1e9" is not a number of hours/ })).toBeVisible()
  })
})

test.describe('on a narrow page', () => {
  test.use({ viewport: { width: 320, height: 640 } })

  test('no step is wider than 320 px', async ({ page }) => {
    for (const query of ['', 'step=2&own1.lux=80', 'step=3', 'step=4', 'step=5', 'step=2&estimate=desk']) {
      await page.goto(`/quiz?${query}`)
      await expect(heading(page)).toBeVisible()
      expect(await page.evaluate(() => document.documentElement.scrollWidth), query).toBeLessThanOrEqual(320)
    }
  })

  test('the bar at the foot never covers what has the focus', async ({ page }) => {
    await page.goto('/quiz?step=2')
    const bar = page.getByText('So far:').locator('..')
    await expect(bar).toBeVisible()
    const fields = page.locator('form#quiz').locator('input:not([type=hidden]):not([tabindex="-1"]), summary, button')
    for (const field of await fields.all()) {
      if (!(await field.isVisible())) continue
      await field.focus()
      const [own, over] = [await field.boundingBox(), (await bar.isVisible()) ? await bar.boundingBox() : null]
      if (own && over) expect(own.y + own.height).toBeLessThanOrEqual(over.y + 1)
    }
  })

  test('the bar leads to the shortlist', async ({ page }) => {
    await page.goto('/quiz?step=2')
    await expect(page.getByText(/So far: .+ leads/)).toBeVisible()
    await page.getByRole('link', { name: 'Show' }).click()
    await expect(page.getByRole('heading', { name: 'Your shortlist so far' })).toBeFocused()
  })

  test('every target is at least 24 px, and buttons 44', async ({ page }) => {
    await page.goto('/quiz?step=2')
    for (const button of await page.locator('form#quiz').getByRole('button').all()) {
      const box = await button.boundingBox()
      if (box) expect(Math.min(box.width, box.height)).toBeGreaterThanOrEqual(44)
    }
    for (const summary of await page.locator('form#quiz summary').all()) {
      expect((await summary.boundingBox())?.height).toBeGreaterThanOrEqual(24)
    }
  })
})

for (const theme of THEMES) {
  test(`every step is free of accessibility violations in the ${theme} theme`, async ({ page, context, baseURL }) => {
    test.slow()
    await context.addCookies([{ name: 'look', value: `${theme}-metric`, url: baseURL! }])
    for (const query of [
      'step=1',
      'step=2&train=4&own1=2&own1.lux=80',
      'step=2&train=abc',
      'step=3',
      'step=4&clarity=1',
      'step=5&budget=200&colour=must',
      'step=2&estimate=desk&way=lamp&lamp=470&distance=40',
    ]) {
      await page.goto(`/quiz?${query}`)
      await expect(shortlist(page).first()).toBeVisible()
      for (const summary of await page.locator('form summary').all()) await summary.click()
      const { violations } = await new AxeBuilder({ page }).analyze()
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`),
        query,
      ).toEqual([])
    }
  })
}

test('before the first release the quiz says that there is nothing to rank yet', async ({ page }) => {
  await page.goto(`${fromAddress('EMPTY_URL')}/quiz`)
  await expect(page.getByText('No edition has been released yet')).toBeVisible()
})
