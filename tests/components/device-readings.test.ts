import { describe, expect, test } from 'vitest'
import { countedSets, noteOn, priceSeen } from '@/app/[look]/devices/[slug]/dossier'
import { pageNumber, readingsPath } from '@/app/[look]/devices/[slug]/readings/paging'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'

describe('the pages of a device’s readings', () => {
  test('the first has no number in its address, the others have theirs', () => {
    expect(readingsPath('example', 1)).toBe('/devices/example/readings')
    expect(readingsPath('example', 2)).toBe('/devices/example/readings/2')
  })

  test.each(['1', '0', '-2', '02', '2.0', '2x', '', ' 2', '1e1', '99999999', '٢'])('“%s” is no page', (text) => {
    expect(pageNumber(text)).toBeNull()
  })

  test('“12” is the twelfth page', () => {
    expect(pageNumber('12')).toBe(12)
  })
})

const reading = (ordinal: number, flag: 'none' | 'flagged' | 'left-out' = 'none') => ({
  setId: 1,
  ordinal,
  lStar: 70,
  aStar: -1,
  bStar: 2,
  instrumentWhiteness: null,
  flag,
  flagReason: flag === 'none' ? null : 'stands out',
})
type RecordedSet = DeviceRecord['sets'][number]
const set = (fields: Partial<RecordedSet> = {}): RecordedSet => ({
  id: 1,
  unitId: 1,
  position: 'centre',
  state: 'page',
  specular: 'included',
  lightOff: true,
  shown: 'full white',
  withdrawnAt: null,
  withdrawnReason: null,
  session: '2026-03-01-a',
  startedAt: new Date('2026-03-01T09:00:00Z'),
  operator: 'tester 1',
  temperatureCelsius: 23,
  geometry: 'd/8',
  apertureMm: 8,
  instrumentId: 1,
  instrument: 'Example sphere',
  readings: [1, 2, 3, 4, 5].map((ordinal) => reading(ordinal)),
  ...fields,
})
const unit = (id: number, revisionId: number) => ({
  id,
  revisionId,
  serial: `EX-${id}`,
  batch: null,
  firmware: '1.0',
  obtained: 'bought' as const,
  obtainedFrom: 'a shop',
  obtainedOn: '2026-01-10',
  condition: 'new',
})
const record = (sets: RecordedSet[], fields: Partial<DeviceRecord> = {}): DeviceRecord => ({
  id: 1,
  slug: 'example',
  name: 'Example',
  note: null,
  maker: 'Example',
  revisions: [],
  units: [unit(1, 1), unit(2, 2)],
  specs: [],
  prices: [],
  frontLights: [],
  corrections: [],
  sets,
  ...fields,
})
const { uncertainty, control } = makeEdition([])
const entry: DeviceEntry = {
  edition: 1,
  publishedAt: new Date('2026-06-01T09:00:00Z'),
  revisionId: 1,
  revision: 'A',
  device: makeDevice({ slug: 'example' }),
  setIds: [1],
  uncertainty,
  control,
}

describe('what is said of a set', () => {
  const withdrawn = { withdrawnAt: new Date('2026-07-01'), withdrawnReason: 'the light was on' }
  test.each<[string, Partial<RecordedSet>, string | null]>([
    ['that the edition rests on', {}, null],
    ['that was withdrawn after the edition', withdrawn, 'withdrawn since the edition: the light was on'],
    ['that was withdrawn before it', { id: 2, ...withdrawn }, 'withdrawn: the light was on'],
    ['without the specular part', { id: 2, specular: 'excluded' }, 'specular excluded: shown beside, never mixed in'],
    ['with the light on', { id: 2, lightOff: false }, 'front light not off'],
    ['of another revision', { id: 2, unitId: 2 }, 'a unit of another revision'],
    ['that came later', { id: 2, startedAt: new Date('2026-06-02') }, 'read after this edition'],
    [
      'with too few readings',
      { id: 2, readings: [1, 2, 3, 4].map((n) => reading(n)).concat(reading(5, 'left-out')) },
      'fewer than 5 accepted readings',
    ],
    ['that is not among the edition’s for another reason', { id: 2 }, 'not in this edition'],
  ])('%s', (_, fields, note) => {
    expect(noteOn(set(fields), record([set(fields)]), entry)).toBe(note)
  })

  test('before any edition has the device', () => {
    expect(noteOn(set(), record([set()]), null)).toBe('no edition rests on it yet')
  })
})

test('the sets an edition rests on are those it names, without the readings left out', () => {
  const own = set({ readings: [reading(1), reading(2, 'flagged'), reading(3, 'left-out')] })
  const [counted, ...others] = countedSets(record([own, set({ id: 2 })]), entry)
  expect(others).toEqual([])
  expect(counted).toMatchObject({ unit: 'EX-1', position: 'centre', measuredOn: '2026-03-01' })
  expect(counted?.readings).toHaveLength(2)
})

test('the price of an edition is found with the day it was seen, in its own currency only', () => {
  const price = (id: number, currency: string, seenOn: string) => ({
    id,
    deviceId: 1,
    amountMinor: 12900,
    currency,
    seenOn,
    seller: 'a shop',
  })
  const prices = [price(1, 'EUR', '2026-05-01'), price(2, 'GBP', '2026-04-01')]
  expect(priceSeen(record([], { prices }), entry)?.seenOn).toBe('2026-04-01')
  expect(priceSeen(record([]), entry)).toBeNull()
  const unpriced = { ...entry, device: makeDevice({ slug: 'example', price: null }) }
  expect(priceSeen(record([], { prices }), unpriced)).toBeNull()
})
