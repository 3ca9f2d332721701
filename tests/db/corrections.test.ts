import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import {
  countCorrections,
  listCorrections,
  listCorrectionsRightIn,
  listCorrectionsWrongIn,
} from '@/db/queries/corrections'
import { countEditions, findEdition, findEditionWords, listEditionSummaries } from '@/db/queries/editions'
import { countObtained } from '@/db/queries/units'
import { corrections, devices, replies, units } from '@/db/schema'
import { deviceChange, editionChanges } from '@/lib/edition/changes'
import type { Edition } from '@/lib/method/types'
import { EDITIONS } from '@/seed/scenario/bench'
import { connectToTests, createSeededDatabase, rollingBack } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
let editions: Edition[]
beforeAll(async () => {
  seeded = await createSeededDatabase()
  editions = []
  for (const number of [1, 2, 3]) editions.push((await findEdition(seeded.db, number))!)
})
afterAll(() => seeded.drop())

describe('corrections', () => {
  test('come newest first with their device and their replies, page by page', async () => {
    await rollingBack(seeded.db, async (tx) => {
      const [device] = await tx.select({ id: devices.id }).from(devices).limit(1)
      const note = (notedOn: string) => ({ deviceId: device!.id, notedOn, figure: 'Lightness', note: `Of ${notedOn}.` })
      const rows = await tx
        .insert(corrections)
        .values([note('2026-06-01'), note('2026-11-25'), note('2026-11-25')])
        .returning({ id: corrections.id })
      const ids = rows.map(({ id }) => id)
      await tx.insert(replies).values([
        { correctionId: ids[1]!, repliedOn: '2026-11-26', from: 'The maker', note: 'Later.' },
        { correctionId: ids[1]!, repliedOn: '2026-11-20', from: 'An owner', note: 'Earlier.' },
      ])
      expect(await countCorrections(tx)).toBe(4)
      const all = await listCorrections(tx, { limit: 30 })
      expect(all.map(({ id }) => id).slice(0, 3)).toEqual([ids[2], ids[1], ids[0]])
      expect(all[3]).toMatchObject({ slug: 'tamber-reed-7', name: 'Tamber Reed 7', wrongIn: 1, rightIn: 2 })
      expect(all[1]!.replies.map((reply) => reply.note)).toEqual(['Earlier.', 'Later.'])
      expect(all[0]!.replies).toEqual([])
      const page = await listCorrections(tx, { limit: 2, offset: 2 })
      expect(page.map(({ id }) => id)).toEqual(all.slice(2).map(({ id }) => id))
    })
  })

  test('are found by the edition that was wrong and by the one that puts it right', async () => {
    const right = await listCorrectionsRightIn(seeded.db, 2)
    expect(right).toHaveLength(1)
    expect(right[0]).toMatchObject({ slug: 'tamber-reed-7', wrongIn: 1, rightIn: 2 })
    expect(await listCorrectionsWrongIn(seeded.db, 1)).toEqual(right)
    for (const number of [1, 3]) expect(await listCorrectionsRightIn(seeded.db, number)).toEqual([])
    for (const number of [2, 3]) expect(await listCorrectionsWrongIn(seeded.db, number)).toEqual([])
  })
})

test('before anything is published there are no corrections, editions or units, and no words on them', async () => {
  const { db, close } = connectToTests()
  expect(await countCorrections(db)).toBe(0)
  expect(await listCorrections(db, { limit: 30 })).toEqual([])
  expect(await countEditions(db)).toBe(0)
  expect(await listEditionSummaries(db, { limit: 30 })).toEqual([])
  expect(await findEditionWords(db, 1)).toBeNull()
  expect(await countObtained(db)).toEqual([])
  await close()
})

test('editions are listed newest first with their words, seals and number of devices', async () => {
  expect(await countEditions(seeded.db)).toBe(3)
  const rows = await listEditionSummaries(seeded.db, { limit: 2 })
  expect(rows.map(({ number, devices: count, note }) => ({ number, count, note }))).toEqual([
    { number: 3, count: 16, note: EDITIONS[2]!.note },
    { number: 2, count: 14, note: EDITIONS[1]!.note },
  ])
  expect(rows.map(({ sha256 }) => sha256)).toEqual([editions[2]!.sha256, editions[1]!.sha256])
  const [last] = await listEditionSummaries(seeded.db, { limit: 2, offset: 2 })
  expect(last).toMatchObject({ number: 1, devices: 11 })
  expect(await findEditionWords(seeded.db, 2)).toEqual({ title: EDITIONS[1]!.title, note: EDITIONS[1]!.note })
})

test('units are counted by how and from whom they came, and none is missing', async () => {
  const rows = await countObtained(seeded.db)
  const all = await seeded.db.select({ obtained: units.obtained }).from(units)
  for (const how of ['bought', 'lent'] as const) {
    const counted = rows.filter(({ obtained }) => obtained === how).reduce((sum, row) => sum + row.units, 0)
    expect(counted).toBe(all.filter(({ obtained }) => obtained === how).length)
    expect(counted).toBeGreaterThan(0)
  }
})

describe('what the second edition changed', () => {
  const placed = (number: number, slug: string) => {
    const edition = editions[number - 1]!
    return { ...edition, device: edition.devices.find((device) => device.slug === slug)! }
  }

  test('has the corrected page: lighter before by more than the doubt, its ink as it was', () => {
    const { figures, facts } = deviceChange(placed(1, 'tamber-reed-7'), placed(2, 'tamber-reed-7'))
    const lightness = figures.find(({ figure }) => figure === 'lightness')!
    expect(lightness.before - lightness.after).toBeGreaterThan(0.5)
    expect(lightness.beyond).toBe(true)
    expect(figures.find(({ figure }) => figure === 'ink')!.beyond).toBe(false)
    expect(facts).toEqual([])
  })

  test('is what the team says it is: three devices added, one corrected, one of another revision', () => {
    const { added, withdrawn, changed } = editionChanges(editions[0]!, editions[1]!)
    expect(added.map(({ name }) => name)).toEqual(['Corrin Octavo 8', 'Haldon Copybook 10 Colour', 'Wexby Vesper 8'])
    for (const { name } of added) expect(EDITIONS[1]!.note).toContain(name)
    expect(withdrawn).toEqual([])
    expect(changed.map(({ slug }) => slug)).toEqual(['ostler-plain-6', 'tamber-reed-7'])
    expect(changed[0]!.facts).toEqual([{ fact: 'revision', ofTheFit: false }])
  })
})

// RFC 8785, 3.2.2.3: numbers as ECMAScript writes them. Python's repr agrees from 1e-4 to 1e16, and for whole numbers
// it keeps what the document has; keys sorted by code points are sorted by UTF-16 units where all are ASCII.
test('the documents hold only numbers and keys that the command on an edition’s page writes as the seal has them', () => {
  const check = (value: unknown): void => {
    if (typeof value === 'number') {
      const size = Math.abs(value)
      expect(size === 0 ? !Object.is(value, -0) : size >= 1e-4 && size < 1e16, String(value)).toBe(true)
    } else if (Array.isArray(value)) value.forEach(check)
    else if (typeof value === 'object' && value !== null) {
      for (const [key, part] of Object.entries(value)) {
        expect(key).toMatch(/^[\x20-\x7e]+$/)
        check(part)
      }
    }
  }
  editions.forEach(check)
})
