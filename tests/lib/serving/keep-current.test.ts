import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { afterEach, expect, test } from 'vitest'
import { keepCurrent } from '@/lib/serving/keep-current.mjs'
import { isOwnProcess, OWN_PROCESS_HEADER } from '@/lib/serving/own-process.mjs'

let server: Server | undefined
let stop = () => {}

afterEach(async () => {
  stop()
  server?.closeAllConnections()
  await new Promise((resolve) => (server ? server.close(resolve) : resolve(null)))
})

/** A site whose pages change when told; it notes what it is asked for, in order. */
async function site(changes: (boolean | 'away')[]) {
  const asked: string[] = []
  server = createServer((request, response) => {
    asked.push(`${request.method} ${request.url}`)
    if (request.url !== '/api/internal/refresh') return response.end('page')
    const changed = changes.shift()
    if (!isOwnProcess(request.headers[OWN_PROCESS_HEADER])) return response.writeHead(404).end()
    if (changed === 'away') return response.writeHead(500).end()
    return response.end(JSON.stringify({ changed: changed ?? false, paths: ['/', '/devices'] }))
  })
  await new Promise<void>((resolve) => server?.listen(0, '127.0.0.1', resolve))
  return { asked, origin: `http://127.0.0.1:${(server.address() as AddressInfo).port}` }
}

test('after a release the stored pages are forgotten and every public page is fetched once, and then no more', async () => {
  const { asked, origin } = await site([true, false, 'away', true])
  let cleared = 0
  stop = keepCurrent(origin, { clear: () => cleared++ }, { everyMs: 10 })
  await expect.poll(() => cleared).toBe(2)
  await expect.poll(() => asked.filter((line) => line === 'GET /devices').length).toBe(2)
  const first = asked.indexOf('GET /')
  expect(asked.slice(0, first + 2)).toEqual(['POST /api/internal/refresh', 'GET /', 'GET /devices'])
})

test('only this very process is let in', () => {
  expect(isOwnProcess('')).toBe(false)
  expect(isOwnProcess(undefined)).toBe(false)
  expect(isOwnProcess('a'.repeat(43))).toBe(false)
})
