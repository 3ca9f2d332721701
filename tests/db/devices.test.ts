import { afterAll, beforeAll, expect, test } from 'vitest'
import { type DeviceRecord, findDeviceBySlug, listDeviceEntries } from '@/db/queries/devices'
import { findEdition } from '@/db/queries/editions'
import { listTileReadings, listWhiteCalibrations } from '@/db/queries/session-state'
import { controlStates } from '@/lib/findings/control-state'
import { createSeededDatabase } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
})
afterAll(() => seeded.drop())

const recordOf = async (slug: string): Promise<DeviceRecord> => (await findDeviceBySlug(seeded.db, slug))!

test('there is nothing at an address no device has', async () => {
  expect(await findDeviceBySlug(seeded.db, 'no-such-device')).toBeNull()
})

test('a device comes with its maker, revisions, units, specs, prices and front light, the newest first', async () => {
  const device = await recordOf('ostler-plain-6')
  expect(device).toMatchObject({ name: 'Ostler Plain 6', maker: 'Ostler' })
  expect(device.revisions.map((one) => one.name)).toEqual(['B', 'A'])
  expect(device.units).toHaveLength(4)
  expect(device.prices.map((one) => [one.amountMinor, one.seenOn])).toEqual([
    [11900, '2026-10-30'],
    [12900, '2026-01-20'],
  ])
  expect(device.frontLights).toHaveLength(4)
  const stated = device.specs.filter((one) => one.revisionId === device.revisions[0]!.id)
  expect(new Set(stated.map((one) => one.field)).size).toBe(12)
  expect(stated.find((one) => one.field === 'water')).toMatchObject({ stated: 'not-stated', value: null })
  expect(stated.every((one) => one.source && one.statedOn)).toBe(true)
})

test('its sets come with their session and every reading, those left out and those withdrawn among them', async () => {
  const device = await recordOf('haldon-copybook-10')
  const ownUnits = new Set(device.units.map((unit) => unit.id))
  expect(device.sets).toHaveLength(12)
  for (const set of device.sets) {
    expect(ownUnits.has(set.unitId)).toBe(true)
    expect(set).toMatchObject({ geometry: 'd/8', specular: 'included', lightOff: true })
    expect(set.readings.map((one) => one.ordinal)).toEqual(set.readings.map((_, i) => i + 1))
    expect(set.readings.length).toBeGreaterThanOrEqual(5)
  }
  const leftOut = device.sets.flatMap((set) => set.readings).filter((one) => one.flag === 'left-out')
  expect(leftOut).toHaveLength(1)
  expect(leftOut[0]!.flagReason).toMatch(/bezel/)

  const reed = await recordOf('tamber-reed-7')
  const withdrawn = reed.sets.filter((set) => set.withdrawnAt)
  expect(withdrawn.length).toBeGreaterThan(0)
  expect(withdrawn.every((set) => set.withdrawnReason && set.readings.length >= 5)).toBe(true)
  const starts = reed.sets.map((set) => set.startedAt.getTime())
  expect(starts).toEqual([...starts].sort((one, other) => other - one))
})

test('a correction comes with its public replies, oldest first', async () => {
  const { corrections } = await recordOf('tamber-reed-7')
  expect(corrections).toHaveLength(1)
  expect(corrections[0]).toMatchObject({ wrongIn: 1, rightIn: 2 })
  const days = corrections[0]!.replies.map((reply) => reply.repliedOn)
  expect(days).toHaveLength(2)
  expect(days).toEqual([...days].sort())
  expect((await recordOf('ostler-plain-7')).corrections).toEqual([])
})

test('every edition’s entry of a device comes with its revision, its sets and the doubts of that edition', async () => {
  const entries = await listDeviceEntries(seeded.db, 'ostler-plain-6')
  expect(entries.map(({ edition, revision }) => [edition, revision])).toEqual([
    [3, 'B'],
    [2, 'B'],
    [1, 'A'],
  ])
  for (const entry of entries) {
    const edition = (await findEdition(seeded.db, entry.edition))!
    expect(entry.device).toEqual(edition.devices.find(({ slug }) => slug === 'ostler-plain-6'))
    expect(entry.uncertainty).toEqual(edition.uncertainty)
    expect(entry.control).toEqual(edition.control)
    expect(entry.publishedAt).toEqual(new Date(edition.publishedAt))
  }
  const { sets, units } = await recordOf('ostler-plain-6')
  const ofRevision = new Set(units.filter((unit) => unit.revisionId === entries[0]!.revisionId).map((unit) => unit.id))
  const counted = sets.filter((set) => entries[0]!.setIds.includes(set.id))
  expect(counted).toHaveLength(entries[0]!.setIds.length)
  expect(counted.every((set) => ofRevision.has(set.unitId))).toBe(true)
})

test('a device no edition has, has no entries', async () => {
  expect(await listDeviceEntries(seeded.db, 'no-such-device')).toEqual([])
})

test('the tile was read at the start and the end of every session a device was read in, after its white was set', async () => {
  const [tiles, calibrations] = [await listTileReadings(seeded.db), await listWhiteCalibrations(seeded.db)]
  const starts = tiles.map(({ startedAt }) => startedAt.getTime())
  expect(starts).toEqual([...starts].sort((one, other) => one - other))
  const states = new Map(controlStates(tiles).map((state) => [state.session, state]))
  const { sets } = await recordOf('tamber-reed-7')
  for (const { session, startedAt, instrumentId } of sets) {
    const own = tiles.filter((reading) => reading.session === session)
    expect(new Set(own.map(({ moment }) => moment))).toEqual(new Set(['start', 'end']))
    expect(own.every((reading) => reading.instrumentId === instrumentId)).toBe(true)
    const state = states.get(session)!
    expect(state.readings).toBe(own.length)
    expect(state.reach!.L).toBeGreaterThan(0)
    const white = calibrations.findLast((one) => one.instrumentId === instrumentId && one.at <= startedAt)
    expect(white?.tileSerial).toMatch(/TILE/)
    expect(startedAt.getTime() - white!.at.getTime()).toBeLessThan(60 * 60_000)
  }
})
