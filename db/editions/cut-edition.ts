import { sql } from 'drizzle-orm'
import { editionDevice, METHOD_NUMBER, roundLab } from '@/lib/edition/document'
import { documentHash } from '@/lib/edition/seal'
import { deviceFigures, pooledComponents } from '@/lib/method/figures'
import type { Edition } from '@/lib/method/types'
import type { Db } from '../client'
import {
  controlReadings,
  editionEntries,
  editions,
  frontLightMeasurements,
  prices,
  readings,
  revisions,
  sessions,
  sets,
  specs,
  units,
} from '../schema'
import { listCandidates } from './candidates'
import { commonUncertainty, controlPaper, sessionUncertainty } from './controls'
import { statedFacts } from './facts'
import { keepDataset } from './keep-dataset'

/** Any fixed number: one edition is cut at a time, so that numbers have no gaps. */
const LOCK = 8785

export type Cut = {
  /** The moment of release. Sets count that were measured before it and not withdrawn by then. */
  publishedAt: Date
  title: string
  note: string
}

/**
 * Cuts and releases the next edition: works every figure out from the readings, freezes document, entries, hash and the
 * files of its data set in one transaction. Of each device the newest revision with sets of both states counts; a
 * device without is left out.
 * @returns the released document
 * @throws Error where nothing counts yet: no device, or no control of a kind the figures rest on
 */
export function cutEdition(db: Db, { publishedAt, title, note }: Cut): Promise<Edition> {
  return db.transaction(async (tx) => {
    // Cuts asked for at once wait for each other; what is measured or written meanwhile waits for this one.
    await tx.execute(sql`set local lock_timeout = '60s'`)
    await tx.execute(sql`set local statement_timeout = '60s'`)
    await tx.execute(sql`select pg_advisory_xact_lock(${LOCK})`)
    await tx.execute(
      sql`lock table ${readings}, ${controlReadings}, ${sets}, ${sessions}, ${units}, ${revisions}, ${specs}, ${prices}, ${frontLightMeasurements} in share mode`,
    )
    const [last] = await tx.select({ number: sql<number>`coalesce(max(${editions.number}), 0)::int` }).from(editions)
    const candidates = await listCandidates(tx, publishedAt)
    if (candidates.length === 0) throw new Error('No device has sets of page and ink that count; there is no edition')
    const components = pooledComponents(candidates)

    const entries = []
    for (const candidate of candidates) {
      const facts = await statedFacts(tx, candidate, publishedAt)
      const device = editionDevice(facts, deviceFigures(candidate.sets, components))
      entries.push({ device, revisionId: candidate.revisionId, setIds: candidate.setIds })
    }
    const unsealed: Omit<Edition, 'sha256'> = {
      number: (last?.number ?? 0) + 1,
      publishedAt: publishedAt.toISOString(),
      method: METHOD_NUMBER,
      control: { paper: roundLab(await controlPaper(tx, publishedAt)) },
      uncertainty: {
        common: roundLab(await commonUncertainty(tx, publishedAt)),
        session: roundLab(await sessionUncertainty(tx, publishedAt)),
      },
      devices: entries.map((entry) => entry.device),
    }
    const document: Edition = { ...unsealed, sha256: documentHash(unsealed) }
    const { number, method, sha256 } = document
    await tx.insert(editions).values({ number, publishedAt, method, title, note, sha256, document, components })
    await tx.insert(editionEntries).values(
      entries.map(({ device, revisionId, setIds }) => ({
        edition: number,
        slug: device.slug,
        device,
        revisionId,
        setIds,
      })),
    )
    await keepDataset(tx, number)
    return document
  })
}
