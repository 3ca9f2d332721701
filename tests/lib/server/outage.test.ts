import { describe, expect, test } from 'vitest'
import { DeadlineExceeded } from '@/lib/server/deadline'
import { isOutage } from '@/lib/server/outage'

const coded = (code: string) => Object.assign(new Error('words'), { code })

// SQLSTATE classes: PostgreSQL 15 manual, appendix A. The rest are Node's and the driver's own codes.
describe('the machine’s failures are told from ours', () => {
  test.each([
    ['a refused connection', coded('ECONNREFUSED'), true],
    ['one address of two refused', new AggregateError([coded('ECONNREFUSED'), coded('ECONNREFUSED')]), true],
    ['a connection closed under a query', coded('CONNECTION_CLOSED'), true],
    ['a server shutting down', coded('57P01'), true],
    ['a server starting', coded('57P03'), true],
    ['no connection left', coded('53300'), true],
    ['a statement that took too long', coded('57014'), true],
    ['no answer within the deadline', new DeadlineExceeded('late'), true],
    ['the same, wrapped by the query builder', new Error('Failed query', { cause: coded('ECONNREFUSED') }), true],
    ['a table that is missing', coded('42P01'), false],
    ['a number too large for its column', coded('22003'), false],
    ['a bug', new TypeError('undefined is not a function'), false],
    ['nothing at all', undefined, false],
  ])('%s', (_, error, outage) => {
    expect(isOutage(error)).toBe(outage)
  })

  test('an error that names itself as its cause ends the search', () => {
    const error = new Error('round')
    error.cause = error
    expect(isOutage(error)).toBe(false)
  })
})
