import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { connect, type Db } from '@/db/client'
import { cutEdition } from '@/db/editions/cut-edition'
import { corrections, makers, replies } from '@/db/schema'
import { insertBench } from './insert-bench'
import { insertDevices } from './insert-devices'
import { insertMeasurements } from './insert-measurements'
import { EDITIONS } from './scenario/bench'

/** Any fixed number: one load at a time. */
const LOCK = 16

/**
 * Loads the invented scenario, whole or not at all, and cuts its three editions from the readings.
 * @returns false, having changed nothing, where the database holds any maker already
 */
export function loadDemo(db: Db): Promise<boolean> {
  return db.transaction(async (tx) => {
    await tx.execute(sql`select pg_advisory_xact_lock(${LOCK})`)
    const [known] = await tx.select({ id: makers.id }).from(makers).limit(1)
    if (known) return false
    const bench = await insertBench(tx)
    const units = await insertDevices(tx)
    await insertMeasurements(tx, bench, units)
    for (const { publishedAt, title, note } of EDITIONS) {
      await cutEdition(tx, { publishedAt: new Date(publishedAt), title, note })
    }
    await insertCorrection(tx, units.deviceIds.get('tamber-reed-7')!)
    return true
  })
}

async function insertCorrection(tx: Db, deviceId: number) {
  const [correction] = await tx
    .insert(corrections)
    .values({
      deviceId,
      notedOn: '2026-05-12',
      figure: 'Lightness, whiteness and tint of the page',
      note: 'Edition 1 printed this page too light and too yellow: one unit’s front light had been on at its lowest setting. The three sets are withdrawn, the unit was read again, and edition 2 has the right figures.',
      wrongIn: 1,
      rightIn: 2,
    })
    .returning({ id: corrections.id })
  await tx.insert(replies).values([
    {
      correctionId: correction!.id,
      repliedOn: '2026-04-29',
      from: 'An owner',
      note: 'Mine looks darker than your figure beside a Plain 7. Light off, latest firmware.',
    },
    {
      correctionId: correction!.id,
      repliedOn: '2026-05-12',
      from: 'The bench',
      note: 'You were right, and thank you. The checklist now asks for a photograph of the light setting.',
    },
  ])
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_URL
  if (!url) throw new Error('DATABASE_URL is missing: the address of the PostgreSQL database to load the demo into')
  const { db, close } = connect(url, { max: 1, applicationName: 'lampleaf-seed' })
  const loaded = await loadDemo(db)
  await close()
  if (!loaded && !process.argv.includes('--if-empty')) {
    console.error('This database holds data already; the demo is only loaded into an empty one.')
    process.exit(1)
  }
  console.log(loaded ? 'loaded: sixteen invented devices, three editions' : 'already there, left as it is')
}
