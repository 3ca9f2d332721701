// The site's code and the process around it are bundled apart, and share only what is global.
const KEY = Symbol.for('lampleaf.lastOutage')

/** Notes that something behind the site did not answer. */
export function noteOutage() {
  globalThis[KEY] = Date.now()
}

/** Whether anything behind the site has failed to answer since this time, milliseconds. */
export function outageSince(time) {
  return (globalThis[KEY] ?? 0) >= time
}
