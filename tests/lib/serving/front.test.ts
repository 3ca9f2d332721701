import { createServer, type IncomingMessage, request, type Server, type ServerResponse } from 'node:http'
import { type AddressInfo, connect } from 'node:net'
import { brotliDecompressSync, gunzipSync } from 'node:zlib'
import { afterEach, expect, test } from 'vitest'
import { frontOf } from '@/lib/serving/front.mjs'
import { noteOutage } from '@/lib/serving/outage.mjs'
import { createPageStore } from '@/lib/serving/page-store.mjs'

// Statuses, ETag, Vary and conditional requests by RFC 9110; a fake site stands behind the front.

const FOR_ALL = { 'Cache-Control': 's-maxage=60', 'Content-Type': 'text/html; charset=utf-8' }
const PAGE = `<!doctype html><h1>A page</h1>${'words '.repeat(500)}`
let server: Server | undefined
let clock = 0

type Site = (request: IncomingMessage, response: ServerResponse) => void

async function behindFront(site: Site): Promise<number> {
  const store = createPageStore({ now: () => clock, freshMs: 1000 })
  server = createServer(frontOf(site, store))
  await new Promise<void>((resolve) => server?.listen(0, '127.0.0.1', resolve))
  return (server.address() as AddressInfo).port
}

afterEach(async () => {
  await new Promise((resolve) => (server ? server.close(resolve) : resolve(null)))
  server = undefined
  clock = 0
})

type Answer = { status: number; headers: IncomingMessage['headers']; body: Buffer }

function ask(port: number, path: string, headers: Record<string, string> = {}, method = 'GET'): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const sent = request({ port, host: '127.0.0.1', path, method, headers, agent: false }, (response) => {
      const chunks: Buffer[] = []
      response.on('data', (chunk) => chunks.push(chunk))
      response.on('end', () =>
        resolve({ status: response.statusCode ?? 0, headers: response.headers, body: Buffer.concat(chunks) }),
      )
    })
    sent.on('error', reject)
    sent.end()
  })
}

function counted(answer: Site): { site: Site; asked: string[] } {
  const asked: string[] = []
  return {
    asked,
    site: (incoming, response) => {
      asked.push(`${incoming.method} ${incoming.url} ${incoming.headers['accept-encoding'] ?? ''}`)
      answer(incoming, response)
    },
  }
}

test('a page for everybody is asked for once and given out from memory, squeezed as the reader prefers', async () => {
  const { site, asked } = counted((_, response) => response.writeHead(200, FOR_ALL).end(PAGE))
  const port = await behindFront(site)
  const first = await ask(port, '/method')
  expect(first.body.toString()).toBe(PAGE)
  expect(gunzipSync((await ask(port, '/method', { 'accept-encoding': 'gzip' })).body).toString()).toBe(PAGE)
  const br = await ask(port, '/method', { 'accept-encoding': 'gzip, br' })
  expect(br.headers['content-encoding']).toBe('br')
  expect(brotliDecompressSync(br.body).toString()).toBe(PAGE)
  expect((await ask(port, '/method', {}, 'HEAD')).body).toHaveLength(0)
  expect(asked).toEqual(['GET /method '])
})

test('whoever has the page already is told so, and everything on the way learns that it varies by cookie', async () => {
  const port = await behindFront((_, response) => response.writeHead(200, { ...FOR_ALL, Vary: 'RSC' }).end(PAGE))
  const { headers } = await ask(port, '/about')
  expect(headers.vary).toBe('RSC, Cookie')
  const again = await ask(port, '/about', { 'if-none-match': `"other", ${headers.etag}` })
  expect(again.status).toBe(304)
  expect(again.body).toHaveLength(0)
  expect((await ask(port, '/about', { 'if-none-match': '"other"' })).status).toBe(200)
})

test('each look has its own stored page', async () => {
  const port = await behindFront((incoming, response) =>
    response.writeHead(200, FOR_ALL).end(incoming.headers.cookie ?? 'none'),
  )
  expect((await ask(port, '/', { cookie: 'a=b; look=night-metric' })).body.toString()).toContain('night')
  expect((await ask(port, '/')).body.toString()).toBe('none')
  expect((await ask(port, '/', { cookie: 'look=night-metric' })).body.toString()).toContain('a=b')
})

test('a page for one reader is never stored: no shared maximum age, or a cookie set', async () => {
  let number = 0
  const port = await behindFront((incoming, response) => {
    number += 1
    const own = incoming.url === '/account'
    response.writeHead(200, own ? { 'Cache-Control': 'private, no-store' } : { ...FOR_ALL, 'Set-Cookie': 'sid=1' })
    response.write(`answer `)
    response.end(String(number))
  })
  expect((await ask(port, '/account')).body.toString()).toBe('answer 1')
  expect((await ask(port, '/account')).body.toString()).toBe('answer 2')
  expect((await ask(port, '/welcome')).body.toString()).toBe('answer 3')
  expect((await ask(port, '/welcome')).body.toString()).toBe('answer 4')
})

test('an address with a query, a fetch by the router and the machine’s addresses pass through', async () => {
  const { site, asked } = counted((_, response) => response.writeHead(200, FOR_ALL).end(PAGE))
  const port = await behindFront(site)
  for (const [path, headers] of [
    ['/devices?sort=price', {}],
    ['/devices', { rsc: '1' }],
    ['/api/v1/editions', {}],
    ['/feed.xml', {}],
  ] as const) {
    await ask(port, path, headers)
    await ask(port, path, headers)
  }
  expect(asked).toHaveLength(8)
})

test('an old page is given out while one request fetches it anew, and when the site fails', async () => {
  let fails = false
  let number = 0
  const port = await behindFront((_, response) => {
    number += 1
    if (fails) return response.writeHead(500, { 'Content-Type': 'text/html' }).end('broken')
    return response.writeHead(200, FOR_ALL).end(`version ${number}`)
  })
  expect((await ask(port, '/')).body.toString()).toBe('version 1')
  clock = 5000
  expect((await ask(port, '/')).body.toString()).toBe('version 2')
  clock = 10_000
  fails = true
  const stale = await ask(port, '/')
  expect([stale.status, stale.body.toString()]).toEqual([200, 'version 2'])
})

test('while something behind the site is away a page says so with 503, without a script, and any other fault is 500', async () => {
  const port = await behindFront((incoming, response) => {
    if (incoming.url?.startsWith('/quiz')) noteOutage()
    response.writeHead(500, { 'Content-Type': 'text/html' }).end('<p>made with scripts</p>')
  })
  const away = await ask(port, '/quiz?step=2')
  expect(away.status).toBe(503)
  expect(away.headers['retry-after']).toMatch(/^\d+$/)
  expect(away.headers['content-security-policy']).toContain("script-src 'self';")
  expect(away.body.toString()).toContain('Reload this page')
  expect(away.body.toString()).not.toContain('<script')
  await new Promise((resolve) => setTimeout(resolve, 5))
  expect((await ask(port, '/method')).status).toBe(500)
})

test('unknown methods, unreadable addresses and forged inner headers stop here', async () => {
  let seen: IncomingMessage['headers'] = {}
  const port = await behindFront((incoming, response) => {
    seen = incoming.headers
    response.writeHead(200, FOR_ALL).end('x')
  })
  const trace = await ask(port, '/', {}, 'TRACE')
  expect(trace.status).toBe(405)
  expect(trace.headers.allow).toContain('GET')
  expect((await ask(port, '/devices/%E0%A4%A')).status).toBe(400)
  await ask(port, '/x', {
    'x-middleware-subrequest': 'proxy',
    'x-nextjs-data': '1',
    'content-security-policy': 'x',
    a: 'b',
  })
  expect(seen).toMatchObject({ a: 'b' })
  expect(Object.keys(seen).filter((name) => /^x-|^content-sec/.test(name))).toEqual([])
})

test('a page is read and nothing else; the form that chooses a look may be posted, and handlers judge for themselves', async () => {
  const { site, asked } = counted((_, response) => response.writeHead(200, FOR_ALL).end('x'))
  const port = await behindFront(site)
  for (const method of ['POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']) {
    const answer = await ask(port, '/devices', {}, method)
    expect([answer.status, answer.headers.allow]).toEqual([405, 'GET, HEAD'])
  }
  expect(asked).toEqual([])
  expect((await ask(port, '/look', {}, 'POST')).status).toBe(200)
  expect((await ask(port, '/api/v1/match', {}, 'POST')).status).toBe(200)
})

test('a reader who leaves half-way harms nobody', async () => {
  const port = await behindFront((_, response) => {
    setTimeout(() => response.writeHead(200, FOR_ALL).end(PAGE), 20)
  })
  const socket = connect(port, '127.0.0.1', () => socket.end('GET / HTTP/1.1\r\nHost: x\r\n\r\n'))
  socket.destroy()
  expect((await ask(port, '/')).status).toBe(200)
})
