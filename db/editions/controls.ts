import { and, asc, eq, lte } from 'drizzle-orm'
import type { Lab } from '@/lib/method/types'
import { mean } from '@/lib/stats/describe'
import { nestedComponents } from '@/lib/stats/variance-components'
import type { Db } from '../client'
import { controlReadings, controlSamples, instruments, sessions } from '../schema'

type ControlKind = (typeof controlSamples.$inferSelect)['kind']

const CHANNELS = ['L', 'a', 'b'] as const

function byChannel(value: (channel: 'L' | 'a' | 'b') => number): Lab {
  const [L, a, b] = CHANNELS.map(value) as [number, number, number]
  return { L, a, b }
}

/** Readings of a kind of control up to a moment, session by session, oldest first. */
async function listControlSessions(db: Db, kind: ControlKind, until: Date): Promise<Lab[][]> {
  const rows = await db
    .select({
      session: sessions.name,
      L: controlReadings.lStar,
      a: controlReadings.aStar,
      b: controlReadings.bStar,
    })
    .from(controlReadings)
    .innerJoin(controlSamples, eq(controlSamples.id, controlReadings.controlSampleId))
    .innerJoin(sessions, eq(sessions.id, controlReadings.sessionId))
    .where(and(eq(controlSamples.kind, kind), lte(sessions.endedAt, until)))
    .orderBy(asc(sessions.startedAt), asc(controlReadings.id))
  const bySession = new Map<string, Lab[]>()
  for (const { session, ...lab } of rows) {
    const known = bySession.get(session)
    if (known) known.push(lab)
    else bySession.set(session, [lab])
  }
  return [...bySession.values()]
}

/**
 * s_session: the between-session standard deviation of the control tile, its repeatability taken off (component of
 * variance of sessions), over all sessions up to the moment, whichever instrument.
 * @throws Error with fewer than two sessions: nothing to compare
 */
export async function sessionUncertainty(db: Db, until: Date): Promise<Lab> {
  const tile = await listControlSessions(db, 'tile', until)
  if (tile.length < 2) throw new Error('The control tile was read in fewer than two sessions')
  return byChannel((channel) => {
    const { sPosition } = nestedComponents([[tile.map((session) => session.map((reading) => reading[channel]))]])
    return sPosition ?? 0
  })
}

/** The control paper's colour: the mean of its session means. */
export async function controlPaper(db: Db, until: Date): Promise<Lab> {
  const paper = await listControlSessions(db, 'paper', until)
  if (paper.length === 0) throw new Error('The control paper has not been read')
  return byChannel((channel) => mean(paper.map((session) => mean(session.map((reading) => reading[channel])))))
}

/** u_common: calibration and certificate; the largest of the instruments used, since any figure may rest on it. */
export async function commonUncertainty(db: Db, until: Date): Promise<Lab> {
  const rows = await db
    .selectDistinct({
      L: instruments.certificateUL,
      a: instruments.certificateUA,
      b: instruments.certificateUB,
    })
    .from(instruments)
    .innerJoin(sessions, eq(sessions.instrumentId, instruments.id))
    .where(lte(sessions.endedAt, until))
  return byChannel((channel) => Math.max(...rows.map((row) => row[channel])))
}
