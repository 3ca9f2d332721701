import type { Db } from '@/db/client'
import { devices, frontLightMeasurements, makers, prices, revisions, type SpecField, specs, units } from '@/db/schema'
import { DEVICES, MAKERS, type ScenarioDevice } from './scenario/devices'

export type Units = {
  deviceIds: Map<string, number>
  /** Unit ids by "slug revision number". */
  unitIds: Map<string, number>
}

const SHEET = 'maker’s data sheet (invented)'
const SCALE = 'weighed and measured on the bench'
const TRIED = 'tried by the team'

/** Makers, devices, their revisions and units, what was stated of them, their front lights and prices. */
export async function insertDevices(tx: Db): Promise<Units> {
  const makerRows = await tx
    .insert(makers)
    .values(MAKERS.map((name) => ({ name, slug: name.toLowerCase() })))
    .returning({ id: makers.id, name: makers.name })
  const makerIds = new Map(makerRows.map((row) => [row.name, row.id]))
  const deviceRows = await tx
    .insert(devices)
    .values(DEVICES.map(({ slug, name, note, maker }) => ({ slug, name, note, makerId: makerIds.get(maker)! })))
    .returning({ id: devices.id, slug: devices.slug })
  const deviceIds = new Map(deviceRows.map((row) => [row.slug, row.id]))
  const unitIds = new Map<string, number>()
  for (const device of DEVICES) await insertRevisions(tx, device, deviceIds.get(device.slug)!, unitIds)
  await tx.insert(prices).values(
    DEVICES.flatMap((device) =>
      device.prices.map(({ amount, on }) => ({
        deviceId: deviceIds.get(device.slug)!,
        amountMinor: amount,
        currency: 'GBP',
        seenOn: on,
        seller: 'a shop on Marlquay harbour, tax included',
      })),
    ),
  )
  return { deviceIds, unitIds }
}

async function insertRevisions(tx: Db, device: ScenarioDevice, deviceId: number, unitIds: Map<string, number>) {
  for (const { name, since, note, units: count } of device.revisions) {
    const [revision] = await tx
      .insert(revisions)
      .values({ deviceId, name, since, note })
      .returning({ id: revisions.id })
    const unitRows = await tx
      .insert(units)
      .values(Array.from({ length: count }, (_, i) => unitRow(device, name, revision!.id, since, i + 1)))
      .returning({ id: units.id })
    unitRows.forEach((row, i) => {
      unitIds.set(`${device.slug} ${name} ${i + 1}`, row.id)
    })
    await tx.insert(specs).values(specRows(device, revision!.id, since))
    const light = device.frontLight
    if (light) {
      await tx.insert(frontLightMeasurements).values(
        unitRows.map((row, i) => ({
          unitId: row.id,
          measuredOn: dayAfter(since, 40),
          // Two units never give quite the same.
          maxCdM2: Math.round(light.max * (1 + 0.03 * i) * 10) / 10,
          minCdM2: Math.round(light.min * (1 + 0.04 * i) * 100) / 100,
          evennessPercent: light.evenness - i,
          coolestKelvin: light.coolest,
          warmestKelvin: light.warmest,
        })),
      )
    }
  }
}

function unitRow(device: ScenarioDevice, revision: string, revisionId: number, since: string, number: number) {
  const initials = device.name.replace(/[^A-Z0-9]/g, '')
  const lent = number === 2 && ['Quayle', 'Haldon'].includes(device.maker)
  return {
    revisionId,
    serial: `${initials}-${revision}${number}`,
    batch: number === 1 ? `${since.slice(2, 4)}${since.slice(5, 7)}` : null,
    firmware: `${number}.${since.slice(5, 7)}`,
    obtained: lent ? ('lent' as const) : ('bought' as const),
    obtainedFrom: lent ? 'the maker, returned after reading' : 'a shop, anonymously',
    obtainedOn: dayAfter(since, 20),
    condition: 'new, film removed',
  }
}

/** A day so many days on. */
function dayAfter(day: string, days: number): string {
  return new Date(Date.parse(day) + days * 86_400_000).toISOString().slice(0, 10)
}

type SpecRow = typeof specs.$inferInsert

function specRows(device: ScenarioDevice, revisionId: number, since: string): SpecRow[] {
  const statedOn = dayAfter(since, 30)
  const row = (field: SpecField, source: string, rest: Partial<SpecRow>): SpecRow => ({
    revisionId,
    field,
    source,
    statedOn,
    stated: 'yes',
    ...rest,
  })
  const truth = (field: SpecField, value: boolean | null, source: string): SpecRow =>
    row(field, value === null ? 'not on the data sheet, nobody answered' : source, {
      stated: value === null ? 'not-stated' : value ? 'yes' : 'no',
    })
  const number = (field: SpecField, value: number | null, source: string): SpecRow =>
    value === null ? truth(field, null, source) : row(field, source, { value })
  return [
    number('diagonal', device.diagonal, SHEET),
    number('ppi', device.ppi, SHEET),
    number('weight', device.weight, SCALE),
    truth('pen', device.pen, SHEET),
    truth('colour', device.colour, SHEET),
    truth('frontLight', device.frontLight !== null, TRIED),
    device.water === 0 ? truth('water', false, SHEET) : number('water', device.water, SHEET),
    truth('pageButtons', device.pageButtons, TRIED),
    device.onSale === false
      ? { ...truth('onSale', false, 'asked in shops, none has it any more'), statedOn: '2025-11-01' }
      : truth('onSale', device.onSale, 'seen in shops'),
    truth('lending', device.lending, TRIED),
    truth('speech', device.speech, TRIED),
    device.formats === null ? truth('formats', null, SHEET) : row('formats', SHEET, { list: device.formats }),
  ]
}
