import { expect, test } from 'vitest'
import { problemSchema } from '@/lib/contract/match-answer'
import { problem } from '@/lib/contract/problem'

// RFC 9457, section 3: media type and members; section 3.1.2: `status` repeats the status code.
test('a problem says its kind, title and status, names the fields, and is not stored', async () => {
  const answer = problem(400, 'The question is not understood', [{ field: 'spots', message: 'spots is missing.' }])
  expect(answer.status).toBe(400)
  expect(answer.headers.get('content-type')).toMatch(/^application\/problem\+json/)
  expect(answer.headers.get('cache-control')).toBe('no-store')
  expect(problemSchema.parse(await answer.json())).toEqual({
    type: 'tag:lampleaf.example,2026:problem/invalid-request',
    title: 'The question is not understood',
    status: 400,
    errors: [{ field: 'spots', message: 'spots is missing.' }],
  })
})

test('a problem carries the headers it is given', () => {
  expect(problem(503, 'Away', [], { 'retry-after': '10' }).headers.get('retry-after')).toBe('10')
})

// RFC 9457, section 4.2.1: "about:blank" says no more than the status code.
test('a status without a kind of its own is about:blank', async () => {
  expect((await problem(418, 'Teapot').json()).type).toBe('about:blank')
})
