import { createHash } from 'node:crypto'
import { eq, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { keepDataset, keepMissingDatasets } from '@/db/editions/keep-dataset'
import { findDataset, findDatasetSource, listDeviceReadings } from '@/db/queries/dataset'
import { findEdition } from '@/db/queries/editions'
import { controlReadings, editionFiles, instruments, prices, sessions, sets, specs } from '@/db/schema'
import { type Dataset, writeDataset } from '@/lib/dataset/files'
import { TABLES } from '@/lib/dataset/tables'
import { readCsv } from '@/tests/dataset/read-csv'
import { recompute } from '@/tests/dataset/recompute'
import { createSeededDatabase, rollingBack } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
const datasets: Record<number, Dataset> = {}
beforeAll(async () => {
  seeded = await createSeededDatabase(2)
  for (const number of [1, 2, 3]) datasets[number] = (await findDataset(seeded.db, number))!
})
afterAll(() => seeded.drop())

const text = (dataset: Dataset, name: string) =>
  new TextDecoder('utf-8', { fatal: true }).decode(dataset.files.get(name)!.bytes)
const sums = (dataset: Dataset) => dataset.files.get('SHA256SUMS.txt')!.sha256

describe.each([1, 2, 3])('the downloads of edition %i', (number) => {
  const file = (name: string) => text(datasets[number]!, name)

  // Plain arithmetic from the standards Method 1 names, nothing of the product: tests/dataset.
  test('give every published figure and doubt again', () => {
    const { devices, shared, spreads } = recompute(file)
    const published = readCsv(file('figures.csv'))
    expect(devices.map(({ device }) => device).sort()).toEqual(published.map(({ device }) => device))
    for (const { device, values } of devices) {
      const row = published.find((one) => one.device === device)!
      const { device: _, within_limits, ...figures } = row
      // Every page is too dark for the limits CIE states.
      expect(within_limits).toBe('false')
      expect(Object.keys(values).sort()).toEqual(Object.keys(figures).sort())
      for (const [name, value] of Object.entries(values)) {
        // Frozen figures to their last digit: four decimals, or three; slopes by another step in the fourth.
        const decimals = /^(whiteness|tint|contrast)$/.test(name) ? 3 : 4
        const room = name.endsWith('_doubt') ? Math.max(1e-4, 2e-4 * value) : 0.500_001 * 10 ** -decimals
        expect(
          Math.abs(value - Number(figures[name])),
          `${device} ${name}: ${value} beside ${figures[name]}`,
        ).toBeLessThanOrEqual(room)
      }
    }
    const parts = new Map(readCsv(file('uncertainty.csv')).map((row) => [row.part, row]))
    const near = (part: string, lab: { L: number; a: number; b: number }) => {
      expect(lab.L, part).toBeCloseTo(Number(parts.get(part)!.l), 9)
      expect(lab.a, part).toBeCloseTo(Number(parts.get(part)!.a), 9)
      expect(lab.b, part).toBeCloseTo(Number(parts.get(part)!.b), 9)
    }
    near('session', shared.session)
    near('paper', shared.paper)
    for (const state of ['page', 'ink'] as const)
      for (const level of ['reading', 'position', 'unit'] as const) near(`${state}-${level}`, spreads[state][level])
  })

  test('give another figure where a single reading is another', () => {
    const rows = file('readings.csv')
    const [, , first] = /\r\n(\d+,\d+),([\d.]+),/.exec(rows)!
    const altered = rows.replace(`,${first},`, `,${Number(first) + 0.05},`)
    const { devices } = recompute((name) => (name === 'readings.csv' ? altered : file(name)))
    const published = readCsv(file('figures.csv'))
    const moved = devices.filter(({ device, values }) => {
      const row = published.find((one) => one.device === device)!
      return (
        Math.abs(values.page_l! - Number(row.page_l)) > 0.5e-4 || Math.abs(values.ink_l! - Number(row.ink_l)) > 0.5e-4
      )
    })
    expect(moved).toHaveLength(1)
  })

  test('say of each device how many units it was measured on', () => {
    const { devices } = recompute(file)
    const stated = new Map(readCsv(file('devices.csv')).map((row) => [row.device, row]))
    for (const { device, units } of devices) {
      expect(stated.get(device)).toMatchObject({ units: String(units), provisional: String(units === 1) })
    }
  })

  test('hold every reading of the sets they name, and every set the figures rest on', async () => {
    const counted = await seeded.db.execute<{ set: number; readings: number }>(
      sql`select readings.set_id as set, count(*)::int as readings from readings where set_id in (
            select unnest(set_ids) from edition_entries where edition = ${number}
          ) group by 1 order by 1`,
    )
    const rows = readCsv(file('readings.csv'))
    expect(readCsv(file('sets.csv')).map(({ set }) => Number(set))).toEqual(counted.map(({ set }) => set))
    expect(rows).toHaveLength(counted.reduce((sum, { readings }) => sum + readings, 0))
  })

  test('read back as the very numbers the database holds', async () => {
    const held = await seeded.db.execute<Record<string, number>>(
      sql`select set_id, ordinal, l_star, a_star, b_star from readings where set_id in (
            select unnest(set_ids) from edition_entries where edition = ${number}
          ) order by set_id, ordinal`,
    )
    const columns = ['set', 'ordinal', 'l', 'a', 'b']
    expect(readCsv(file('readings.csv')).map((row) => columns.map((name) => Number(row[name])))).toEqual(
      held.map((row) => Object.values(row)),
    )
  })

  test('name every row once, and only rows that are there', () => {
    for (const table of TABLES) {
      const rows = readCsv(file(`${table.name}.csv`))
      const keyOf = (row: Record<string, string>, columns: readonly string[]) =>
        columns.map((name) => row[name]).join('\n')
      expect(rows.length, table.name).toBe(datasets[number]!.rows[table.name])
      expect(new Set(rows.map((row) => keyOf(row, table.key))).size, table.name).toBe(rows.length)
      for (const { columns, table: other, to } of 'references' in table ? (table.references ?? []) : []) {
        const known = new Set(readCsv(file(`${other}.csv`)).map((row) => keyOf(row, to)))
        for (const row of rows)
          expect(known.has(keyOf(row, columns)), `${table.name}: ${keyOf(row, columns)}`).toBe(true)
      }
    }
  })

  test('say the same as CSV and as JSON', () => {
    for (const { name, columns } of TABLES) {
      const { rows, ...head } = JSON.parse(file(`${name}.json`)) as { rows: Record<string, unknown>[] }
      expect(head).toEqual({ edition: number, table: name })
      expect(readCsv(file(`${name}.csv`))).toEqual(
        rows.map((row) =>
          Object.fromEntries(
            columns.map((column) => [column.name, row[column.name] === null ? '' : String(row[column.name])]),
          ),
        ),
      )
    }
  })

  test('are known by the checksums beside them', () => {
    const lines = file('SHA256SUMS.txt').trimEnd().split('\n')
    expect(lines).toHaveLength(datasets[number]!.files.size - 1)
    for (const line of lines) {
      const [, sum, name] = /^([0-9a-f]{64}) {2}(\S+)$/.exec(line)!
      const { bytes, sha256 } = datasets[number]!.files.get(name!)!
      expect(createHash('sha256').update(bytes).digest('hex')).toBe(sum)
      expect(sha256).toBe(sum)
    }
  })

  test('are kept at the release, the same bytes as when they are written again', async () => {
    expect(sums(writeDataset((await findDatasetSource(seeded.db, number))!))).toBe(sums(datasets[number]!))
  })
})

describe('a released edition’s downloads stay as they are', () => {
  type Tx = Parameters<Parameters<typeof rollingBack>[1]>[0]
  const unchanged = (work: (tx: Tx) => Promise<unknown>) =>
    rollingBack(seeded.db, async (tx) => {
      await work(tx)
      for (const number of [1, 2, 3]) {
        expect(sums((await findDataset(tx, number))!)).toBe(sums(datasets[number]!))
        expect(sums(writeDataset((await findDatasetSource(tx, number))!))).toBe(sums(datasets[number]!))
      }
    })

  test('when one of their sets is withdrawn', () =>
    unchanged((tx) =>
      tx
        .update(sets)
        .set({ withdrawnAt: new Date(), withdrawnReason: 'the wrong unit' })
        .where(sql`withdrawn_at is null`),
    ))

  test('when an instrument is renamed, a session’s note is written, a spec or a price is put right', () =>
    unchanged(async (tx) => {
      await tx.update(instruments).set({ name: 'Another name', certificateUL: 1 })
      await tx.update(sessions).set({ note: 'Written later.' })
      await tx.update(specs).set({ source: 'another page' })
      await tx.update(prices).set({ amountMinor: 1 })
    }))

  test('when a new session is measured', () =>
    unchanged(async (tx) => {
      const [last] = await tx.select().from(sessions).where(eq(sessions.name, '2026-11-04-a'))
      const { id: _, ...rest } = last!
      await tx
        .insert(sessions)
        .values({ ...rest, name: 'later', startedAt: new Date('2026-11-25'), endedAt: new Date('2026-11-26') })
    }))

  test('even where a control written down late would change what they rest on: none are written anew then', () =>
    rollingBack(seeded.db, async (tx) => {
      const [first] = await tx.select().from(sessions).where(eq(sessions.name, '2025-09-24-a'))
      const { id: _, ...rest } = first!
      const [late] = await tx
        .insert(sessions)
        .values({ ...rest, name: 'late' })
        .returning()
      await tx.insert(controlReadings).values(
        [1, 2, 3].map((ordinal) => ({
          controlSampleId: 1,
          sessionId: late!.id,
          moment: 'start' as const,
          ordinal,
          lStar: 80,
          aStar: 0,
          bStar: 0,
        })),
      )
      expect(sums((await findDataset(tx, 1))!)).toBe(sums(datasets[1]!))
      await expect(findDatasetSource(tx, 1)).rejects.toThrow(/controls kept for edition 1/)
    }))

  test('by the database’s own rule, whoever asks for a change', async () => {
    for (const work of [
      (tx: Tx) => tx.update(editionFiles).set({ type: 'text/plain' }),
      (tx: Tx) => tx.delete(editionFiles),
      (tx: Tx) => tx.execute(sql`truncate edition_datasets cascade`),
      (tx: Tx) => tx.execute(sql`update edition_datasets set measured_to = '2030-01-01'`),
    ]) {
      const refused = rollingBack(seeded.db, async (tx) => void (await work(tx)))
      await expect(refused).rejects.toMatchObject({ cause: { message: expect.stringMatching(/never changes/) } })
    }
  })

  test('and each file’s checksum is held to its bytes', async () => {
    const wrong = rollingBack(seeded.db, async (tx) => {
      const file = { edition: 1, place: 99, name: 'x.csv', type: 'text/csv', bytes: new Uint8Array([1]), sha256: 'ab' }
      await tx.insert(editionFiles).values(file)
    })
    await expect(wrong).rejects.toMatchObject({ cause: { constraint_name: 'edition_files_sha256_of_bytes' } })
  })
})

test('an edition has its files once, and only those without are given any', async () => {
  await keepMissingDatasets(seeded.db)
  expect(sums((await findDataset(seeded.db, 2))!)).toBe(sums(datasets[2]!))
  await expect(rollingBack(seeded.db, (tx) => keepDataset(tx, 2))).rejects.toMatchObject({
    cause: { constraint_name: 'edition_datasets_pkey' },
  })
  await expect(rollingBack(seeded.db, (tx) => keepDataset(tx, 4))).rejects.toThrow('no edition 4')
})

test('an edition that was never released has no data set', async () => {
  expect(await findDatasetSource(seeded.db, 4)).toBeNull()
  expect(await findDataset(seeded.db, 4)).toBeNull()
})

test('the readings of a device are those its figures rest on, a flagged one among them', async () => {
  const edition = (await findEdition(seeded.db, 1))!
  const all = await Promise.all(edition.devices.map(({ slug }) => listDeviceReadings(seeded.db, 1, slug)))
  expect(all.flat()).toHaveLength(datasets[1]!.rows.readings!)
  expect(all.flat().filter(({ flag }) => flag === 'flagged')).toHaveLength(1)
  expect(await listDeviceReadings(seeded.db, 1, 'no-such-device')).toEqual([])
  expect(await listDeviceReadings(seeded.db, 4, edition.devices[0]!.slug)).toEqual([])
})
