import { and, asc, eq, isNotNull, lte } from 'drizzle-orm'
import type { Lab } from '@/lib/method/types'
import type { Db } from '../client'
import { sessionCounts } from '../editions/session-counts'
import { calibrations, controlReadings, controlSamples, instruments, sessions } from '../schema'

export type ControlReading = Lab & { moment: 'start' | 'end' }

/** A session as a control saw it, its readings in the order they were taken. */
export type ControlSession = { name: string; startedAt: Date; instrument: string; readings: ControlReading[] }

/** One control sample with the sessions it was read in, oldest first. */
export type ControlSeries = {
  kind: (typeof controlSamples.$inferSelect)['kind']
  name: string
  serial: string
  note: string
  sessions: ControlSession[]
}

/**
 * Every control sample with its readings in sessions that figures of this moment may rest on, kinds and samples in the
 * order they came to the bench.
 */
export async function listControlSeries(db: Db, until: Date): Promise<ControlSeries[]> {
  const rows = await db
    .select({
      sample: controlSamples.id,
      kind: controlSamples.kind,
      sampleName: controlSamples.name,
      serial: controlSamples.serial,
      note: controlSamples.note,
      session: sessions.name,
      startedAt: sessions.startedAt,
      instrument: instruments.name,
      moment: controlReadings.moment,
      L: controlReadings.lStar,
      a: controlReadings.aStar,
      b: controlReadings.bStar,
    })
    .from(controlReadings)
    .innerJoin(controlSamples, eq(controlSamples.id, controlReadings.controlSampleId))
    .innerJoin(sessions, eq(sessions.id, controlReadings.sessionId))
    .innerJoin(instruments, eq(instruments.id, sessions.instrumentId))
    .where(sessionCounts(until))
    .orderBy(
      asc(controlSamples.id),
      asc(sessions.startedAt),
      asc(sessions.name),
      asc(controlReadings.moment),
      asc(controlReadings.ordinal),
    )

  const series = new Map<number, ControlSeries>()
  for (const { sample, kind, sampleName, serial, note, session, startedAt, instrument, ...reading } of rows) {
    const own = series.get(sample) ?? { kind, name: sampleName, serial, note, sessions: [] }
    series.set(sample, own)
    const last = own.sessions.at(-1)
    if (last?.name === session) last.readings.push(reading)
    else own.sessions.push({ name: session, startedAt, instrument, readings: [reading] })
  }
  return [...series.values()]
}

/** Something done to an instrument, or written down of a session. */
export type BenchEvent = { on: string; instrument: string; what: string }

/** Services, and notes of calibrations and sessions, up to a moment and in order of time; `on` is a day, ISO 8601. */
export async function listBenchEvents(db: Db, until: Date): Promise<BenchEvent[]> {
  const day = (at: Date) => at.toISOString().slice(0, 10)
  const serviced = await db
    .select({ on: instruments.servicedOn, instrument: instruments.name })
    .from(instruments)
    .where(and(isNotNull(instruments.servicedOn), lte(instruments.servicedOn, day(until))))
  const calibrated = await db
    .select({ at: calibrations.at, instrument: instruments.name, note: calibrations.note })
    .from(calibrations)
    .innerJoin(instruments, eq(instruments.id, calibrations.instrumentId))
    .where(and(isNotNull(calibrations.note), lte(calibrations.at, until)))
  const noted = await db
    .select({ at: sessions.startedAt, instrument: instruments.name, note: sessions.note, name: sessions.name })
    .from(sessions)
    .innerJoin(instruments, eq(instruments.id, sessions.instrumentId))
    .where(and(isNotNull(sessions.note), sessionCounts(until)))
  return [
    ...serviced.flatMap(({ on, instrument }) => (on ? [{ on, instrument, what: 'Serviced.' }] : [])),
    ...calibrated.map(({ at, instrument, note }) => ({ on: day(at), instrument, what: note ?? '' })),
    ...noted.map(({ at, instrument, note, name }) => ({ on: day(at), instrument, what: `Session ${name}: ${note}` })),
  ].sort((one, other) => (one.on === other.on ? 0 : one.on < other.on ? -1 : 1))
}
