import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { cutEdition } from '@/db/editions/cut-edition'
import {
  findComponents,
  findEdition,
  findLatestEdition,
  findLatestEditionNumber,
  listEditions,
} from '@/db/queries/editions'
import { editionSchema } from '@/lib/contract/edition'
import type { Edition, Lab } from '@/lib/method/types'
import { connectToTests, createSeededDatabase } from '@/tests/fixtures/db'
import { type PlainReading, plainComponents } from '@/tests/fixtures/db-plain-components'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
let editions: Edition[]
beforeAll(async () => {
  seeded = await createSeededDatabase(4)
  editions = await Promise.all([1, 2, 3].map(async (number) => (await findEdition(seeded.db, number))!))
})
afterAll(() => seeded.drop())

const all = <Row extends Record<string, unknown>>(query: string) => seeded.db.execute<Row>(sql.raw(query))

test('each is the document the contract describes, and the newest is the latest', async () => {
  for (const edition of editions) expect(() => editionSchema.parse(edition)).not.toThrow()
  expect(editions.map((edition) => edition.devices.length)).toEqual([11, 14, 16])
  expect(await findLatestEditionNumber(seeded.db)).toBe(3)
  expect(await findLatestEdition(seeded.db)).toEqual(editions[2])
  expect(await findEdition(seeded.db, 4)).toBeNull()
  const rows = await listEditions(seeded.db)
  expect(rows.map((row) => row.number)).toEqual([3, 2, 1])
  for (const row of rows) {
    const { publishedAt, sha256 } = editions[row.number - 1]!
    expect({ publishedAt: row.publishedAt.toISOString(), sha256: row.sha256 }).toEqual({ publishedAt, sha256 })
  }
})

test('where nothing is released there is nothing to find', async () => {
  const { db, close } = connectToTests()
  expect(await findLatestEditionNumber(db)).toBeNull()
  expect(await findLatestEdition(db)).toBeNull()
  expect(await findComponents(db, 1)).toBeNull()
  expect(await listEditions(db)).toEqual([])
  await close()
})

// RFC 8785 by the canonicalize package, SHA-256 by Node.
test('the fingerprint is that of the stored document', async () => {
  const rows = await all<{ sha256: string; document: Edition }>('select sha256, document from editions')
  expect(rows).toHaveLength(3)
  for (const row of rows) {
    const { sha256, ...rest } = row.document
    const own = createHash('sha256').update(canonicalize(rest)!, 'utf8').digest('hex')
    expect([own, own]).toEqual([sha256, row.sha256])
  }
})

describe('figures worked again from the readings', () => {
  const CHANNELS = [
    ['L', 'l_star'],
    ['a', 'a_star'],
    ['b', 'b_star'],
  ] as const

  type Row = { slug: string; unit: string; set: number; session: string; state: 'page' | 'ink' } & Lab
  const countingRows = (edition: number) =>
    all<Row>(
      `select slug, serial as unit, sets.id as set, sessions.name as session, state,
              l_star as "L", a_star as a, b_star as b
       from edition_entries join sets on sets.id = any(set_ids) join sessions on sessions.id = session_id
       join units on units.id = unit_id join readings on readings.set_id = sets.id
       where edition = ${edition} and flag <> 'left-out'`,
    )

  // Method 1, section 1, in SQL: a unit's figure the mean of its set means, a device's the mean of its units'.
  test.each([1, 2, 3])('page and ink of edition %i are means of means', async (number) => {
    const { devices } = editions[number - 1]!
    for (const [channel, column] of CHANNELS) {
      const rows = await all<{ slug: string; state: 'page' | 'ink'; figure: number }>(
        `with set_means as (
           select slug, state, unit_id, avg(${column}) as mean
           from edition_entries join sets on sets.id = any(set_ids) join readings on readings.set_id = sets.id
           where edition = ${number} and flag <> 'left-out' group by slug, state, unit_id, sets.id
         ), unit_means as (select slug, state, avg(mean) as mean from set_means group by slug, state, unit_id)
         select slug, state, avg(mean)::float8 as figure from unit_means group by slug, state`,
      )
      expect(rows).toHaveLength(2 * devices.length)
      for (const { slug, state, figure } of rows) {
        const device = devices.find((one) => one.slug === slug)!
        expect(Math.abs(device[state][channel] - figure), `${slug} ${state} ${channel}`).toBeLessThan(0.000051)
      }
    }
  })

  test.each([1, 3])(
    'doubts and session shares of edition %i follow from its components of variance',
    async (number) => {
      const rows = await countingRows(number)
      const stored = (await findComponents(seeded.db, number))!
      for (const state of ['page', 'ink'] as const) {
        const own = rows.filter((row) => row.state === state)
        for (const [channel] of CHANNELS) {
          const plain = plainComponents(
            own.map((row): PlainReading => ({ model: row.slug, unit: row.unit, set: row.set, value: row[channel] })),
          )
          for (const part of ['reading', 'position', 'unit'] as const) {
            expect(stored[state][part][channel]).toBeCloseTo(plain[part], 9)
          }
          for (const device of editions[number - 1]!.devices) {
            const mine = own.filter((row) => row.slug === device.slug)
            const [k, m] = [new Set(mine.map((row) => row.unit)).size, new Set(mine.map((row) => row.set)).size]
            const u = Math.sqrt(plain.unit ** 2 / k + plain.position ** 2 / m + plain.reading ** 2 / mine.length)
            expect(Math.abs(device[state].u[channel] - u), `${device.slug} ${state} ${channel}`).toBeLessThan(0.000051)
          }
        }
      }
      for (const { slug, sessions, units, provisional } of editions[number - 1]!.devices) {
        const mine = rows.filter((row) => row.slug === slug)
        const sets = new Map(mine.map((row) => [row.set, row.session]))
        const shares: Record<string, number> = {}
        for (const session of sets.values()) shares[session] = (shares[session] ?? 0) + 1 / sets.size
        expect(Object.keys(sessions).sort()).toEqual(Object.keys(shares).sort())
        for (const [session, share] of Object.entries(shares)) expect(sessions[session]).toBeCloseTo(share, 12)
        const count = new Set(mine.map((row) => row.unit)).size
        expect({ units, provisional }, slug).toEqual({ units: count, provisional: count === 1 })
      }
    },
  )

  // CIE 15 written out; the figures follow from L*a*b* as printed, to three decimals.
  test('whiteness, tint and contrast are those of the colours as printed', () => {
    const cube = (t: number) => (t > 6 / 29 ? t ** 3 : (108 / 841) * (t - 4 / 29))
    const luminance = (L: number) => 100 * cube((L + 16) / 116)
    for (const { page, ink, whiteness, tint, contrast, withinLimits } of editions.flatMap((one) => one.devices)) {
      const X = 94.811 * cube((page.L + 16) / 116 + page.a / 500)
      const Y = luminance(page.L)
      const Z = 107.304 * cube((page.L + 16) / 116 - page.b / 200)
      const [x, y] = [X / (X + Y + Z), Y / (X + Y + Z)]
      expect(Math.abs(whiteness - (Y + 800 * (0.3138 - x) + 1700 * (0.331 - y)))).toBeLessThan(0.00051)
      expect(Math.abs(tint - (900 * (0.3138 - x) - 650 * (0.331 - y)))).toBeLessThan(0.00051)
      expect(Math.abs(contrast - Y / luminance(ink.L))).toBeLessThan(0.00051)
      expect(withinLimits).toBe(false)
    }
  })

  // One-way analysis of variance of the tile's readings by session: (MS between − MS within)/n.
  test.each([1, 2, 3])(
    'the session’s doubt and the control paper of edition %i come from its controls',
    async (number) => {
      const { publishedAt, uncertainty, control } = editions[number - 1]!
      for (const [channel, column] of CHANNELS) {
        const [tile] = await all<{ within: number; between: number; n: number; sessions: number }>(
          `with own as (
           select session_id, ${column}::float8 as value from control_readings
           join control_samples on control_samples.id = control_sample_id join sessions on sessions.id = session_id
           where kind = 'tile' and ended_at <= '${publishedAt}'
         ), by_session as (select count(*) as n, avg(value) as mean, var_samp(value) as variance from own group by session_id)
         select avg(variance)::float8 as within, (avg(n) * var_samp(mean))::float8 as between, avg(n)::float8 as n,
                count(*)::int as sessions from by_session`,
        )
        const session = Math.sqrt((tile!.between - tile!.within) / tile!.n)
        expect(Math.abs(uncertainty.session[channel] - session)).toBeLessThan(0.000051)
        expect(tile!.sessions).toBeGreaterThan(8)
        const [paper] = await all<{ mean: number }>(
          `select avg(mean)::float8 as mean from (
           select avg(${column}) as mean from control_readings
           join control_samples on control_samples.id = control_sample_id join sessions on sessions.id = session_id
           where kind = 'paper' and ended_at <= '${publishedAt}' group by session_id) as sessions`,
        )
        expect(Math.abs(control.paper[channel] - paper!.mean)).toBeLessThan(0.000051)
        const [certificate] = await all<{ u: number }>(
          `select max(certificate_u_${channel.toLowerCase()}) as u from instruments`,
        )
        expect(uncertainty.common[channel]).toBe(certificate!.u)
      }
    },
  )
})

describe('the second edition', () => {
  const reed = (number: number) => editions[number - 1]!.devices.find((one) => one.slug === 'tamber-reed-7')!

  test('corrects a figure of the first: the page read with the front light on is lighter than the device', async () => {
    const [before, after] = [reed(1), reed(2)]
    expect(before.revision).toBe(after.revision)
    expect(before.page.L - after.page.L).toBeGreaterThan(0.5)
    expect(Math.abs(before.page.b - after.page.b)).toBeGreaterThan(0.2)
    expect(Math.abs(before.ink.L - after.ink.L)).toBeLessThan(0.3)
  })

  test('left out exactly the withdrawn sets, which the first rests on, and the correction says so in public', async () => {
    const rows = await all<{ id: number; editions: number[] }>(
      `select sets.id, array_agg(edition order by edition) as editions from sets
       join edition_entries on set_ids @> array[sets.id] where withdrawn_at is not null group by sets.id`,
    )
    expect(rows.length).toBeGreaterThan(0)
    for (const row of rows) expect(row.editions).toEqual([1])
    const [correction] = await all<{ slug: string; wrong_in: number; right_in: number; replies: number }>(
      `select slug, wrong_in, right_in, (select count(*)::int from replies where correction_id = corrections.id) as replies
       from corrections join devices on devices.id = device_id where wrong_in is not null`,
    )
    expect(correction).toMatchObject({ slug: 'tamber-reed-7', wrong_in: 1, right_in: 2 })
    expect(correction!.replies).toBeGreaterThan(0)
  })
})

test('twenty releases at once get the next twenty numbers, each whole, and the old ones keep their bytes', async () => {
  const released = 'select number, sha256, document::text, published_at from editions where number <= 3 order by number'
  const before = await all(released)
  const racing = connectToTests(seeded.url, 20)
  let minute = 0
  // Who was overtaken by a later moment is refused, and asks again with a moment later still.
  const release = async (title: string): Promise<number> => {
    const publishedAt = new Date(Date.UTC(2026, 11, 1, 12, minute++))
    try {
      return (await cutEdition(racing.db, { publishedAt, title, note: 'Nothing new.' })).number
    } catch (error) {
      if ((error as { cause?: { constraint_name?: string } }).cause?.constraint_name !== 'editions_released_in_order') {
        throw error
      }
      return release(title)
    }
  }
  const numbers = await Promise.all(Array.from({ length: 20 }, (_, i) => release(`Racing ${i}`)))
  await racing.close()
  expect(numbers.sort((one, other) => one - other)).toEqual(Array.from({ length: 20 }, (_, i) => i + 4))
  const rows = await all<{ number: number; entries: number }>(
    'select number, (select count(*)::int from edition_entries where edition = number) as entries from editions order by number',
  )
  expect(rows.map((row) => row.number)).toEqual(Array.from({ length: 23 }, (_, i) => i + 1))
  expect(rows.slice(3).every((row) => row.entries === 16)).toBe(true)
  expect(await all(released)).toEqual(before)
})
