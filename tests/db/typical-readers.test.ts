import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { findLatestEdition } from '@/db/queries/editions'
import { match } from '@/lib/method/ranking'
import { AIMS, type Edition, type EditionDevice } from '@/lib/method/types'
import { picksOf } from '@/lib/readers/picks'
import { questionOf } from '@/lib/readers/reader'
import { findReader, READERS } from '@/lib/readers/readers'
import { createSeededDatabase } from '@/tests/fixtures/db'
import { workOut } from '@/tests/fixtures/second-route'

let edition: Edition
let drop: () => Promise<void>
beforeAll(async () => {
  const seeded = await createSeededDatabase()
  drop = seeded.drop
  edition = (await findLatestEdition(seeded.db))!
})
afterAll(() => drop())

// Method 1 worked a second time from its text: tests/fixtures/second-route.ts. Limits are the caller's there.
describe.each<{ slug: string; left: (device: EditionDevice) => boolean }>([
  { slug: 'dim-bedroom', left: () => true },
  { slug: 'margin-notes', left: ({ pen, price }) => pen !== false && (price === null || price.amount <= 40_000) },
  { slug: 'colour-comics', left: ({ colour }) => colour !== false },
])('the picks for “$slug”', ({ slug, left }) => {
  test('are those that Method 1 gives by another route', () => {
    const { answers } = questionOf(findReader(slug)!)
    const own = match(edition, answers, { draws: 200 })
    const { rows, weights } = workOut(edition.devices.filter(left), answers)
    expect(own.ranked.map((row) => row.slug)).toEqual(rows.map((row) => row.slug))
    for (const [i, row] of own.ranked.entries()) expect(row.fit, row.slug).toBeCloseTo(rows[i]!.fit, 6)
    for (const aim of AIMS) expect(own.weights[aim]).toBeCloseTo(weights[aim], 9)
  })
})

test('different readers get different answers: of eight no device comes first for more than three', () => {
  const firsts = READERS.map((reader) => picksOf(match(edition, questionOf(reader).answers).ranked).readable[0]!.slug)
  const counts = firsts.map((slug) => firsts.filter((other) => other === slug).length)
  expect(new Set(firsts).size).toBeGreaterThanOrEqual(4)
  expect(Math.max(...counts)).toBeLessThanOrEqual(3)
})

test.each(READERS)('“$name” has picks on the demo’s newest edition, within the reader’s own limits', (reader) => {
  const { answers } = questionOf(reader)
  const { ranked, excluded } = match(edition, answers, { draws: 200 })
  const { readable, shown } = picksOf(ranked)
  expect(readable.length).toBeGreaterThanOrEqual(3)
  expect(shown.flat().length).toBeGreaterThanOrEqual(3)
  expect(ranked.length + excluded.length).toBe(edition.devices.length)
})

// The editor's words lean on these; a demo in which they were not so would make them untrue.
test('a colour page is darker than one without a filter, and a tint counts for more outdoors than in bed', () => {
  const lightness = (colour: boolean) =>
    edition.devices.filter((one) => one.colour === colour).map(({ page }) => page.L)
  expect(Math.max(...lightness(true))).toBeLessThan(Math.min(...lightness(false)))
  const weightOf = (slug: string, aim: 'tint' | 'clarity') =>
    match(edition, questionOf(findReader(slug)!).answers, { draws: 100 }).weights[aim]
  expect(weightOf('balcony-and-garden', 'tint')).toBeGreaterThan(weightOf('dim-bedroom', 'tint'))
  expect(weightOf('balcony-and-garden', 'clarity')).toBeLessThan(0.03)
})
