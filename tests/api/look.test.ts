import { beforeAll, describe, expect, test, vi } from 'vitest'

let post: (request: Request) => Promise<Response>

beforeAll(async () => {
  vi.stubEnv('DATABASE_URL', 'postgres://nobody@127.0.0.1:1/none')
  vi.stubEnv('BASE_URL', 'https://lampleaf.example')
  post = (await import('@/app/look/route')).POST
})

const SITE = 'https://lampleaf.example'

function send(headers: Record<string, string>, body = 'theme=night') {
  const sent = {
    'content-type': 'application/x-www-form-urlencoded',
    'content-length': `${body.length}`,
    host: 'lampleaf.example',
    ...headers,
  }
  return post(new Request(`${SITE}/look`, { method: 'POST', headers: sent, body }))
}

describe('choosing a theme', () => {
  test('keeps it in a cookie and goes back to where one was, answers in the address included', async () => {
    const answer = await send({ origin: SITE, referer: `${SITE}/quiz/result?spots=80` })
    expect(answer.status).toBe(303)
    expect(answer.headers.get('location')).toBe('/quiz/result?spots=80')
    expect(answer.headers.get('set-cookie')).toBe(
      'look=night-metric; Path=/; Max-Age=31536000; SameSite=Lax; HttpOnly; Secure',
    )
  })

  test('goes where the form says one was, on this site alone', async () => {
    const back = async (path: string) =>
      (await send({ origin: SITE }, `theme=night&back=${encodeURIComponent(path)}`)).headers.get('location')
    expect(await back('/quiz?step=2&train=4')).toBe('/quiz?step=2&train=4')
    for (const elsewhere of [
      '//evil.example',
      'https://evil.example/',
      '/\\evil.example',
      '\\\\evil.example',
      'quiz',
      '',
    ]) {
      expect(await back(elsewhere), elsewhere).toBe('/')
    }
    expect(await back('/a\r\nSet-Cookie: x=1')).not.toMatch(/[\r\n]/)
  })

  test('“automatic” drops the cookie', async () => {
    const answer = await send({ origin: SITE }, 'theme=automatic')
    expect(answer.headers.get('set-cookie')).toContain('look=; Path=/; Max-Age=0')
    expect(answer.headers.get('location')).toBe('/')
  })

  test('units are chosen beside the theme, and each choice keeps the other', async () => {
    const inch = await send({ origin: SITE, cookie: 'a=1; look=night-metric' }, 'units=inch')
    expect(inch.headers.get('set-cookie')).toContain('look=night-inch;')
    const day = await send({ origin: SITE, cookie: 'look=night-inch' }, 'theme=day')
    expect(day.headers.get('set-cookie')).toContain('look=day-inch;')
    const automatic = await send({ origin: SITE, cookie: 'look=night-inch' }, 'theme=automatic')
    expect(automatic.headers.get('set-cookie')).toContain('look=auto-inch;')
    const junk = await send({ origin: SITE, cookie: 'look=<script>' }, 'units=inch')
    expect(junk.headers.get('set-cookie')).toContain('look=auto-inch;')
  })

  test.each(['units=furlongs', 'theme=sepia', 'theme=', 'colour=night', '{"theme":"night"}'])(
    '%s is refused with the values that would do',
    async (body) => {
      const answer = await send({ origin: SITE }, body)
      expect(answer.status).toBe(400)
      expect(await answer.text()).toContain('day, night, paper or automatic')
      expect(answer.headers.get('set-cookie')).toBeNull()
    },
  )

  test('a body larger than any form of ours is refused unread', async () => {
    expect((await send({ origin: SITE, 'content-length': '2000000' })).status).toBe(413)
  })
})

describe('where the form came from', () => {
  // Origin, then Sec-Fetch-Site, then Referer: the first that is there decides.
  test.each([
    ['another site', { origin: 'https://elsewhere.example' }, 403],
    ['an opaque origin', { origin: 'null', referer: `${SITE}/` }, 403],
    ['another port of this host', { origin: 'https://lampleaf.example:8443' }, 403],
    ['another site, by fetch metadata', { 'sec-fetch-site': 'cross-site', referer: `${SITE}/` }, 403],
    ['a neighbour subdomain, by fetch metadata', { 'sec-fetch-site': 'same-site' }, 403],
    ['another site, by referer', { referer: 'https://elsewhere.example/lampleaf.example' }, 403],
    ['a referer that is no address', { referer: 'lampleaf.example' }, 403],
    ['nobody says where', {}, 403],
    ['this site, by origin', { origin: SITE }, 303],
    ['this site, by fetch metadata', { 'sec-fetch-site': 'same-origin' }, 303],
    ['this site, by the referer of an old browser', { referer: `${SITE}/devices` }, 303],
    ['the host the request was sent to', { origin: 'http://127.0.0.1:3000', host: '127.0.0.1:3000' }, 303],
  ])('%s', async (_, headers, status) => {
    expect((await send(headers as Record<string, string>)).status).toBe(status)
  })

  test.each([
    ['https://elsewhere.example/quiz', '/'],
    [`${SITE}//elsewhere.example/quiz`, '/'],
    [`${SITE}/devices?sort=L`, '/devices?sort=L'],
  ])('from %s one is sent to %s', async (referer, location) => {
    expect((await send({ origin: SITE, referer })).headers.get('location')).toBe(location)
  })
})
