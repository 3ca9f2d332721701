import { OWN_PROCESS_HEADER, processKey } from './own-process.mjs'

/** House: how often a web process looks whether something new was published, milliseconds. */
const EVERY_MS = 10_000

/**
 * Looks now and then whether what the pages show has changed; then forgets the stored pages and fetches every public
 * page once, one after another, so that readers find them ready.
 * @param {string} origin the address of this process
 * @param {{ clear: () => void }} store
 * @returns {() => void} stops looking
 */
export function keepCurrent(origin, store, { everyMs = EVERY_MS } = {}) {
  const stopping = new AbortController()
  let timer

  async function look() {
    const answer = await fetch(`${origin}/api/internal/refresh`, {
      method: 'POST',
      headers: { [OWN_PROCESS_HEADER]: processKey() },
      signal: stopping.signal,
    })
    if (!answer.ok) return
    const { changed, paths } = await answer.json()
    if (!changed) return
    store.clear()
    for (const path of paths) {
      if (stopping.signal.aborted) return
      await fetch(origin + path, { signal: stopping.signal }).then((page) => page.arrayBuffer())
    }
  }

  async function again() {
    // The database may be away, or the process be going: the next look will tell.
    await look().catch(() => {})
    if (!stopping.signal.aborted) timer = setTimeout(again, everyMs).unref()
  }

  again()
  return () => {
    stopping.abort()
    clearTimeout(timer)
  }
}
