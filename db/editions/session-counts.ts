import { and, eq, lte } from 'drizzle-orm'
import { sessions } from '../schema'

/** A session that figures of this moment may rest on: over by then, at d/8°, specular included, D65, 10° observer. */
export function sessionCounts(at: Date) {
  return and(
    eq(sessions.specular, 'included'),
    eq(sessions.geometry, 'd/8'),
    eq(sessions.illuminant, 'D65'),
    eq(sessions.observer, '10'),
    lte(sessions.endedAt, at),
  )
}
