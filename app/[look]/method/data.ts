import 'server-only'
import { type BenchEvent, type ControlSeries, listBenchEvents, listControlSeries } from '@/db/queries/controls'
import { type CountedSet, type ExampleSets, findExampleSets, listCountedSets } from '@/db/queries/edition-sets'
import { findComponents } from '@/db/queries/editions'
import { METHOD } from '@/lib/method/constants'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Edition, EditionDevice, Lab } from '@/lib/method/types'
import { read } from '@/lib/server/db'
import { latestEdition } from '@/lib/server/editions'
import { degreesOf } from '@/lib/workings/counts'
import type { Bench } from '@/lib/workings/workings'
import type { Texts } from './try/fields'

/** What the form starts from; `from` is null where there is no edition. */
export type Start = {
  texts: Texts
  from: { slug: string; name: string; unit: string; position: string; session: string } | null
}

export type ExampleData = { bench: Bench | null; start: Start; devices: { slug: string; name: string }[] }

export type MethodData = ExampleData & {
  edition: Edition | null
  sets: CountedSet[]
  series: ControlSeries[]
  events: BenchEvent[]
}

/** What the Method page says of the newest edition: its spreads, its sets, and the controls up to its release. */
export async function methodData(): Promise<MethodData> {
  const edition = await latestEdition()
  if (!edition)
    return { edition, bench: null, start: startOf(null, null), devices: [], sets: [], series: [], events: [] }
  const until = new Date(edition.publishedAt)
  const [basis, events, start] = await Promise.all([
    basisOf(edition),
    read((db) => listBenchEvents(db, until)),
    startFrom(edition, undefined),
  ])
  return { edition, ...basis, events, start, devices: edition.devices.map(nameOf) }
}

/** What the worked example needs. @param slug of the device to start from; one the edition does not have is not heeded */
export async function exampleData(slug: string | undefined): Promise<ExampleData> {
  const edition = await latestEdition()
  if (!edition) return { bench: null, start: startOf(null, null), devices: [] }
  const [{ bench }, start] = await Promise.all([basisOf(edition), startFrom(edition, slug)])
  return { bench, start, devices: edition.devices.map(nameOf) }
}

const nameOf = ({ slug, name }: EditionDevice) => ({ slug, name })

async function basisOf(
  edition: Edition,
): Promise<{ bench: Bench | null; sets: CountedSet[]; series: ControlSeries[] }> {
  const [components, sets, series] = await Promise.all([
    read((db) => findComponents(db, edition.number)),
    read((db) => listCountedSets(db, edition.number)),
    read((db) => listControlSeries(db, new Date(edition.publishedAt))),
  ])
  const tiles = series.filter(({ kind }) => kind === 'tile').map(({ sessions }) => sessions.length)
  const { session, common } = edition.uncertainty
  const degrees = degreesOf(sets, 'page', tiles)
  return { bench: components && { edition: edition.number, components, session, common, degrees }, sets, series }
}

async function startFrom(edition: Edition, slug: string | undefined): Promise<Start> {
  const device = edition.devices.find((one) => one.slug === slug) ?? middleByLightness(edition.devices)
  if (!device) return startOf(null, null)
  return startOf(device, await read((db) => findExampleSets(db, edition.number, device.slug)))
}

/** Neither the lightest nor the darkest: the page in the middle. */
export function middleByLightness<Device extends { slug: string; page: Lab }>(
  devices: readonly Device[],
): Device | null {
  const order = [...devices].sort((one, other) => one.page.L - other.page.L || (one.slug < other.slug ? -1 : 1))
  return order[Math.floor((order.length - 1) / 2)] ?? null
}

/** The form filled from a device's set, or from the method's bright reference page. */
function startOf(device: EditionDevice | null, sets: ExampleSets | null): Start {
  const { brightPage, brightInk } = METHOD.criteria
  const page = device?.page ?? brightPage.value
  const ink = device?.ink ?? { L: brightInk.value, a: 0, b: 0 }
  const two = (value: number) => String(Number(value.toFixed(2)))
  const lines = (readings: readonly Lab[] | undefined) =>
    (readings ?? []).map(({ L, a, b }) => `${L}, ${a}, ${b}`).join('\n')
  const { lightNeed, text } = DEFAULT_ANSWERS
  return {
    texts: {
      from: sets ? 'readings' : 'numbers',
      pageL: two(page.L),
      pageA: two(page.a),
      pageB: two(page.b),
      inkL: two(ink.L),
      inkA: two(ink.a),
      inkB: two(ink.b),
      pageReadings: lines(sets?.page),
      inkReadings: lines(sets?.ink),
      units: '1',
      positions: '1',
      lux: String(DEFAULT_ANSWERS.spots[0]?.lux ?? METHOD.weights.referenceLux.value),
      frontLight: '0',
      age: String(METHOD.reserve.age.value[lightNeed]),
      text,
    },
    from: device &&
      sets && { slug: device.slug, name: device.name, unit: sets.unit, position: sets.position, session: sets.session },
  }
}
