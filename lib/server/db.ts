import 'server-only'
import { connect, type Db } from '@/db/client'
import { noteOutage } from '@/lib/serving/outage.mjs'
import { config } from './config'
import { withDeadline } from './deadline'
import { isOutage } from './outage'

const globals = globalThis as { lampleafDatabase?: ReturnType<typeof connect> }

function connection(): Db {
  const { databaseUrl, databasePool } = config()
  // Development reloads modules; the connections must survive that or they pile up.
  globals.lampleafDatabase ??= connect(databaseUrl, { max: databasePool, applicationName: 'lampleaf-web' })
  return globals.lampleafDatabase.db
}

/** Milliseconds a page waits for the database before it says so. */
const READ_DEADLINE_MS = 5000

/**
 * Runs one read on the site's connection. The driver can leave a query unanswered for ever when the server goes away,
 * so every read has a deadline.
 * @throws DeadlineExceeded after five seconds; the driver's own error before that
 */
export async function read<T>(query: (db: Db) => Promise<T>): Promise<T> {
  try {
    return await withDeadline(query(connection()), READ_DEADLINE_MS, 'The database did not answer')
  } catch (error) {
    // The process around the site answers 503 then; a page cannot.
    if (isOutage(error)) noteOutage()
    throw error
  }
}
