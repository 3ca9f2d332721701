import { expect, test } from 'vitest'
import { DeadlineExceeded, withDeadline } from '@/lib/server/deadline'

test('an answer in time is passed on', async () => {
  await expect(withDeadline(Promise.resolve('edition'), 1000, 'late')).resolves.toBe('edition')
})

test('a failure in time is passed on as it is', async () => {
  await expect(withDeadline(Promise.reject(new Error('refused')), 1000, 'late')).rejects.toThrow('refused')
})

test('a promise that never settles is given up with a word', async () => {
  const never = new Promise<never>(() => {})
  await expect(withDeadline(never, 20, 'The database did not answer')).rejects.toThrow(DeadlineExceeded)
  await expect(withDeadline(never, 20, 'The database did not answer')).rejects.toThrow(/did not answer within 20 ms/)
})
