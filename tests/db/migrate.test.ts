import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import postgres from 'postgres'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { migrateDatabase } from '@/db/migrate'
import { createDatabase } from '@/tests/fixtures/db'

const journal = JSON.parse(readFileSync(join('db', 'migrations', 'meta', '_journal.json'), 'utf8')) as {
  entries: { tag: string; when: number }[]
}
const total = journal.entries.length

let database: Awaited<ReturnType<typeof createDatabase>>
beforeEach(async () => {
  database = await createDatabase()
})
afterEach(() => database.drop())

test('an empty database is brought to the newest schema, and a second run changes nothing', async () => {
  expect(await migrateDatabase(database.url)).toEqual({ applied: total, fresh: total })
  expect(await migrateDatabase(database.url)).toEqual({ applied: total, fresh: 0 })
})

test('of runs at the same time one migrates and the others find it done', async () => {
  const runs = await Promise.all([1, 2, 3].map(() => migrateDatabase(database.url)))
  expect(runs.map((run) => run.fresh).sort()).toEqual([0, 0, total])
  expect(runs.every((run) => run.applied === total)).toBe(true)
})

// The migrator compares with the newest applied time only: a file stamped earlier would be skipped without a word.
test('the journal’s times rise', () => {
  const times = journal.entries.map((entry) => entry.when)
  expect(times).toEqual([...new Set(times)].sort((one, other) => one - other))
})

test('a database that has more migrations than this code knows is refused', async () => {
  await migrateDatabase(database.url)
  const sql = postgres(database.url, { max: 1 })
  const tomorrow = journal.entries.at(-1)!.when + 86_400_000
  await sql`insert into drizzle.__drizzle_migrations (hash, created_at) values ('of a later release', ${tomorrow})`
  await sql.end()
  await expect(migrateDatabase(database.url)).rejects.toThrow(`${total + 1} migrations are applied`)
})

test('a migration that has to wait behind a writer gives up within seconds rather than queue others behind it', async () => {
  const sql = postgres(database.url, { max: 1, onnotice: () => {} })
  // The migrator writes down each migration here, so whoever holds this table holds it up whatever it changes.
  await sql`create schema drizzle`
  await sql`create table drizzle.__drizzle_migrations (id serial primary key, hash text not null, created_at bigint)`
  const started = performance.now()
  await sql.begin(async (tx) => {
    await tx`lock table drizzle.__drizzle_migrations in exclusive mode`
    await expect(migrateDatabase(database.url)).rejects.toMatchObject({ cause: { code: '55P03' } })
  })
  expect(performance.now() - started).toBeLessThan(8000)
  await sql.end()
  expect(await migrateDatabase(database.url)).toEqual({ applied: total, fresh: total })
})
