import { describe, expect, test } from 'vitest'
import { answering } from '@/app/api/answering'
import { only } from '@/app/api/methods'

const ask = (method: string, answer: () => Promise<Response>) =>
  answering(answer)(new Request('http://guide.example/', { method }))

describe('a page of another site', () => {
  test('may read what is read, and what went wrong', async () => {
    for (const answer of [
      async () => Response.json({}),
      async () => Promise.reject(Object.assign(new Error('away'), { code: 'ECONNREFUSED' })),
    ]) {
      const { headers } = await ask('GET', answer)
      expect(headers.get('access-control-allow-origin')).toBe('*')
      expect(headers.get('access-control-expose-headers')).toMatch(/Content-Range.*ETag.*Link/)
    }
  })

  test('may not read what was asked by POST, and never with credentials', async () => {
    const { headers } = await ask('POST', async () => Response.json({}))
    expect([...headers.keys()].filter((name) => name.startsWith('access-control'))).toEqual([])
    expect((await only('POST').options()).headers.get('access-control-allow-origin')).toBeNull()
    expect((await only('GET', 'HEAD').options()).headers.get('access-control-allow-credentials')).toBeNull()
  })

  test('that asks first is told what it may send', async () => {
    const { headers, status } = await only('GET', 'HEAD').options()
    expect(status).toBe(204)
    expect(Object.fromEntries(headers)).toMatchObject({
      allow: 'GET, HEAD, OPTIONS',
      'access-control-allow-origin': '*',
      'access-control-allow-methods': 'GET, HEAD',
    })
    for (const name of ['Range', 'If-Range', 'If-None-Match'])
      expect(headers.get('access-control-allow-headers')).toContain(name)
  })
})
