import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { drizzle } from 'drizzle-orm/postgres-js'
import { migrate } from 'drizzle-orm/postgres-js/migrator'
import postgres from 'postgres'

const FOLDER = join(import.meta.dirname, 'migrations')
/** Any number, so long as no other lock of ours has it. */
const LOCK = 7_150_001

type Journal = { entries: { tag: string; when: number }[] }

/**
 * Brings a database to the newest schema. Two runs at once are harmless: the second waits and finds nothing to do. The
 * migrator itself skips a file stamped earlier than the last applied one without a word, so the journal's times must
 * rise and the applied must be as many as the journal lists.
 * @returns how many were applied now and how many there are
 */
export async function migrateDatabase(url: string): Promise<{ applied: number; total: number }> {
  const { entries } = JSON.parse(readFileSync(join(FOLDER, 'meta', '_journal.json'), 'utf8')) as Journal
  requireRisingTimes(entries)
  const client = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => {}, connection: { application_name: 'lampleaf-migrate' } })
  try {
    await client`select pg_advisory_lock(${LOCK})`
    // Writers must not queue for long behind a change of a table: better to fail and be tried again.
    await client`set lock_timeout = '2s'`
    const before = await countApplied(client)
    await migrate(drizzle(client), { migrationsFolder: FOLDER })
    const after = await countApplied(client)
    if (after !== entries.length) throw new Error(`${after} migrations are applied, the journal lists ${entries.length}`)
    return { applied: after - before, total: after }
  } finally {
    await client.end()
  }
}

/** @throws Error where a migration is stamped no later than the one before it */
export function requireRisingTimes(entries: Journal['entries']): void {
  for (const [i, { tag, when }] of entries.entries()) {
    const previous = entries[i - 1]
    if (previous && when <= previous.when) throw new Error(`${tag} is stamped no later than ${previous.tag}`)
  }
}

async function countApplied(client: postgres.Sql): Promise<number> {
  const [table] = await client`select to_regclass('drizzle.__drizzle_migrations') as name`
  if (!table?.name) return 0
  const [row] = await client`select count(*)::int as count from drizzle.__drizzle_migrations`
  return row!.count
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const url = process.env.DATABASE_URL
  if (!url) throw new Error('DATABASE_URL is missing: the address of the PostgreSQL database')
  const { applied, total } = await migrateDatabase(url)
  console.log(applied === 0 ? `all ${total} migrations were applied already` : `${applied} of ${total} migrations applied`)
}
