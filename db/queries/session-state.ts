import { asc, eq } from 'drizzle-orm'
import type { Db } from '../client'
import { calibrations, controlReadings, controlSamples, instruments, sessions } from '../schema'

export type TileReading = Awaited<ReturnType<typeof listTileReadings>>[number]
export type WhiteCalibration = Awaited<ReturnType<typeof listWhiteCalibrations>>[number]

/**
 * Every reading of every control tile, oldest session first, the start of a session before its end. The chart of one
 * session's tile needs all the others.
 */
export function listTileReadings(db: Db) {
  return db
    .select({
      session: sessions.name,
      startedAt: sessions.startedAt,
      instrumentId: instruments.id,
      instrument: instruments.name,
      sampleId: controlSamples.id,
      sample: controlSamples.name,
      moment: controlReadings.moment,
      L: controlReadings.lStar,
      a: controlReadings.aStar,
      b: controlReadings.bStar,
    })
    .from(controlReadings)
    .innerJoin(controlSamples, eq(controlSamples.id, controlReadings.controlSampleId))
    .innerJoin(sessions, eq(sessions.id, controlReadings.sessionId))
    .innerJoin(instruments, eq(instruments.id, sessions.instrumentId))
    .where(eq(controlSamples.kind, 'tile'))
    .orderBy(asc(sessions.startedAt), asc(controlReadings.id))
}

/** When each instrument's white was set, and on which tile, oldest first. */
export function listWhiteCalibrations(db: Db) {
  return db
    .select({ instrumentId: calibrations.instrumentId, at: calibrations.at, tileSerial: calibrations.tileSerial })
    .from(calibrations)
    .where(eq(calibrations.kind, 'white'))
    .orderBy(asc(calibrations.at))
}
