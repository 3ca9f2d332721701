import type { PgDatabase } from 'drizzle-orm/pg-core'
import { drizzle, type PostgresJsQueryResultHKT } from 'drizzle-orm/postgres-js'
import postgres from 'postgres'
import * as schema from './schema'

/** A connection to query through: the pool, or a transaction of it. */
export type Db = PgDatabase<PostgresJsQueryResultHKT, typeof schema>

/**
 * Opens a pool. Statements, lock waits and forgotten transactions end by themselves, so that one slow query cannot
 * hold a page, nor one forgotten transaction the rest.
 * @param max connections of this process; all processes together stay under the server's max_connections
 */
export function connect(url: string, { max, applicationName }: { max: number; applicationName: string }) {
  const client = postgres(url, {
    max,
    connect_timeout: 5,
    idle_timeout: 60,
    max_lifetime: 30 * 60,
    onnotice: () => {},
    connection: {
      application_name: applicationName,
      statement_timeout: 15_000,
      lock_timeout: 5_000,
      idle_in_transaction_session_timeout: 30_000,
    },
  })
  return { db: drizzle(client, { schema }) as Db, close: () => client.end({ timeout: 5 }) }
}
