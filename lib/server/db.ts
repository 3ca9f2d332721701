import 'server-only'
import { connect } from '@/db/client'
import { config } from './config'
import { withDeadline } from './deadline'

const globals = globalThis as { lampleafDatabase?: ReturnType<typeof connect> }
// Development reloads modules; the connections must survive that or they pile up.
globals.lampleafDatabase ??= connect(config.databaseUrl, { max: config.databasePool, applicationName: 'lampleaf-web' })
const { db } = globals.lampleafDatabase

/** Milliseconds a page waits for the database before it says so. */
const READ_DEADLINE_MS = 5000

/**
 * Runs one read on the site's connection. The driver can leave a query unanswered for ever when the server goes away,
 * so every read has a deadline.
 * @throws DeadlineExceeded after five seconds; the driver's own error before that
 */
export function read<T>(query: (connection: typeof db) => Promise<T>): Promise<T> {
  return withDeadline(query(db), READ_DEADLINE_MS, 'The database did not answer')
}
