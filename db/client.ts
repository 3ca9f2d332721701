import { drizzle, type PostgresJsQueryResultHKT } from 'drizzle-orm/postgres-js'
import type { PgDatabase } from 'drizzle-orm/pg-core'
import postgres from 'postgres'
import * as schema from './schema'

/** The database, or a transaction on it: every query takes either, first. */
export type Db = PgDatabase<PostgresJsQueryResultHKT, typeof schema>

/** Seconds until a connection that is not answered counts as failed. */
const CONNECT_TIMEOUT_S = 5
/** Seconds after which a connection nobody uses is given back. */
const IDLE_TIMEOUT_S = 60
/** Held by the server, in milliseconds: no query, lock or forgotten transaction lasts for ever. */
const TIMEOUTS = { statement_timeout: 15_000, lock_timeout: 5_000, idle_in_transaction_session_timeout: 15_000 }

/**
 * Opens a pool of connections; the first is made with the first query.
 * @param max connections at most; all processes together stay under the server's max_connections
 * @param applicationName how the server's own lists call us
 */
export function connect(url: string, { max = 10, applicationName }: { max?: number; applicationName: string }) {
  const client = postgres(url, {
    max,
    connect_timeout: CONNECT_TIMEOUT_S,
    idle_timeout: IDLE_TIMEOUT_S,
    prepare: true,
    onnotice: () => {},
    connection: { application_name: applicationName, ...TIMEOUTS },
  })
  return { db: drizzle(client, { schema }), close: () => client.end({ timeout: CONNECT_TIMEOUT_S }) }
}
