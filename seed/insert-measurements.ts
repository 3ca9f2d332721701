import type { Db } from '@/db/client'
import { readings, sets } from '@/db/schema'
import type { Bench } from './insert-bench'
import type { Units } from './insert-devices'
import { POSITIONS, readDevice, type State } from './measure'
import { OUTLIERS, PLAN, WITHDRAWN } from './scenario/bench'
import { DEVICES } from './scenario/devices'

type Planned = { session: string; slug: string; revision: string; unit: number; position: string; state: State }

/** A few sets have more readings than five: the tester wanted a narrower half-width. */
function readingCount({ slug, position }: Planned): number {
  return slug === 'ostler-plain-7' && position === 'centre' ? 8 : position === 'lower-inner' ? 6 : 5
}

/** Every planned set with its readings; the withdrawn ones and those that stand out among them. */
export async function insertMeasurements(tx: Db, bench: Bench, units: Units): Promise<void> {
  const again = [WITHDRAWN.againIn, WITHDRAWN.device, 'A', WITHDRAWN.unit] as const
  const planned: Planned[] = [...PLAN, again].flatMap(([session, slug, revision, unit]) =>
    (['page', 'ink'] as const).flatMap((state) =>
      POSITIONS.map((position) => ({ session, slug, revision, unit, position, state })),
    ),
  )
  const setRows = await tx
    .insert(sets)
    .values(
      planned.map((set) => ({
        sessionId: bench.sessionIds.get(set.session)!,
        unitId: units.unitIds.get(`${set.slug} ${set.revision} ${set.unit}`)!,
        position: set.position,
        state: set.state,
        specular: 'included' as const,
        lightOff: true,
        shown: `test page, full ${set.state === 'page' ? 'white' : 'black'}, after two full refreshes, plain theme`,
        ...(isWithdrawn(set) ? { withdrawnAt: new Date(WITHDRAWN.at), withdrawnReason: WITHDRAWN.reason } : {}),
      })),
    )
    .returning({ id: sets.id })
  const rows = planned.flatMap((set, i) => readingRows(set, setRows[i]!.id))
  for (let from = 0; from < rows.length; from += 400) await tx.insert(readings).values(rows.slice(from, from + 400))
}

function isWithdrawn({ session, slug, unit, state }: Planned): boolean {
  return session === WITHDRAWN.session && slug === WITHDRAWN.device && unit === WITHDRAWN.unit && state === 'page'
}

function readingRows(set: Planned, setId: number): (typeof readings.$inferInsert)[] {
  const device = DEVICES.find((one) => one.slug === set.slug)!
  return Array.from({ length: readingCount(set) }, (_, n) => {
    const ordinal = n + 1
    const outlier = OUTLIERS.find(
      (one) =>
        one.session === set.session &&
        one.device === set.slug &&
        one.position === set.position &&
        one.state === set.state &&
        one.ordinal === ordinal,
    )
    const extra = isWithdrawn(set) ? WITHDRAWN.error : outlier?.error
    const { L, a, b, instrumentWhiteness, spectrum } = readDevice(device, { ...set, ordinal }, extra)
    return {
      setId,
      ordinal,
      lStar: L,
      aStar: a,
      bStar: b,
      instrumentWhiteness,
      spectrum,
      flag: outlier?.flag ?? 'none',
      flagReason: outlier?.reason,
    }
  })
}
