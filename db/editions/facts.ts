import { and, asc, desc, eq, lte } from 'drizzle-orm'
import type { StatedFacts } from '@/lib/edition/document'
import type { FrontLight } from '@/lib/method/types'
import { mean } from '@/lib/stats/describe'
import type { Db } from '../client'
import { frontLightMeasurements, prices, type SpecField, specs, units } from '../schema'
import type { Candidate } from './candidates'

type Spec = typeof specs.$inferSelect

/** What was stated of a device by a day; the newest statement of each fact counts, and null is "not stated". */
export async function statedFacts(db: Db, candidate: Candidate, at: Date): Promise<StatedFacts> {
  const day = at.toISOString().slice(0, 10)
  const { slug, name, maker, revision, revisionId, deviceId } = candidate
  const rows = await db
    .select()
    .from(specs)
    .where(and(eq(specs.revisionId, revisionId), lte(specs.statedOn, day)))
    .orderBy(asc(specs.statedOn), asc(specs.id))
  const newest = new Map<SpecField, Spec>(rows.map((row) => [row.field, row]))
  const yesOrNo = (field: SpecField) => truth(newest.get(field))
  const number = (field: SpecField) => newest.get(field)?.value ?? null
  const onSale = yesOrNo('onSale')
  return {
    slug,
    name,
    maker,
    revision,
    frontLight: await frontLight(db, revisionId, yesOrNo('frontLight'), day),
    diagonal: number('diagonal'),
    ppi: number('ppi'),
    weight: number('weight'),
    // What can no longer be bought has no price.
    price: onSale === false ? null : await latestPrice(db, deviceId, day),
    pen: yesOrNo('pen'),
    colour: yesOrNo('colour'),
    // Stated to have no protection is 0; a code we were not told is null.
    water: yesOrNo('water') === false ? 0 : number('water'),
    pageButtons: yesOrNo('pageButtons'),
    onSale,
    lending: yesOrNo('lending'),
    speech: yesOrNo('speech'),
    formats: newest.get('formats')?.list ?? null,
  }
}

function truth(spec: Spec | undefined): boolean | null {
  return !spec || spec.stated === 'not-stated' ? null : spec.stated === 'yes'
}

/** Luminances by meter, the mean of the units' newest; a light nobody measured is not stated. */
async function frontLight(db: Db, revisionId: number, has: boolean | null, day: string): Promise<FrontLight> {
  if (has === false) return false
  const rows = await db
    .select({
      unit: units.id,
      max: frontLightMeasurements.maxCdM2,
      min: frontLightMeasurements.minCdM2,
    })
    .from(frontLightMeasurements)
    .innerJoin(units, eq(units.id, frontLightMeasurements.unitId))
    .where(and(eq(units.revisionId, revisionId), lte(frontLightMeasurements.measuredOn, day)))
    .orderBy(asc(frontLightMeasurements.measuredOn), asc(frontLightMeasurements.id))
  const newest = [...new Map(rows.map((row) => [row.unit, row])).values()]
  if (has === null || newest.length === 0) return null
  const rounded = (value: number, decimals: number) => Number(value.toFixed(decimals))
  return {
    max: rounded(mean(newest.map((row) => row.max)), 1),
    min: rounded(mean(newest.map((row) => row.min)), 2),
  }
}

async function latestPrice(db: Db, deviceId: number, day: string) {
  const [row] = await db
    .select({ amount: prices.amountMinor, currency: prices.currency })
    .from(prices)
    .where(and(eq(prices.deviceId, deviceId), lte(prices.seenOn, day)))
    .orderBy(desc(prices.seenOn), desc(prices.id))
    .limit(1)
  return row ?? null
}
