import { gzipSync } from 'node:zlib'

/**
 * The scripts a page loads in a fresh browser until the network is quiet, its workers' among them, as gzip sends them.
 * @param page a Playwright page of a context of its own
 * @returns bytes of all scripts, gzip at its usual level 6
 */
export async function scriptBytes(page, url) {
  const scripts = new Map()
  const take = (answer) => {
    const type = answer.headers()['content-type'] ?? ''
    if (/javascript/.test(type) && answer.ok()) scripts.set(answer.url(), answer.body())
  }
  page.context().on('response', take)
  await page.goto(url, { waitUntil: 'networkidle' })
  page.context().off('response', take)
  const bodies = await Promise.all(scripts.values())
  return bodies.reduce((sum, body) => sum + gzipSync(body).length, 0)
}
