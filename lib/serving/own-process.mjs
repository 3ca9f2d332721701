import { randomBytes, timingSafeEqual } from 'node:crypto'

// Made once for each process and never sent out of it: the site's code and the process around it share what is global.
const KEY = Symbol.for('lampleaf.processKey')

/** The header that carries the key of a request this very process sends to itself. */
export const OWN_PROCESS_HEADER = 'x-lampleaf-process'

/** The key of this process; made when it is first asked for. */
export function processKey() {
  globalThis[KEY] ??= randomBytes(32).toString('base64url')
  return globalThis[KEY]
}

/** Whether a request comes from this very process. */
export function isOwnProcess(given) {
  const [sent, known] = [Buffer.from(String(given ?? '')), Buffer.from(processKey())]
  return sent.length === known.length && timingSafeEqual(sent, known)
}
