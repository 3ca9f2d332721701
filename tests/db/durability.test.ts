import { sql } from 'drizzle-orm'
import { afterAll, expect, test } from 'vitest'
import { connectToTests } from '@/tests/fixtures/db'

const { db, close } = connectToTests()
afterAll(close)

const show = async (name: string) => {
  const [row] = await db.execute<{ value: string }>(sql`select current_setting(${name}) as value`)
  return row!.value
}

// A crash cannot show these are off until it is too late. PostgreSQL 15 documentation, 20.5 and 30.1–30.2.
test.each(['fsync', 'full_page_writes', 'synchronous_commit', 'data_checksums'])('%s is on', async (name) => {
  expect(await show(name)).toBe('on')
})

test('no query, lock wait or forgotten transaction lasts for ever', async () => {
  for (const name of ['statement_timeout', 'lock_timeout', 'idle_in_transaction_session_timeout']) {
    expect(await show(name), name).toMatch(/^[1-9]\d*s$/)
  }
})

test('the server knows a connection by what it is for', async () => {
  expect(await show('application_name')).toBe('lampleaf-test')
})
