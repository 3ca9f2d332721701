import type { Db } from '@/db/client'
import { calibrations, controlReadings, controlSamples, instruments, sessions } from '@/db/schema'
import { readControl } from './measure'
import { CONTROLS, INSTRUMENTS, RECALIBRATED_ON, SESSIONS } from './scenario/bench'

export type Bench = { sessionIds: Map<string, number> }

/** Readings of each control at the start and at the end of a session. */
const READINGS = { start: 3, end: 3 } as const

/** Instruments, their calibrations, the controls, the sessions, and the controls read in each. */
export async function insertBench(tx: Db): Promise<Bench> {
  const instrumentRows = await tx
    .insert(instruments)
    .values(
      INSTRUMENTS.map(({ name, serial, certificate, certifiedOn, servicedOn, u, storesSpectra }) => ({
        name,
        serial,
        certificate,
        certifiedOn,
        servicedOn,
        certificateUL: u.L,
        certificateUA: u.a,
        certificateUB: u.b,
        storesSpectra,
      })),
    )
    .returning({ id: instruments.id })
  const instrumentId = new Map(INSTRUMENTS.map(({ key }, i) => [key, instrumentRows[i]!.id]))

  const sessionRows = await tx
    .insert(sessions)
    .values(
      SESSIONS.map(({ name, instrument, operator, hour, celsius }) => ({
        name,
        instrumentId: instrumentId.get(instrument)!,
        operator,
        startedAt: at(name, hour, 0),
        endedAt: at(name, hour + 3, 20),
        temperatureCelsius: celsius,
        geometry: 'd/8',
        specular: 'included' as const,
        illuminant: 'D65' as const,
        observer: '10' as const,
        apertureMm: 8,
        uv: 'included' as const,
      })),
    )
    .returning({ id: sessions.id })
  const sessionIds = new Map(SESSIONS.map(({ name }, i) => [name, sessionRows[i]!.id]))

  await tx.insert(calibrations).values(
    SESSIONS.flatMap(({ name, instrument, hour }) => {
      const { tile } = INSTRUMENTS.find((one) => one.key === instrument)!
      const id = instrumentId.get(instrument)!
      const service = instrument === 'one' && name.slice(0, 10) === '2026-05-06'
      return [
        { instrumentId: id, kind: 'zero' as const, at: at(name, hour - 1, 40) },
        {
          instrumentId: id,
          kind: 'white' as const,
          at: at(name, hour - 1, 45),
          tileSerial: tile,
          note: service ? `First calibration after the service; the scale was set anew on ${RECALIBRATED_ON}.` : null,
        },
      ]
    }),
  )
  await insertControls(tx, sessionIds)
  return { sessionIds }
}

async function insertControls(tx: Db, sessionIds: Map<string, number>) {
  const rows = await tx
    .insert(controlSamples)
    .values(CONTROLS.map(({ kind, name, serial, note }) => ({ kind, name, serial, note })))
    .returning({ id: controlSamples.id })
  await tx.insert(controlReadings).values(
    SESSIONS.flatMap((session) =>
      CONTROLS.flatMap((control, i) =>
        (['start', 'end'] as const).flatMap((moment) =>
          Array.from({ length: READINGS[moment] }, (_, n) => {
            const { L, a, b } = readControl(control.lab, session.name, control.serial, `${moment} ${n + 1}`)
            return {
              controlSampleId: rows[i]!.id,
              sessionId: sessionIds.get(session.name)!,
              moment,
              ordinal: n + 1,
              lStar: L,
              aStar: a,
              bStar: b,
            }
          }),
        ),
      ),
    ),
  )
}

/** A time of the session's day, UTC. */
function at(session: string, hour: number, minute: number): Date {
  return new Date(`${session.slice(0, 10)}T${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}:00Z`)
}
