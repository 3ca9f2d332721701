import { execFile } from 'node:child_process'
import { promisify } from 'node:util'
import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { migrateDatabase } from '@/db/migrate'
import { listEditions } from '@/db/queries/editions'
import { loadDemo } from '@/seed/load'
import { connectToTests, createDatabase, createSeededDatabase } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
let fresh: Awaited<ReturnType<typeof createDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
  fresh = await createDatabase()
  await migrateDatabase(fresh.url)
})
afterAll(async () => {
  await seeded.drop()
  await fresh.drop()
})

/** The loader as `npm start` runs it. */
async function runLoader(databaseUrl: string, ...args: string[]) {
  const env = { ...process.env, DATABASE_URL: databaseUrl }
  const run = promisify(execFile)(process.execPath, ['--import', 'tsx', 'seed/load.ts', ...args], { env })
  return run.then(
    ({ stdout }) => ({ code: 0, words: stdout }),
    ({ code, stderr }) => ({ code: code as number, words: stderr as string }),
  )
}

const countRows = async () => {
  const [row] = await seeded.db.execute<{ rows: string }>(
    sql`select (select count(*) from makers) || ' ' || (select count(*) from readings) || ' ' || (select count(*) from editions) as rows`,
  )
  return row!.rows
}

test('a second load changes nothing and says so', async () => {
  const before = await countRows()
  expect(await loadDemo(seeded.db)).toBe(false)
  const again = await runLoader(seeded.url)
  expect(again).toMatchObject({ code: 1, words: expect.stringContaining('holds data already') })
  const ifEmpty = await runLoader(seeded.url, '--if-empty')
  expect(ifEmpty).toMatchObject({ code: 0, words: expect.stringContaining('already there') })
  expect(await countRows()).toBe(before)
})

test('the demo loads in under ten seconds, twice at once only once, and comes out the same every time', async () => {
  const one = connectToTests(fresh.url)
  const other = connectToTests(fresh.url)
  const started = performance.now()
  const loads = await Promise.all([loadDemo(one.db), loadDemo(other.db)])
  expect(performance.now() - started).toBeLessThan(10_000)
  expect(loads.sort()).toEqual([false, true])

  const fingerprints = async (db: typeof seeded.db) => (await listEditions(db)).map((edition) => edition.sha256)
  expect(await fingerprints(one.db)).toEqual(await fingerprints(seeded.db))
  expect(await fingerprints(one.db)).toHaveLength(3)
  await one.close()
  await other.close()
})

test('a database with anything of a maker’s in it is left alone', async () => {
  const { url, drop } = await createDatabase()
  await migrateDatabase(url)
  const { db, close } = connectToTests(url)
  await db.execute(sql`insert into makers (slug, name) values ('real', 'Real')`)
  expect(await loadDemo(db)).toBe(false)
  const [row] = await db.execute<{ count: number }>(sql`select count(*)::int as count from devices`)
  expect(row!.count).toBe(0)
  await close()
  await drop()
})
