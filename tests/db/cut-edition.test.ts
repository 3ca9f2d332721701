import { afterAll, beforeAll, expect, test } from 'vitest'
import type { Db } from '@/db/client'
import { cutEdition } from '@/db/editions/cut-edition'
import { migrateDatabase } from '@/db/migrate'
import { editionEntries, frontLightMeasurements, prices, readings } from '@/db/schema'
import { connectToTests, createDatabase, rollingBack } from '@/tests/fixtures/db'
import {
  insertControl,
  insertDevice,
  insertInstrument,
  insertRevision,
  insertSession,
  insertSet,
  insertSpec,
  insertUnit,
} from '@/tests/fixtures/db-rows'

// Rules of Method 1, section 1, on rows so few that the figures are seen at a glance.

let database: Awaited<ReturnType<typeof createDatabase>>
let connection: ReturnType<typeof connectToTests>
beforeAll(async () => {
  database = await createDatabase()
  await migrateDatabase(database.url)
  connection = connectToTests(database.url)
})
afterAll(async () => {
  await connection.close()
  await database.drop()
})

const flat = (L: number, a = 0, b = 0) => Array.from({ length: 3 }, () => ({ L, a, b }))
const page = (L: number) => Array.from({ length: 5 }, () => L)
const INK = page(22)
const RELEASED = new Date('2026-03-01T09:00:00Z')
const cut = (tx: Db, publishedAt = RELEASED) => cutEdition(tx, { publishedAt, title: 'Edition', note: 'First.' })

/** Two sessions with tile and paper, and one device with a counting ink and no page yet. */
async function layBench(tx: Db) {
  const instrumentId = await insertInstrument(tx)
  const sessionId = await insertSession(tx, instrumentId, '2026-02-03')
  const laterId = await insertSession(tx, instrumentId, '2026-02-10')
  await insertControl(tx, 'tile', 'EX-TILE', [
    { sessionId, colours: flat(95) },
    { sessionId: laterId, colours: flat(95.2, 0.1) },
  ])
  await insertControl(tx, 'paper', 'EX-PAPER', [{ sessionId, colours: flat(94, 1, -2) }])
  const device = await insertDevice(tx, 'example-6')
  await insertSet(tx, { sessionId, unitId: device.unitId, state: 'ink' }, INK)
  return { ...device, instrumentId, sessionId, laterId }
}

const onBench = (work: (tx: Db, bench: Awaited<ReturnType<typeof layBench>>) => Promise<void>) =>
  rollingBack(connection.db, async (tx) => work(tx, await layBench(tx)))

test('only sets at d/8°, specular included, D65, 10°, light off, in time and not withdrawn make a figure', async () => {
  await onBench(async (tx, { unitId, sessionId, laterId, instrumentId }) => {
    const place = { unitId, sessionId, state: 'page' as const }
    const { setId } = await insertSet(tx, place, page(70))
    const odd = (day: string, fields: Parameters<typeof insertSession>[3]) =>
      insertSession(tx, instrumentId, day, fields)
    await insertSet(tx, { ...place, specular: 'excluded' }, page(60))
    await insertSet(tx, { ...place, position: 'light on', lightOff: false }, page(80))
    await insertSet(tx, { ...place, position: 'four', state: 'page' }, page(80).slice(1))
    await insertSet(
      tx,
      { ...place, position: 'withdrawn', withdrawnAt: new Date('2026-02-20T00:00:00Z'), withdrawnReason: 'a film' },
      page(80),
    )
    await insertSet(tx, { ...place, sessionId: await odd('2026-02-04', { illuminant: 'D50' }) }, page(80))
    await insertSet(tx, { ...place, sessionId: await odd('2026-02-05', { observer: '2' }) }, page(80))
    await insertSet(tx, { ...place, sessionId: await odd('2026-02-06', { geometry: '45/0' }) }, page(80))
    await insertSet(tx, { ...place, sessionId: await odd('2026-02-07', { specular: 'excluded' }) }, page(80))
    await insertSet(tx, { ...place, sessionId: await odd('2026-03-02', {}) }, page(80))
    const later = await insertSet(
      tx,
      {
        ...place,
        sessionId: laterId,
        withdrawnAt: new Date('2026-03-05T00:00:00Z'),
        withdrawnReason: 'found out after the release',
      },
      page(72),
    )
    const [device] = (await cut(tx)).devices
    expect(device!.page).toMatchObject({ L: 71, a: -1, b: 2 })
    expect(device!.sessions).toEqual({ '2026-02-03-a': 2 / 3, '2026-02-10-a': 1 / 3 })
    const [entry] = await tx.select().from(editionEntries)
    expect(entry!.setIds).toEqual(expect.arrayContaining([setId, later.setId]))
    expect(entry!.setIds).toHaveLength(3)
  })
})

test('a reading left out does not count, a flagged one does, and a set must keep five', async () => {
  await onBench(async (tx, { unitId, sessionId }) => {
    const place = { unitId, sessionId, state: 'page' as const }
    const { setId } = await insertSet(tx, place, page(70))
    const more = { setId, aStar: -1, bStar: 2, flagReason: 'stands out' }
    await tx.insert(readings).values([
      { ...more, ordinal: 6, lStar: 76, flag: 'flagged' },
      { ...more, ordinal: 7, lStar: 20, flag: 'left-out' },
    ])
    const short = await insertSet(tx, { ...place, position: 'short' }, page(80).slice(1))
    await tx.insert(readings).values({ ...more, setId: short.setId, ordinal: 5, lStar: 80, flag: 'left-out' })
    const [device] = (await cut(tx)).devices
    expect(device!.page.L).toBe(71)
  })
})

test('a device stands on the newest revision measured in both states; a day not known counts as the oldest', async () => {
  await onBench(async (tx, { deviceId, unitId, sessionId }) => {
    await insertSet(tx, { unitId, sessionId, state: 'page' }, page(70))
    const measured = async (name: string, since: string | null, L: number, ink: boolean) => {
      const unit = await insertUnit(tx, await insertRevision(tx, deviceId, name, since), `example-${name}`)
      await insertSet(tx, { unitId: unit, sessionId, state: 'page' }, page(L))
      if (ink) await insertSet(tx, { unitId: unit, sessionId, state: 'ink' }, INK)
    }
    await measured('unknown', null, 60, true)
    await measured('B', '2026-01-15', 73, true)
    await measured('C, no ink', '2026-02-01', 75, false)
    const { devices } = await cut(tx)
    expect(devices).toHaveLength(1)
    expect(devices[0]).toMatchObject({ revision: 'B', provisional: true, units: 1, page: { L: 73 } })
  })
})

test('facts are those stated by the day of release, the newest of each; what is not stated stays open', async () => {
  await onBench(async (tx, { deviceId, revisionId, unitId, sessionId }) => {
    await insertSet(tx, { unitId, sessionId, state: 'page' }, page(70))
    await insertSpec(tx, revisionId, 'weight', { value: 180 })
    await insertSpec(tx, revisionId, 'weight', { value: 175, statedOn: '2026-02-20' })
    await insertSpec(tx, revisionId, 'weight', { value: 300, statedOn: '2026-03-02' })
    await insertSpec(tx, revisionId, 'pen', { stated: 'no' })
    await insertSpec(tx, revisionId, 'colour', {})
    await insertSpec(tx, revisionId, 'lending', { stated: 'not-stated' })
    await insertSpec(tx, revisionId, 'water', { value: 7 })
    await insertSpec(tx, revisionId, 'formats', { list: ['EPUB', 'PDF'] })
    await insertSpec(tx, revisionId, 'frontLight', {})
    const light = { evennessPercent: 80, coolestKelvin: 6500, warmestKelvin: 2700, minCdM2: 0.5 }
    const second = await insertUnit(tx, revisionId, 'example-2')
    await tx.insert(frontLightMeasurements).values([
      { ...light, unitId, measuredOn: '2026-02-01', maxCdM2: 500 },
      { ...light, unitId, measuredOn: '2026-02-02', maxCdM2: 90 },
      { ...light, unitId: second, measuredOn: '2026-02-02', maxCdM2: 100 },
    ])
    const price = { deviceId, currency: 'GBP', seller: 'a shop' }
    await tx.insert(prices).values([
      { ...price, amountMinor: 19900, seenOn: '2026-01-20' },
      { ...price, amountMinor: 17900, seenOn: '2026-02-20' },
      { ...price, amountMinor: 100, seenOn: '2026-03-02' },
    ])
    expect((await cut(tx)).devices[0]).toMatchObject({
      weight: 175,
      pen: false,
      colour: true,
      lending: null,
      speech: null,
      water: 7,
      formats: ['EPUB', 'PDF'],
      frontLight: { max: 95, min: 0.5 },
      price: { amount: 17900, currency: 'GBP' },
      diagonal: null,
      onSale: null,
    })
    await insertSpec(tx, revisionId, 'onSale', { stated: 'no', statedOn: '2026-03-03' })
    await insertSpec(tx, revisionId, 'frontLight', { stated: 'no', statedOn: '2026-03-03' })
    await insertSpec(tx, revisionId, 'water', { stated: 'no', statedOn: '2026-03-03' })
    expect((await cut(tx, new Date('2026-03-04T09:00:00Z'))).devices[0]).toMatchObject({
      onSale: false,
      price: null,
      frontLight: false,
      water: 0,
      weight: 300,
    })
  })
})

test('the session’s doubt compares sessions of one tile, and the paper is the sheet read last', async () => {
  await onBench(async (tx, { unitId, sessionId, instrumentId }) => {
    await insertSet(tx, { unitId, sessionId, state: 'page' }, page(70))
    const first = await cut(tx)
    // Session means 95 and 95.2, no scatter within: s² = 0.02. By hand.
    expect(first.uncertainty.session).toEqual({ L: 0.1414, a: 0.0707, b: 0 })
    expect(first.uncertainty.common).toEqual({ L: 0.2, a: 0.1, b: 0.1 })
    expect(first.control.paper).toEqual({ L: 94, a: 1, b: -2 })

    const april = await insertSession(tx, instrumentId, '2026-04-07')
    const may = await insertSession(tx, instrumentId, '2026-05-05')
    const warm = await insertSession(tx, instrumentId, '2026-05-06', { illuminant: 'A' })
    await insertControl(tx, 'tile', 'EX-TILE-2', [
      { sessionId: april, colours: flat(90) },
      { sessionId: may, colours: flat(90.2, 0.1) },
      { sessionId: warm, colours: flat(80) },
    ])
    await insertControl(tx, 'paper', 'EX-PAPER-2', [
      { sessionId: april, colours: flat(92, 0, -4) },
      { sessionId: may, colours: flat(93, 0, -4) },
      { sessionId: warm, colours: flat(80) },
    ])
    const second = await cut(tx, new Date('2026-06-01T09:00:00Z'))
    expect(second.uncertainty.session).toEqual({ L: 0.1414, a: 0.0707, b: 0 })
    expect(second.control.paper).toEqual({ L: 92.5, a: 0, b: -4 })
  })
})

test('there is no edition where nothing counts, or no control does', async () => {
  await onBench(async (tx) => {
    await expect(cut(tx)).rejects.toThrow('No device has sets of page and ink that count')
  })
  await rollingBack(connection.db, async (tx) => {
    const sessionId = await insertSession(tx, await insertInstrument(tx), '2026-02-03')
    const { unitId } = await insertDevice(tx, 'example-6')
    await insertSet(tx, { unitId, sessionId, state: 'page' }, page(70))
    await insertSet(tx, { unitId, sessionId, state: 'ink' }, INK)
    await expect(cut(tx)).rejects.toThrow('control paper has not been read')
    await insertControl(tx, 'paper', 'EX-PAPER', [{ sessionId, colours: flat(94) }])
    await insertControl(tx, 'tile', 'EX-TILE', [{ sessionId, colours: flat(95) }])
    await expect(cut(tx)).rejects.toThrow('fewer than two sessions')
  })
})
