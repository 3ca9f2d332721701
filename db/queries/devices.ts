import { asc, desc, eq, inArray, sql } from 'drizzle-orm'
import type { Edition } from '@/lib/method/types'
import type { Db } from '../client'
import {
  corrections,
  devices,
  editionEntries,
  editions,
  frontLightMeasurements,
  instruments,
  makers,
  prices,
  readings,
  replies,
  revisions,
  sessions,
  sets,
  specs,
  units,
} from '../schema'

export type DeviceRecord = NonNullable<Awaited<ReturnType<typeof findDeviceBySlug>>>

/** Everything kept of the device at this address, newest first where there is an order in time; null: no such device. */
export async function findDeviceBySlug(db: Db, slug: string) {
  const [device] = await db
    .select({ id: devices.id, slug: devices.slug, name: devices.name, note: devices.note, maker: makers.name })
    .from(devices)
    .innerJoin(makers, eq(makers.id, devices.makerId))
    .where(eq(devices.slug, slug))
  if (!device) return null
  const revisionRows = await db
    .select()
    .from(revisions)
    .where(eq(revisions.deviceId, device.id))
    .orderBy(desc(revisions.since), desc(revisions.id))
  const revisionIds = revisionRows.map((row) => row.id)
  const unitRows = await db.select().from(units).where(inArray(units.revisionId, revisionIds)).orderBy(asc(units.id))
  return {
    ...device,
    revisions: revisionRows,
    units: unitRows,
    specs: await db
      .select()
      .from(specs)
      .where(inArray(specs.revisionId, revisionIds))
      .orderBy(asc(specs.field), desc(specs.statedOn)),
    prices: await db.select().from(prices).where(eq(prices.deviceId, device.id)).orderBy(desc(prices.seenOn)),
    frontLights: await listFrontLights(
      db,
      unitRows.map((unit) => unit.id),
    ),
    corrections: await listCorrections(db, device.id),
    sets: await listSets(
      db,
      unitRows.map((unit) => unit.id),
    ),
  }
}

export type DeviceEntry = Awaited<ReturnType<typeof listDeviceEntries>>[number]

/**
 * What each released edition froze of the device at this address, newest edition first: its figures, the sets they
 * rest on, and what that edition's doubts are worked out from. Empty: no edition has it.
 */
export function listDeviceEntries(db: Db, slug: string) {
  return db
    .select({
      edition: editionEntries.edition,
      publishedAt: editions.publishedAt,
      revisionId: editionEntries.revisionId,
      revision: revisions.name,
      device: editionEntries.device,
      setIds: editionEntries.setIds,
      uncertainty: sql<Edition['uncertainty']>`${editions.document} -> 'uncertainty'`,
      control: sql<Edition['control']>`${editions.document} -> 'control'`,
    })
    .from(editionEntries)
    .innerJoin(editions, eq(editions.number, editionEntries.edition))
    .innerJoin(revisions, eq(revisions.id, editionEntries.revisionId))
    .where(eq(editionEntries.slug, slug))
    .orderBy(desc(editionEntries.edition))
}

function listFrontLights(db: Db, unitIds: number[]) {
  return db
    .select()
    .from(frontLightMeasurements)
    .where(inArray(frontLightMeasurements.unitId, unitIds))
    .orderBy(desc(frontLightMeasurements.measuredOn))
}

async function listCorrections(db: Db, deviceId: number) {
  const rows = await db
    .select()
    .from(corrections)
    .where(eq(corrections.deviceId, deviceId))
    .orderBy(desc(corrections.notedOn))
  const answers = await db
    .select()
    .from(replies)
    .where(
      inArray(
        replies.correctionId,
        rows.map((row) => row.id),
      ),
    )
    .orderBy(asc(replies.repliedOn))
  return rows.map((row) => ({ ...row, replies: answers.filter((reply) => reply.correctionId === row.id) }))
}

/** Sets of these units with session, instrument and readings, newest session first. Spectra are left where they are. */
async function listSets(db: Db, unitIds: number[]) {
  const rows = await db
    .select({
      id: sets.id,
      unitId: sets.unitId,
      position: sets.position,
      state: sets.state,
      specular: sets.specular,
      lightOff: sets.lightOff,
      shown: sets.shown,
      withdrawnAt: sets.withdrawnAt,
      withdrawnReason: sets.withdrawnReason,
      session: sessions.name,
      startedAt: sessions.startedAt,
      operator: sessions.operator,
      temperatureCelsius: sessions.temperatureCelsius,
      geometry: sessions.geometry,
      apertureMm: sessions.apertureMm,
      instrumentId: instruments.id,
      instrument: instruments.name,
    })
    .from(sets)
    .innerJoin(sessions, eq(sessions.id, sets.sessionId))
    .innerJoin(instruments, eq(instruments.id, sessions.instrumentId))
    .where(inArray(sets.unitId, unitIds))
    .orderBy(desc(sessions.startedAt), asc(sets.id))
  const readingRows = await db
    .select({
      setId: readings.setId,
      ordinal: readings.ordinal,
      lStar: readings.lStar,
      aStar: readings.aStar,
      bStar: readings.bStar,
      instrumentWhiteness: readings.instrumentWhiteness,
      flag: readings.flag,
      flagReason: readings.flagReason,
    })
    .from(readings)
    .where(
      inArray(
        readings.setId,
        rows.map((row) => row.id),
      ),
    )
    .orderBy(asc(readings.setId), asc(readings.ordinal))
  return rows.map((row) => ({ ...row, readings: readingRows.filter((reading) => reading.setId === row.id) }))
}
