import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { findEdition, findLatestEdition } from '@/db/queries/editions'
import { withinDoubt } from '@/lib/findings/difference'
import { match } from '@/lib/method/ranking'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { grubbs } from '@/lib/stats/grubbs'
import { createSeededDatabase } from '@/tests/fixtures/db'

// What the demo must hold so that everything the guide says about doubts, ties and corrections can be seen on it.
// Ranges of colours: planning ranges of the trade, from memory.

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
let edition: Edition
beforeAll(async () => {
  seeded = await createSeededDatabase()
  edition = (await findLatestEdition(seeded.db))!
})
afterAll(() => seeded.drop())

const all = <Row extends Record<string, unknown>>(query: string) => seeded.db.execute<Row>(sql.raw(query))
const device = (slug: string) => edition.devices.find((one) => one.slug === slug)!
const names = (devices: EditionDevice[]) => devices.map((one) => one.name)
const largest = (value: (device: EditionDevice) => number) =>
  [...edition.devices].sort((one, other) => value(other) - value(one))[0]!.slug
const chroma = ({ page }: EditionDevice) => Math.hypot(page.a, page.b)

describe('the devices', () => {
  test('are sixteen of seven makers, eleven monochrome and five with a colour filter', async () => {
    expect(names(edition.devices).sort()).toEqual(
      [
        [
          'Ostler Plain 6',
          'Ostler Plain 7',
          'Tamber Reed 7',
          'Tamber Reed 7 Colour',
          'Wexby Vesper 6',
          'Wexby Vesper 8',
        ],
        ['Quayle Margin 10', 'Quayle Margin 13', 'Corrin Quarto 10 Colour', 'Corrin Octavo 8', 'Haldon Copybook 10'],
        ['Haldon Copybook 10 Colour', 'Pellow Wayside 5', 'Pellow Broadsheet 13 Colour', 'Tamber Almanac 6'],
        ['Corrin Duodecimo 6 Colour'],
      ]
        .flat()
        .sort(),
    )
    expect(new Set(edition.devices.map((one) => one.maker)).size).toBe(7)
    const coloured = edition.devices.filter((one) => one.colour)
    expect(coloured).toHaveLength(5)
    expect(coloured.every((one) => one.name.endsWith('Colour'))).toBe(true)
  })

  test('run from 5.2 to 13.3 inches and from £99 to £599, with and without pen and front light', () => {
    const diagonals = edition.devices.map((one) => one.diagonal!)
    expect([Math.min(...diagonals), Math.max(...diagonals)]).toEqual([5.2, 13.3])
    const prices = edition.devices.flatMap((one) => (one.price ? [one.price.amount] : []))
    expect([Math.min(...prices), Math.max(...prices)]).toEqual([9900, 59900])
    for (const has of [(one: EditionDevice) => one.pen, (one: EditionDevice) => one.frontLight !== false]) {
      const with_ = edition.devices.filter(has).length
      expect(with_).toBeGreaterThan(3)
      expect(with_).toBeLessThan(13)
    }
  })

  test('have plausible pages and inks', () => {
    for (const { slug, page, ink, colour } of edition.devices) {
      const [low, high] = colour ? [54, 63] : [66, 76]
      expect(page.L, slug).toBeGreaterThanOrEqual(low)
      expect(page.L, slug).toBeLessThanOrEqual(high)
      expect(page.a, slug).toBeGreaterThanOrEqual(-3)
      expect(page.a, slug).toBeLessThanOrEqual(0)
      expect(page.b, slug).toBeGreaterThanOrEqual(-2)
      expect(page.b, slug).toBeLessThanOrEqual(5)
      expect(ink.L, slug).toBeGreaterThanOrEqual(18)
      expect(ink.L, slug).toBeLessThanOrEqual(29)
    }
  })

  test('do not agree on one winner: lightest, whitest, least tinted and cheapest are four', () => {
    const winners = [
      largest((one) => one.page.L),
      largest((one) => one.whiteness),
      largest((one) => -chroma(one)),
      largest((one) => -(one.price?.amount ?? Number.POSITIVE_INFINITY)),
    ]
    expect(new Set(winners).size).toBe(4)
  })

  test('the first place of a reader who answers nothing is too close to call', () => {
    const [first, second] = match(edition, DEFAULT_ANSWERS).ranked
    expect(first!.tiedWith).toContain(second!.slug)
    expect(first!.first).toBeLessThan(0.9)
  })

  test('two have pages no lighter or darker than each other within the doubt', () => {
    const [one, other] = [device('tamber-reed-7'), device('corrin-octavo-8')]
    expect(one.page.L).not.toBe(other.page.L)
    expect(withinDoubt(edition, one, other, ({ page }) => page.L)).toBe(true)
  })

  test('one is not sold any more, one has much that is not stated, one stands on a single unit and is less sure', () => {
    expect(device('tamber-almanac-6')).toMatchObject({ onSale: false, price: null })
    expect(device('corrin-duodecimo-6-colour')).toMatchObject({
      weight: null,
      water: null,
      lending: null,
      speech: null,
      formats: null,
    })
    const provisional = edition.devices.filter((one) => one.provisional)
    expect(names(provisional)).toEqual(['Pellow Broadsheet 13 Colour'])
    const others = edition.devices.filter((one) => !one.provisional)
    expect(provisional[0]!.page.u.L).toBeGreaterThan(Math.max(...others.map((one) => one.page.u.L)))
    expect(device('quayle-margin-10').units).toBe(3)
  })

  test('one has two revisions whose pages differ by more than the doubt', async () => {
    const before = (await findEdition(seeded.db, 1))!.devices.find((one) => one.slug === 'ostler-plain-6')!
    const after = device('ostler-plain-6')
    expect([before.revision, after.revision]).toEqual(['A', 'B'])
    const pair = { ...before, slug: 'first-revision' }
    expect(withinDoubt(edition, pair, after, ({ page }) => page.L)).toBe(false)
  })
})

describe('the bench', () => {
  test('kept about fourteen months of sessions with two instruments, one of which keeps spectra', async () => {
    const [row] = await all<{ count: number; days: number }>(
      'select count(*)::int as count, extract(day from max(started_at) - min(started_at))::int as days from sessions',
    )
    expect(row!.count).toBeGreaterThanOrEqual(20)
    expect(row!.count).toBeLessThanOrEqual(28)
    expect(row!.days / 30.44).toBeGreaterThan(12.5)
    expect(row!.days / 30.44).toBeLessThan(15.5)
    expect(await all('select stores_spectra from instruments order by stores_spectra')).toEqual([
      { stores_spectra: false },
      { stores_spectra: true },
    ])
  })

  test('read tile, chart white and paper at the start and the end of every session, calibrated before', async () => {
    const odd = await all(
      `select sessions.name from sessions
       left join control_readings on session_id = sessions.id
       left join control_samples on control_samples.id = control_sample_id
       group by sessions.id having count(distinct (kind, moment)) <> 6`,
    )
    expect(odd).toEqual([])
    const uncalibrated = await all(
      `select name from sessions where (
         select count(distinct kind) from calibrations
         where calibrations.instrument_id = sessions.instrument_id and at between started_at - interval '1 hour' and started_at
       ) <> 2`,
    )
    expect(uncalibrated).toEqual([])
  })

  test('read every device’s page and ink in sets of five readings or more', async () => {
    expect(await all(`select set_id from readings group by set_id having count(*) < 5`)).toEqual([])
    expect(
      await all(
        `select revisions.id from revisions where (
           select count(distinct state) from sets join units on units.id = unit_id where revision_id = revisions.id
         ) <> 2`,
      ),
    ).toEqual([])
    const [row] = await all<{ more: number }>(
      'select count(*)::int as more from (select from readings group by set_id having count(*) >= 6) as sets',
    )
    expect(row!.more).toBeGreaterThan(10)
  })

  test('sees its first instrument drift until the service sets it anew', async () => {
    const tile = await all<{ day: string; slope: number; last: number; first: number }>(
      `select (session >= '2026-05-05')::text as day, regr_slope(l, extract(epoch from started_at) / 86400)::float8 as slope,
              (array_agg(l order by session))[1]::float8 as first, (array_agg(l order by session desc))[1]::float8 as last
       from (
         select sessions.name as session, started_at, avg(l_star) as l from control_readings
         join sessions on sessions.id = session_id join instruments on instruments.id = instrument_id
         join control_samples on control_samples.id = control_sample_id
         where kind = 'tile' and not stores_spectra group by sessions.id
       ) as means group by 1 order by 1`,
    )
    const [before, after] = tile
    // L* a day; the sessions' own scatter alone would give 0.0004 here.
    expect(before!.slope).toBeGreaterThan(0.001)
    expect(after!.first).toBeLessThan(before!.last - 0.05)
  })

  test('left one outlier out and kept another, both flagged by Grubbs’ test and with a reason', async () => {
    const flagged = await all<{ set_id: number; l_star: number; flag: string; flag_reason: string }>(
      `select set_id, l_star, flag, flag_reason from readings where flag <> 'none' order by flag`,
    )
    expect(flagged.map((row) => row.flag).sort()).toEqual(['flagged', 'left-out'])
    for (const { set_id, l_star, flag_reason } of flagged) {
      const set = await all<{ l_star: number }>(`select l_star from readings where set_id = ${set_id} order by ordinal`)
      const found = grubbs(set.map((row) => row.l_star))
      expect(found.isOutlier, flag_reason).toBe(true)
      expect(set[found.index!]!.l_star).toBe(l_star)
    }
  })

  test('bought most units and was lent some, and says of all where from and in what condition', async () => {
    const rows = await all<{ obtained: string; count: number }>(
      `select obtained, count(*)::int as count from units where btrim(obtained_from) <> '' and btrim(condition) <> '' group by obtained order by obtained`,
    )
    expect(rows.map((row) => row.obtained)).toEqual(['bought', 'lent'])
    expect(rows[0]!.count).toBeGreaterThan(rows[1]!.count)
  })
})
