import { readFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { drizzle } from 'drizzle-orm/postgres-js'
import { migrate } from 'drizzle-orm/postgres-js/migrator'
import postgres from 'postgres'
import { keepMissingDatasets } from './editions/keep-dataset'
import * as schema from './schema'

const FOLDER = join(dirname(fileURLToPath(import.meta.url)), 'migrations')
/** Any fixed number: whoever migrates holds this advisory lock, so that two deployments do not run at once. */
const LOCK = 54329

/**
 * Brings a database to the newest migration, alone. The migrator skips a file whose time is older than the newest
 * applied one and still says success, so the journal's times and the number applied are checked here.
 * @returns how many migrations are applied now, and how many of them by this call
 * @throws Error where the journal's times do not rise, or not every migration is applied afterwards
 */
export async function migrateDatabase(url: string): Promise<{ applied: number; fresh: number }> {
  const journal = JSON.parse(readFileSync(join(FOLDER, 'meta', '_journal.json'), 'utf8')) as {
    entries: { tag: string; when: number }[]
  }
  journal.entries.forEach((entry, i) => {
    const before = journal.entries[i - 1]
    if (before && before.when >= entry.when) throw new Error(`Migration ${entry.tag} is dated before ${before.tag}`)
  })
  const client = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => {} })
  try {
    await client`select pg_advisory_lock(${LOCK})`
    // Writers must not queue for long behind a change of a table: better to fail here and be tried again.
    await client`set lock_timeout = '2s'`
    // Writers must not queue for long behind a change of a table: better to fail and be tried again.
    await client`set lock_timeout = '2s'`
    const before = await countApplied(client)
    await migrate(drizzle(client), { migrationsFolder: FOLDER })
    await keepMissingDatasets(drizzle(client, { schema }))
    const applied = await countApplied(client)
    if (applied !== journal.entries.length) {
      throw new Error(`${applied} migrations are applied, but the journal lists ${journal.entries.length}`)
    }
    return { applied, fresh: applied - before }
  } finally {
    // Ending the session gives the lock back, whatever happened.
    await client.end({ timeout: 5 })
  }
}

async function countApplied(client: postgres.Sql): Promise<number> {
  const [known] = await client`select to_regclass('drizzle.__drizzle_migrations') as name`
  if (!known?.name) return 0
  const [row] = await client`select count(*)::int as applied from drizzle.__drizzle_migrations`
  return row?.applied ?? 0
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const url = process.env.DATABASE_URL
  if (!url) throw new Error('DATABASE_URL is missing: the address of the PostgreSQL database to migrate')
  const { applied, fresh } = await migrateDatabase(url)
  console.log(fresh > 0 ? `${fresh} applied, ${applied} in all` : `up to date at ${applied}`)
}
