import { expect, type Page, test } from '@playwright/test'
import type { Edition, MatchAnswer } from '@/lib/method/types'
import { toRequest } from '@/lib/quiz/request'
import { picksOf } from '@/lib/readers/picks'
import { yoursHref } from '@/lib/readers/reader'
import { READERS } from '@/lib/readers/readers'
import { expectAccessible } from './axe'
import { fromAddress } from './site'

const ROOMS = ['/for', '/for/train-and-cafe', '/glossary', '/about', '/corrections', '/editions', '/editions/2']

/** The structured data of a page, by its type. */
async function structured(page: Page, type: string) {
  const blocks = await page.locator('script[type="application/ld+json"]').allTextContents()
  return blocks.map((block) => JSON.parse(block)).find((data) => data['@type'] === type)
}

for (const path of ROOMS) {
  test(`${path} has one heading of its own, a description and its canonical address`, async ({ page }) => {
    await page.goto(path)
    await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1)
    await expect(page.locator('meta[name="description"]')).toHaveAttribute('content', /.{50,}/)
    await expect(page.locator('link[rel="canonical"]')).toHaveAttribute('href', new RegExp(`${path}$`))
  })
}

test('a visitor finds the eight typical readers and opens one', async ({ page }) => {
  await page.goto('/for')
  for (const { name } of READERS) await expect(page.getByRole('heading', { name, exact: true })).toBeVisible()
  await page.getByRole('link', { name: 'Shared bed' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Shared bed' })).toBeVisible()
})

for (const reader of READERS) {
  test(`the picks for “${reader.name}” are those the API gives for the same answers`, async ({ page, request }) => {
    const answer = await request.post('/api/v1/match', { data: toRequest(reader.answers) })
    const { ranked } = (await answer.json()) as MatchAnswer
    const { devices } = (await (await request.get('/api/v1/editions/latest')).json()) as Edition
    const nameOf = (slug: string) => devices.find((device) => device.slug === slug)!.name
    const { shown, readable } = picksOf(ranked)

    await page.goto(`/for/${reader.slug}`)
    const table = page.getByRole('table', { name: 'Points of each device' })
    const names = table.getByRole('rowheader').getByRole('link')
    await expect(names).toHaveText(shown.flat().map(({ slug }) => nameOf(slug)))
    await expect(page.getByRole('heading', { level: 2 }).first()).toContainText(nameOf(readable[0]!.slug))
    const tied = table.getByRole('row', { name: 'Too close to call', exact: true })
    await expect(tied).toHaveCount(shown[0]!.length > 1 ? 1 : 0)
    const list = await structured(page, 'ItemList')
    expect(list.itemListElement.map((item: { name: string }) => item.name)).toEqual(
      shown.flat().map(({ slug }) => nameOf(slug)),
    )
  })
}

test('a typical reader’s answers are stated, and “make it yours” begins the quiz with exactly them', async ({
  page,
}) => {
  const reader = READERS.find(({ slug }) => slug === 'margin-notes')!
  await page.goto('/for/margin-notes')
  const answers = page.getByRole('region', { name: 'The answers behind it' })
  await expect(answers).toContainText('8 h Office or study desk'.replace(' ', '\u202f'))
  await expect(answers).toContainText('must take a pen')
  await page.getByRole('link', { name: 'Make it yours' }).click()
  await expect(page).toHaveURL(new RegExp(`/quiz\\?${yoursHref(reader).split('?')[1]!.replaceAll('.', '\\.')}$`))
  await expect(page.getByRole('heading', { level: 1 })).toContainText('What do you read')
})

test('readers whose eyes want more light are told that this is not medical advice', async ({ page }) => {
  await page.goto('/for/more-light')
  await expect(page.getByRole('region', { name: 'What to weigh' })).toContainText('not medical advice')
})

test('the glossary leads by its letters to a word, its source and its use', async ({ page }) => {
  await page.goto('/glossary')
  await page.getByRole('link', { name: 'Words with C', exact: true }).click()
  await expect(page.getByRole('heading', { level: 2, name: 'C', exact: true })).toBeInViewport()
  const entry = page.locator('#contrast-reserve')
  await expect(entry).toContainText('Rea & Ouellette 1991')
  await entry.getByRole('link', { name: 'contrast reserve' }).click()
  await expect(page).toHaveURL(/\/method#q-reserve$/)
  await page.goto('/glossary')
  const set = await structured(page, 'DefinedTermSet')
  expect(set.hasDefinedTerm.length).toBe(await page.locator('dt').count())
})

test('the about page counts the units and says how to dispute a figure and what is stored', async ({ page }) => {
  await page.goto('/about')
  await expect(page.getByRole('region', { name: 'Units bought and lent' })).toContainText(
    'Of the 34 units ever on our bench, we bought 30 and were lent 4',
  )
  await expect(page.getByRole('region', { name: 'Who we are' })).toContainText('invented')
  const disputes = page.getByRole('region', { name: 'Disputing a figure' })
  await expect(disputes.getByRole('link', { name: 'corrections@lampleaf.example' })).toHaveAttribute(
    'href',
    'mailto:corrections@lampleaf.example',
  )
  await expect(page.getByRole('region', { name: 'Privacy' })).toContainText('look keeps that choice for a year')
  for (const name of ['of Petrona', 'of Atkinson Hyperlegible Next']) {
    const href = await page.getByRole('link', { name }).getAttribute('href')
    expect((await page.request.get(href!)).status()).toBe(200)
  }
})

test('what the about page says of cookies is so: none comes before a choice, one with it', async ({
  page,
  context,
}) => {
  for (const path of ['/about', '/for/dim-bedroom', '/quiz?novels=3']) await page.goto(path)
  expect(await context.cookies()).toEqual([])
  await page.getByRole('button', { name: 'Night' }).click()
  await expect.poll(async () => (await context.cookies()).map(({ name }) => name)).toEqual(['look'])
})

/** The lightness of a device’s page in an edition, as printed. */
async function printed(page: Page, edition: number, slug: string): Promise<string> {
  const { devices } = (await (await page.request.get(`/api/v1/editions/${edition}`)).json()) as Edition
  return devices.find((device) => device.slug === slug)!.page.L.toFixed(1)
}

test('a correction gives old and new figures, the edition that put it right, who raised it and the replies', async ({
  page,
}) => {
  await page.goto('/corrections')
  const entry = page.getByRole('article').filter({ hasText: 'Tamber Reed 7' })
  await expect(entry).toContainText('put right in edition 2')
  await expect(entry).toContainText(/Raised by\s*an owner, 29 April 2026/)
  await expect(entry.locator('blockquote')).toHaveCount(2)
  const row = entry.getByRole('row').filter({ hasText: 'Lightness of the page' })
  await expect(row.getByRole('cell').nth(0)).toHaveText(await printed(page, 1, 'tamber-reed-7'))
  await expect(row.getByRole('cell').nth(1)).toHaveText(await printed(page, 2, 'tamber-reed-7'))
  await expect(row.getByRole('cell').nth(3)).toHaveText('yes')
  await entry.getByRole('link', { name: 'edition 1' }).click()
  await expect(page.getByText('Wrong in this edition: lightness')).toBeVisible()
  await page.getByRole('link', { name: 'The correction of Tamber Reed 7' }).click()
  await expect(page).toHaveURL(/\/corrections#correction-\d+$/)
})

test('the editions are listed newest first, with their seals', async ({ page }) => {
  await page.goto('/editions')
  await expect(page.getByRole('heading', { level: 2 }).filter({ hasText: 'Edition' })).toHaveText([
    'Edition 3',
    'Edition 2',
    'Edition 1',
  ])
  for (const number of [1, 2, 3]) {
    const { sha256 } = (await (await page.request.get(`/api/v1/editions/${number}`)).json()) as Edition
    await expect(page.getByText(`Seal ${sha256}`)).toBeVisible()
  }
  await page.getByRole('link', { name: 'What changed in edition 2' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Edition 2' })).toBeVisible()
})

test('the second edition says what it added, corrected and changed, and who moved and why', async ({ page }) => {
  await page.goto('/editions/2')
  await expect(page.getByRole('region', { name: 'Added' }).getByRole('link')).toHaveText([
    'Corrin Octavo 8',
    'Haldon Copybook 10 Colour',
    'Wexby Vesper 8',
  ])
  await expect(page.getByRole('region', { name: 'Corrected' })).toContainText('too light and too yellow')
  await expect(page.getByRole('region', { name: 'Changed' })).toContainText(/Revision measured: A\s*→.*B/)
  await expect(page.getByRole('region', { name: 'Withdrawn' })).toContainText('No device was taken out')
  const moved = page.getByRole('region', { name: 'Who moved, and why' })
  const reed = moved.getByRole('row').filter({ has: page.getByRole('link', { name: 'Tamber Reed 7', exact: true }) })
  await expect(reed).toContainText('1st (1–2)')
  await expect(reed).toContainText('2nd (1–2)')
  await expect(reed).toContainText('Its figures were corrected.')
  await expect(moved.getByRole('row').filter({ hasText: 'not in it' })).toHaveCount(3)
})

test('an edition shows its seal as the document has it, says that it fits, and can be cited', async ({ page }) => {
  await page.goto('/editions/3')
  const { sha256 } = (await (await page.request.get('/api/v1/editions/3')).json()) as Edition
  const seal = page.getByRole('region', { name: 'Seal', exact: true })
  await expect(seal).toContainText(sha256)
  await expect(seal).toContainText('it is the same')
  const cite = page.getByRole('region', { name: 'Cite and use it' })
  await expect(cite).toContainText('Edition 3, released 20 November 2026')
  await cite.getByText('As BibTeX').click()
  await expect(cite.getByRole('region', { name: 'Citation as BibTeX' })).toContainText('@misc{')
})

test('the first edition has nothing to be compared with, and says that it is not the newest', async ({ page }) => {
  await page.goto('/editions/1')
  await expect(page.getByRole('region', { name: 'Added' }).getByRole('listitem')).toHaveCount(11)
  await expect(page.getByRole('region', { name: 'Who moved, and why' })).toHaveCount(0)
  await page.getByRole('main').getByRole('link', { name: 'Edition 3' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Edition 3' })).toBeVisible()
})

const NOWHERE = [
  '/for/nobody',
  '/for/__proto__',
  '/editions/0',
  '/editions/01',
  '/editions/4',
  '/editions/x',
  '/editions/1e3',
  '/editions/%00',
  '/editions/99999999999999999999',
  '/editions/pages/1',
  '/editions/pages/2',
  '/editions/2/moved/2',
  '/editions/2/changed/x',
  '/corrections/pages/1',
  '/corrections/pages/2',
  '/corrections/pages/999999999',
]
for (const path of NOWHERE) {
  test(`there is nothing at ${path}`, async ({ page }) => {
    expect((await page.goto(path))?.status()).toBe(404)
  })
}

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('a reader goes from a typical reader to the whole result', async ({ page }) => {
    await page.goto('/for')
    await page.getByRole('link', { name: 'Office papers' }).click()
    await expect(page.getByRole('table', { name: 'Points of each device' })).toBeVisible()
    await page.getByRole('link', { name: 'The whole result' }).click()
    await expect(page).toHaveURL(/\/quiz\/result\?.*desk=12/)
    await expect(page.getByRole('heading', { level: 2, name: 'Where the points come from' })).toBeVisible()
  })

  test('the changelog of an edition is all there, its folded parts too', async ({ page }) => {
    await page.goto('/editions/3')
    await page.getByText('Figures of Quayle Margin 10 before and after').click()
    await expect(page.getByRole('table', { name: 'Figures of Quayle Margin 10' })).toBeVisible()
    await page.getByRole('link', { name: 'The edition before, 2' }).click()
    await expect(page.getByRole('region', { name: 'Corrected' })).toContainText('Tamber Reed 7')
  })
})

test('at 320 pixels nothing scrolls sideways', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 700 })
  for (const path of ROOMS) {
    await page.goto(path)
    const sideways = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    )
    expect(sideways, path).toBe(0)
  }
})

test('before the first release each room says kindly that there is nothing yet', async ({ page }) => {
  const empty = fromAddress('EMPTY_URL')
  for (const [path, words] of [
    ['/for', 'No edition has been released yet'],
    ['/for/dim-bedroom', 'No edition has been released yet'],
    ['/corrections', 'No figure has been corrected so far'],
    ['/editions', 'No edition has been released yet'],
    ['/about', 'No unit has been on the bench yet'],
    ['/glossary', 'words, as this guide means them'],
  ]) {
    expect((await page.goto(`${empty}${path}`))?.status(), path).toBe(200)
    await expect(page.getByText(words!)).toBeVisible()
  }
  await page.goto(`${empty}/for/dim-bedroom`)
  await expect(page.getByRole('region', { name: 'The answers behind it' })).toContainText('novels')
  expect((await page.goto(`${empty}/editions/1`))?.status()).toBe(404)
})

for (const path of ROOMS) {
  test(`${path} is accessible in every theme`, async ({ page }) => {
    await expectAccessible(page, path)
  })
}
