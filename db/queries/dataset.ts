import { and, asc, eq, inArray } from 'drizzle-orm'
import type { Dataset } from '@/lib/dataset/files'
import type { DatasetSource } from '@/lib/dataset/source'
import { roundLab } from '@/lib/edition/document'
import type { Lab } from '@/lib/method/types'
import type { Db } from '../client'
import { controlPaper, sessionUncertainty } from '../editions/controls'
import { sessionCounts } from '../editions/session-counts'
import {
  controlReadings,
  controlSamples,
  editionDatasets,
  editionEntries,
  editionFiles,
  editions,
  readings,
  sessions,
  sets,
  units,
} from '../schema'

/**
 * What a released edition rests on, row by row, and always the same rows: its document, the sets its entries name with
 * all their readings, and the sessions and controls that counted at its release. Null where there is no such edition.
 * @throws Error where the controls no longer give the document's figures: they are not held by the released sets alone,
 *   so a session written down late would show here, and then nothing is better than other numbers under the same name
 */
export async function findDatasetSource(db: Db, number: number): Promise<DatasetSource | null> {
  const [row] = await db.select().from(editions).where(eq(editions.number, number))
  if (!row) return null
  const entries = await db
    .select({ slug: editionEntries.slug, setIds: editionEntries.setIds })
    .from(editionEntries)
    .where(eq(editionEntries.edition, number))
  const deviceOf = new Map(entries.flatMap(({ slug, setIds }) => setIds.map((id) => [id, slug] as const)))
  const setIds = [...deviceOf.keys()]
  const { document: edition, components, publishedAt } = row
  await requireSameControls(db, edition, publishedAt)
  return {
    edition,
    components,
    sets: (await listSets(db, setIds)).map(({ id, ...set }) => ({ id, device: deviceOf.get(id)!, ...set })),
    readings: await listReadings(db, setIds),
    sessions: await listSessions(db, publishedAt),
    controls: await listControls(db, publishedAt),
  }
}

/** An edition's data set as it was released; null where there is no such edition. */
export async function findDataset(db: Db, edition: number): Promise<Dataset | null> {
  const [kept] = await db.select().from(editionDatasets).where(eq(editionDatasets.edition, edition))
  if (!kept) return null
  const { name, type, bytes, sha256 } = editionFiles
  const files = await db
    .select({ name, type, bytes, sha256 })
    .from(editionFiles)
    .where(eq(editionFiles.edition, edition))
    .orderBy(asc(editionFiles.place))
  const { measuredFrom, measuredTo, rows } = kept
  return { files: new Map(files.map((file) => [file.name, file])), measuredFrom, measuredTo, rows }
}

/** Every reading in the sets that an edition's figures of a device rest on, in the order of sets and of time. */
export async function listDeviceReadings(db: Db, edition: number, slug: string) {
  const [entry] = await db
    .select({ setIds: editionEntries.setIds })
    .from(editionEntries)
    .where(and(eq(editionEntries.edition, edition), eq(editionEntries.slug, slug)))
  if (!entry) return []
  const ofSets = new Map((await listSets(db, entry.setIds)).map((set) => [set.id, set]))
  return (await listReadings(db, entry.setIds)).map(({ spectrum: _, ...reading }) => ({
    ...reading,
    of: ofSets.get(reading.set)!,
  }))
}

async function requireSameControls(db: Db, { number, control, uncertainty }: DatasetSource['edition'], at: Date) {
  const same = (one: Lab, other: Lab) => one.L === other.L && one.a === other.a && one.b === other.b
  const paper = roundLab(await controlPaper(db, at))
  const session = roundLab(await sessionUncertainty(db, at))
  if (!same(paper, control.paper) || !same(session, uncertainty.session))
    throw new Error(`The controls kept for edition ${number} no longer give its figures; its data set is held back`)
}

function listSets(db: Db, setIds: number[]) {
  return db
    .select({
      id: sets.id,
      unit: units.serial,
      session: sessions.name,
      position: sets.position,
      state: sets.state,
      shown: sets.shown,
    })
    .from(sets)
    .innerJoin(units, eq(units.id, sets.unitId))
    .innerJoin(sessions, eq(sessions.id, sets.sessionId))
    .where(inArray(sets.id, setIds))
    .orderBy(asc(sets.id))
}

const LAB = { l: readings.lStar, a: readings.aStar, b: readings.bStar }

function listReadings(db: Db, setIds: number[]) {
  return db
    .select({
      set: readings.setId,
      ordinal: readings.ordinal,
      ...LAB,
      instrumentWhiteness: readings.instrumentWhiteness,
      spectrum: readings.spectrum,
      flag: readings.flag,
      reason: readings.flagReason,
    })
    .from(readings)
    .where(inArray(readings.setId, setIds))
    .orderBy(asc(readings.setId), asc(readings.ordinal))
}

function listSessions(db: Db, at: Date) {
  return db
    .select({
      session: sessions.name,
      instrument: sessions.instrumentId,
      startedAt: sessions.startedAt,
      endedAt: sessions.endedAt,
      temperature: sessions.temperatureCelsius,
      geometry: sessions.geometry,
      specular: sessions.specular,
      illuminant: sessions.illuminant,
      observer: sessions.observer,
      aperture: sessions.apertureMm,
      uv: sessions.uv,
    })
    .from(sessions)
    .where(sessionCounts(at))
    .orderBy(asc(sessions.startedAt), asc(sessions.id))
}

function listControls(db: Db, at: Date) {
  return db
    .select({
      session: sessions.name,
      kind: controlSamples.kind,
      sample: controlSamples.id,
      moment: controlReadings.moment,
      ordinal: controlReadings.ordinal,
      l: controlReadings.lStar,
      a: controlReadings.aStar,
      b: controlReadings.bStar,
    })
    .from(controlReadings)
    .innerJoin(controlSamples, eq(controlSamples.id, controlReadings.controlSampleId))
    .innerJoin(sessions, eq(sessions.id, controlReadings.sessionId))
    .where(sessionCounts(at))
    .orderBy(
      asc(sessions.startedAt),
      asc(sessions.id),
      asc(controlReadings.moment),
      asc(controlSamples.id),
      asc(controlReadings.ordinal),
    )
}
