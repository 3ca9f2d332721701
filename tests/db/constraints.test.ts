import { sql } from 'drizzle-orm'
import { afterAll, describe, expect, test } from 'vitest'
import type { Db } from '@/db/client'
import {
  calibrations,
  controlReadings,
  corrections,
  frontLightMeasurements,
  makers,
  prices,
  readings,
  type sessions,
  sets,
  specs,
} from '@/db/schema'
import { connectToTests, refusalOf, rollingBack } from '@/tests/fixtures/db'
import { insertControl, insertDevice, insertInstrument, insertSession, insertSet } from '@/tests/fixtures/db-rows'

const { db, close } = connectToTests()
afterAll(close)

type Bench = Awaited<ReturnType<typeof layBench>>

async function layBench(tx: Db) {
  const device = await insertDevice(tx, 'example-6')
  const instrumentId = await insertInstrument(tx)
  const sessionId = await insertSession(tx, instrumentId, '2026-02-03')
  const controlSampleId = await insertControl(tx, 'tile', 'EX-TILE', [{ sessionId, colours: [{ L: 95, a: 0, b: 0 }] }])
  const { setId } = await insertSet(tx, { sessionId, unitId: device.unitId, state: 'page' }, [70])
  return { ...device, instrumentId, sessionId, controlSampleId, setId }
}

/** Each row is fit but for one thing, and the constraint named is the one that refuses it. */
function refused(rows: [name: string, what: string, insert: (tx: Db, bench: Bench) => PromiseLike<unknown>][]) {
  test.each(rows)('%s refuses %s', async (name, _, insert) => {
    await rollingBack(db, async (tx) => {
      const bench = await layBench(tx)
      expect(await refusalOf(tx, (inner) => insert(inner, bench))).toBe(name)
    })
  })
}

const SPECTRUM = Array.from({ length: 31 }, () => 0.4)

describe('readings', () => {
  const reading =
    (fields: Partial<typeof readings.$inferInsert>) =>
    (tx: Db, { setId }: Bench) =>
      tx.insert(readings).values({ setId, ordinal: 2, lStar: 70, aStar: -1, bStar: 2, ...fields })

  test('a fit one is kept', async () => {
    await rollingBack(db, async (tx) => {
      await reading({ spectrum: SPECTRUM, instrumentWhiteness: 28.4 })(tx, await layBench(tx))
    })
  })

  refused([
    ['readings_lab_range', 'a lightness that is no number', reading({ lStar: Number.NaN })],
    ['readings_lab_range', 'a boundless b*', reading({ bStar: Number.POSITIVE_INFINITY })],
    ['readings_lab_range', 'a lightness above white', reading({ lStar: 100.01 })],
    ['readings_lab_range', 'a lightness below black', reading({ lStar: -0.01 })],
    ['readings_lab_range', 'an a* no page has', reading({ aStar: -61 })],
    [
      'readings_instrument_whiteness_range',
      'a whiteness that is no number',
      reading({ instrumentWhiteness: Number.NaN }),
    ],
    ['readings_spectrum_form', 'thirty values', reading({ spectrum: SPECTRUM.slice(1) })],
    ['readings_spectrum_form', 'percent in place of fractions', reading({ spectrum: SPECTRUM.map((x) => x * 100) })],
    ['readings_spectrum_form', 'a value below 0', reading({ spectrum: SPECTRUM.with(7, -0.01) })],
    ['readings_spectrum_form', 'a value that is no number', reading({ spectrum: SPECTRUM.with(7, Number.NaN) })],
    [
      'readings_spectrum_form',
      'a missing value',
      (tx, { setId }) =>
        tx.execute(
          sql`insert into readings (set_id, ordinal, l_star, a_star, b_star, spectrum)
              values (${setId}, 2, 70, -1, 2, array_fill(0.4::real, array[30]) || null::real)`,
        ),
    ],
    ['readings_flag_with_reason', 'one left out without a reason', reading({ flag: 'left-out' })],
    ['readings_flag_reason_said', 'a blank reason', reading({ flag: 'flagged', flagReason: ' ' })],
    ['readings_set_id_ordinal_key', 'two of one place in the set', reading({ ordinal: 1 })],
    ['readings_set_id_sets_id_fk', 'one of no set', reading({ setId: 0 })],
  ])
})

describe('readings of controls', () => {
  const reading =
    (fields: Partial<typeof controlReadings.$inferInsert>) =>
    (tx: Db, { controlSampleId, sessionId }: Bench) =>
      tx
        .insert(controlReadings)
        .values({ controlSampleId, sessionId, moment: 'end', ordinal: 1, lStar: 95, aStar: 0, bStar: 0, ...fields })

  refused([
    ['control_readings_lab_range', 'a lightness that is no number', reading({ lStar: Number.NaN })],
    ['control_readings_order_key', 'two of one place', reading({ moment: 'start' })],
    ['control_readings_session_id_sessions_id_fk', 'one of no session', reading({ sessionId: 0 })],
  ])
})

describe('sets', () => {
  const set =
    (fields: Partial<typeof sets.$inferInsert>) =>
    (tx: Db, { sessionId, unitId }: Bench) =>
      tx.insert(sets).values({
        sessionId,
        unitId,
        position: 'upper-outer',
        state: 'page',
        specular: 'included',
        lightOff: true,
        shown: 'test page',
        ...fields,
      })

  test('the same place with the specular part excluded is a set beside it', async () => {
    await rollingBack(db, async (tx) => {
      await set({ position: 'centre', specular: 'excluded' })(tx, await layBench(tx))
    })
  })

  refused([
    ['sets_place_key', 'a place read already in that session', set({ position: 'centre' })],
    ['sets_withdrawn_with_reason', 'one withdrawn without a reason', set({ withdrawnAt: new Date() })],
    ['sets_withdrawn_with_reason', 'a reason without a day', set({ withdrawnReason: 'light on' })],
    ['sets_withdrawn_reason_said', 'a blank reason', set({ withdrawnAt: new Date(), withdrawnReason: '' })],
    ['sets_position_said', 'no position', set({ position: ' ' })],
    ['sets_unit_id_units_id_fk', 'one of no unit', set({ unitId: 0 })],
  ])
})

describe('sessions', () => {
  const session =
    (fields: Partial<typeof sessions.$inferInsert>) =>
    (tx: Db, { instrumentId }: Bench) =>
      insertSession(tx, instrumentId, '2026-02-04', fields)

  refused([
    ['sessions_ends_after_start', 'an end before its start', session({ endedAt: new Date('2026-02-04T08:00:00Z') })],
    ['sessions_temperature_celsius_range', 'kelvin', session({ temperatureCelsius: 296 })],
    [
      'sessions_temperature_celsius_range',
      'a temperature that is no number',
      session({ temperatureCelsius: Number.NaN }),
    ],
    ['sessions_aperture_mm_range', 'no aperture', session({ apertureMm: 0 })],
    ['sessions_name_key', 'a name taken already', session({ name: '2026-02-03-a' })],
  ])
})

describe('specs', () => {
  const spec =
    (fields: Partial<typeof specs.$inferInsert>) =>
    (tx: Db, { revisionId }: Bench) =>
      tx.insert(specs).values({
        revisionId,
        field: 'pen',
        stated: 'yes',
        source: 'data sheet',
        statedOn: '2026-02-01',
        ...fields,
      })

  refused([
    ['specs_field_known', 'an unknown field', spec({ field: 'taste' as 'pen' })],
    ['specs_value_where_number', 'a number for a yes or no', spec({ value: 7 })],
    ['specs_value_where_number', 'a stated weight without the weight', spec({ field: 'weight' })],
    [
      'specs_value_where_number',
      'a weight that is not stated, with one',
      spec({ field: 'weight', stated: 'not-stated', value: 200 }),
    ],
    ['specs_list_where_formats', 'stated formats without any', spec({ field: 'formats' })],
    ['specs_list_filled', 'an empty list of formats', spec({ field: 'formats', list: [] })],
    ['specs_water_digit', 'a water code between two digits', spec({ field: 'water', value: 7.5 })],
    ['specs_weight_range', 'a weight in kilograms', spec({ field: 'weight', value: 0.2 })],
    ['specs_weight_range', 'a weight that is no number', spec({ field: 'weight', value: Number.NaN })],
    ['specs_diagonal_range', 'a diagonal in millimetres', spec({ field: 'diagonal', value: 178 })],
    ['specs_ppi_range', 'no resolution at all', spec({ field: 'ppi', value: 0 })],
    ['specs_source_said', 'a blank source', spec({ source: '' })],
    [
      'specs_statement_key',
      'two statements of a field on a day',
      async (tx, bench) => {
        await spec({})(tx, bench)
        await spec({ stated: 'no' })(tx, bench)
      },
    ],
  ])
})

describe('prices, front lights, calibrations, corrections, makers', () => {
  const price =
    (fields: Partial<typeof prices.$inferInsert>) =>
    (tx: Db, { deviceId }: Bench) =>
      tx
        .insert(prices)
        .values({ deviceId, amountMinor: 9900, currency: 'GBP', seenOn: '2026-02-01', seller: 'a shop', ...fields })
  const light =
    (fields: Partial<typeof frontLightMeasurements.$inferInsert>) =>
    (tx: Db, { unitId }: Bench) =>
      tx.insert(frontLightMeasurements).values({
        unitId,
        measuredOn: '2026-02-01',
        maxCdM2: 90,
        minCdM2: 0.5,
        evennessPercent: 80,
        coolestKelvin: 6500,
        warmestKelvin: 2700,
        ...fields,
      })
  const edition = sql`insert into editions (number, published_at, method, title, note, sha256, document, components) values (1, '2026-03-01T00:00:00Z', 1, 'E', 'n', repeat('a', 64), jsonb_build_object('number', 1, 'method', 1, 'sha256', repeat('a', 64), 'publishedAt', '2026-03-01T00:00:00Z', 'devices', '[]'::jsonb), '{}')`

  refused([
    ['prices_amount_minor_range', 'a price of nothing', price({ amountMinor: 0 })],
    ['prices_currency_form', 'a currency by its sign', price({ currency: '£' })],
    ['front_light_cd_m2_range', 'a lowest setting above the highest', light({ minCdM2: 91 })],
    ['front_light_cd_m2_range', 'a luminance that is no number', light({ maxCdM2: Number.NaN })],
    ['front_light_evenness_percent_range', 'more than even', light({ evennessPercent: 101 })],
    ['front_light_kelvin_range', 'a warmest setting colder than the coolest', light({ warmestKelvin: 7000 })],
    [
      'calibrations_white_names_its_tile',
      'a white calibration without its tile',
      (tx, { instrumentId }) => tx.insert(calibrations).values({ instrumentId, kind: 'white', at: new Date() }),
    ],
    [
      'corrections_put_right_later',
      'an edition put right by itself',
      async (tx, { deviceId }) => {
        await tx.execute(edition)
        await tx
          .insert(corrections)
          .values({ deviceId, notedOn: '2026-03-02', figure: 'page', note: 'wrong', wrongIn: 1, rightIn: 1 })
      },
    ],
    [
      'makers_slug_form',
      'an address with a space',
      (tx) => tx.insert(makers).values({ slug: 'two words', name: 'Two Words' }),
    ],
  ])
})
