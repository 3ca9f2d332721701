import { and, asc, eq } from 'drizzle-orm'
import type { Lab } from '@/lib/method/types'
import { mean } from '@/lib/stats/describe'
import { nestedComponents } from '@/lib/stats/variance-components'
import type { Db } from '../client'
import { controlReadings, controlSamples, instruments, sessions } from '../schema'
import { sessionCounts } from './session-counts'

type ControlKind = (typeof controlSamples.$inferSelect)['kind']

const CHANNELS = ['L', 'a', 'b'] as const

function byChannel(value: (channel: 'L' | 'a' | 'b') => number): Lab {
  const [L, a, b] = CHANNELS.map(value) as [number, number, number]
  return { L, a, b }
}

/**
 * Readings of a kind of control up to a moment: of each sample session by session, oldest first, and the sample read
 * last at the end. A new tile or sheet of paper is a sample of its own.
 */
async function listControls(db: Db, kind: ControlKind, until: Date): Promise<Lab[][][]> {
  const rows = await db
    .select({
      sample: controlSamples.id,
      session: sessions.name,
      L: controlReadings.lStar,
      a: controlReadings.aStar,
      b: controlReadings.bStar,
    })
    .from(controlReadings)
    .innerJoin(controlSamples, eq(controlSamples.id, controlReadings.controlSampleId))
    .innerJoin(sessions, eq(sessions.id, controlReadings.sessionId))
    .where(and(eq(controlSamples.kind, kind), sessionCounts(until)))
    .orderBy(asc(sessions.startedAt), asc(controlReadings.id))
  const bySample = new Map<number, Map<string, Lab[]>>()
  for (const { sample, session, ...lab } of rows) {
    const sessionsOf = bySample.get(sample) ?? new Map<string, Lab[]>()
    const known = sessionsOf.get(session)
    if (known) known.push(lab)
    else sessionsOf.set(session, [lab])
    // Put in anew, so that the sample read last comes last.
    bySample.delete(sample)
    bySample.set(sample, sessionsOf)
  }
  return [...bySample.values()].map((sessionsOf) => [...sessionsOf.values()])
}

/**
 * s_session: the between-session standard deviation of the control tile, its repeatability taken off (component of
 * variance of sessions), over all sessions up to the moment, whichever instrument. A tile replaced by another starts
 * anew: the two are not compared.
 * @throws Error where no tile was read in two sessions: nothing to compare
 */
export async function sessionUncertainty(db: Db, until: Date): Promise<Lab> {
  const tiles = await listControls(db, 'tile', until)
  return byChannel((channel) => {
    // Of the nested components, sessions of a tile stand where positions of a unit do.
    const { sPosition } = nestedComponents([
      tiles.map((tile) => tile.map((session) => session.map((reading) => reading[channel]))),
    ])
    if (sPosition === null) throw new Error('The control tile was read in fewer than two sessions')
    return sPosition
  })
}

/** The colour of the control paper in use, the sheet read last: the mean of its session means. */
export async function controlPaper(db: Db, until: Date): Promise<Lab> {
  const paper = (await listControls(db, 'paper', until)).at(-1)
  if (!paper) throw new Error('The control paper has not been read')
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
    .where(sessionCounts(until))
  return byChannel((channel) => Math.max(...rows.map((row) => row[channel])))
}
