import { expect, test } from 'vitest'
import { lastChanged } from '@/lib/feeds/last-changed'

const now = new Date('2026-12-01T15:00:00Z')
const last = (...moments: string[]) =>
  lastChanged(
    moments.map((moment) => new Date(moment)),
    now,
  )?.toISOString()

test('the newest moment is when a document last changed', () => {
  expect(last('2026-02-27T09:00:00Z', '2026-11-20T09:00:00Z')).toBe('2026-11-20T09:00:00.000Z')
  expect(lastChanged([], now)).toBeNull()
})

// RFC 9110, 8.8.2.1: a date later than the answer's own is not sent.
test('a day counts to its end, and today to now, so a copy of this morning is never called good', () => {
  expect(last('2026-11-20T00:00:00Z')).toBe('2026-11-21T00:00:00.000Z')
  expect(last('2026-12-01T00:00:00Z')).toBe('2026-12-01T15:00:00.000Z')
  expect(last('2026-11-20T00:00:00Z', '2026-11-20T09:00:00Z')).toBe('2026-11-21T00:00:00.000Z')
})
