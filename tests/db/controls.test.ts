import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { listBenchEvents, listControlSeries } from '@/db/queries/controls'
import { findExampleSets, listCountedSets } from '@/db/queries/edition-sets'
import { findComponents, findEdition } from '@/db/queries/editions'
import { calibrations } from '@/db/schema'
import { mean } from '@/lib/stats/describe'
import { countsOf, degreesOf } from '@/lib/workings/counts'
import { deviceBudget } from '@/lib/workings/device-budget'
import { connectToTests, createSeededDatabase, rollingBack } from '@/tests/fixtures/db'
import { insertControl, insertInstrument, insertSession } from '@/tests/fixtures/db-rows'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
})
afterAll(() => seeded.drop())

const FAR = new Date('2030-01-01T00:00:00Z')

describe('control series', () => {
  test('every control comes with all its sessions, oldest first, and every reading of them', async () => {
    const series = await listControlSeries(seeded.db, FAR)
    expect(series.map(({ kind }) => kind)).toEqual(['tile', 'chart-white', 'paper'])
    const [counted] = await seeded.db.execute<{ sessions: number; readings: number }>(
      sql`select count(distinct session_id)::int as sessions, count(*)::int as readings from control_readings`,
    )
    for (const { sessions } of series) {
      expect(sessions).toHaveLength(counted!.sessions)
      const days = sessions.map(({ startedAt }) => startedAt.getTime())
      expect(days).toEqual([...days].sort((one, other) => one - other))
      for (const { readings } of sessions) {
        expect(readings.map(({ moment }) => moment)).toEqual(['start', 'start', 'start', 'end', 'end', 'end'])
      }
    }
    const all = series.flatMap(({ sessions }) => sessions.flatMap(({ readings }) => readings))
    expect(all).toHaveLength(counted!.readings)
  })

  // Means worked again in SQL.
  test('the means of a control are those of its rows', async () => {
    const [tile] = await listControlSeries(seeded.db, FAR)
    const rows = await seeded.db.execute<{ name: string; mean: number }>(
      sql`select sessions.name, avg(l_star)::float8 as mean from control_readings
          join sessions on sessions.id = session_id join control_samples on control_samples.id = control_sample_id
          where serial = ${tile!.serial} group by sessions.name`,
    )
    for (const { name, mean: expected } of rows) {
      const session = tile!.sessions.find((one) => one.name === name)!
      expect(mean(session.readings.map(({ L }) => L))).toBeCloseTo(expected, 9)
    }
  })

  test('only sessions that were over by the moment count', async () => {
    const until = new Date('2026-01-01T00:00:00Z')
    const series = await listControlSeries(seeded.db, until)
    const started = series.flatMap(({ sessions }) => sessions.map(({ startedAt }) => startedAt))
    expect(started.length).toBeGreaterThan(0)
    for (const at of started) expect(at.getTime()).toBeLessThan(until.getTime())
    expect(await listControlSeries(seeded.db, new Date('2020-01-01T00:00:00Z'))).toEqual([])
  })

  test('a session with other settings is left out, and a new tile is a series of its own', async () => {
    const { db, close } = connectToTests()
    await rollingBack(db, async (tx) => {
      const instrument = await insertInstrument(tx)
      const usual = await insertSession(tx, instrument, '2026-02-01')
      const other = await insertSession(tx, instrument, '2026-02-08', { specular: 'excluded' })
      const colours = [{ L: 95, a: 0, b: 0 }]
      await insertControl(tx, 'tile', 'T-1', [
        { sessionId: usual, colours },
        { sessionId: other, colours },
      ])
      await insertControl(tx, 'tile', 'T-2', [{ sessionId: usual, colours }])
      const series = await listControlSeries(tx, FAR)
      expect(series.map(({ serial, sessions }) => [serial, sessions.map(({ name }) => name)])).toEqual([
        ['T-1', ['2026-02-01-a']],
        ['T-2', ['2026-02-01-a']],
      ])
    })
    await close()
  })
})

test('services and notes are told in order of time, up to the moment', async () => {
  const { db, close } = connectToTests()
  await rollingBack(db, async (tx) => {
    const instrument = await insertInstrument(tx, { servicedOn: '2026-03-01' })
    await insertSession(tx, instrument, '2026-02-01', { note: 'Lamp warmed up slowly.' })
    await tx.insert(calibrations).values([
      {
        instrumentId: instrument,
        kind: 'white',
        at: new Date('2026-03-02T09:00:00Z'),
        tileSerial: 'T',
        note: 'Set anew.',
      },
      { instrumentId: instrument, kind: 'zero', at: new Date('2026-03-02T08:50:00Z') },
    ])
    expect(await listBenchEvents(tx, FAR)).toEqual([
      { on: '2026-02-01', instrument: 'Example sphere', what: 'Session 2026-02-01-a: Lamp warmed up slowly.' },
      { on: '2026-03-01', instrument: 'Example sphere', what: 'Serviced.' },
      { on: '2026-03-02', instrument: 'Example sphere', what: 'Set anew.' },
    ])
    expect(await listBenchEvents(tx, new Date('2026-02-15T00:00:00Z'))).toHaveLength(1)
  })
  await close()
})

describe('what the worked example and the budget rest on', () => {
  test('the sets of an edition are those of its entries, with the readings that count', async () => {
    const sets = await listCountedSets(seeded.db, 3)
    const [counted] = await seeded.db.execute<{ sets: number; readings: number }>(
      sql`select count(distinct sets.id)::int as sets, count(*)::int as readings from edition_entries
          join sets on sets.id = any(set_ids) join readings on readings.set_id = sets.id
          where edition = 3 and flag <> 'left-out'`,
    )
    expect(sets).toHaveLength(counted!.sets)
    expect(sets.reduce((sum, { readings }) => sum + readings, 0)).toBe(counted!.readings)
    expect(await listCountedSets(seeded.db, 99)).toEqual([])
  })

  // The published doubt against the budget that explains it: they differ by the rounding of the document alone.
  test('every device’s budget adds up to the doubt its edition prints', async () => {
    const edition = (await findEdition(seeded.db, 3))!
    const components = (await findComponents(seeded.db, 3))!
    const sets = await listCountedSets(seeded.db, 3)
    const degrees = degreesOf(sets, 'page', [22])
    for (const device of edition.devices) {
      const counts = countsOf(sets, device.slug)
      const { parts } = deviceBudget(device, edition.uncertainty, { components, degrees }, counts)
      for (const state of ['page', 'ink'] as const) {
        const own = Math.hypot(...parts.filter(({ shared }) => !shared).map(({ u }) => u[state].L))
        expect(Math.abs(own - device[state].u.L), `${device.slug} ${state}`).toBeLessThan(0.000051)
      }
    }
    expect(edition.devices.length).toBeGreaterThan(10)
  })

  test('an example starts from a page and an ink of one place in one session', async () => {
    const example = (await findExampleSets(seeded.db, 3, 'ostler-plain-7'))!
    expect(example.page.length).toBeGreaterThanOrEqual(5)
    expect(example.ink.length).toBeGreaterThanOrEqual(5)
    const [row] = await seeded.db.execute<{ both: number }>(
      sql`select count(distinct state)::int as both from sets join sessions on sessions.id = session_id
          join units on units.id = unit_id
          where sessions.name = ${example.session} and serial = ${example.unit} and position = ${example.position}`,
    )
    expect(row!.both).toBe(2)
    expect(mean(example.page.map(({ L }) => L))).toBeGreaterThan(mean(example.ink.map(({ L }) => L)))
    expect(await findExampleSets(seeded.db, 3, 'no-such-device')).toBeNull()
    expect(await findExampleSets(seeded.db, 99, 'ostler-plain-7')).toBeNull()
  })
})
