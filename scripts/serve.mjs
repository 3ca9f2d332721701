// One web process: the built site with our front before it. PORT, HOST, NEXT_DIST_DIR and the site's own variables.
import { createServer } from 'node:http'
import next from 'next'
import { frontOf } from '../lib/serving/front.mjs'
import { keepCurrent } from '../lib/serving/keep-current.mjs'
import { createPageStore } from '../lib/serving/page-store.mjs'
import { squeezed } from '../lib/serving/squeeze.mjs'

const hostname = process.env.HOST ?? '127.0.0.1'
const port = Number(process.env.PORT ?? 3000)

const app = next({ dev: false, dir: process.cwd(), hostname, port })
await app.prepare()

const store = createPageStore()
const server = createServer(frontOf(squeezed(app.getRequestHandler()), store))
// A slow sender must not hold a place for ever; a proxy in front keeps its connections open longer than we do.
server.headersTimeout = 15_000
server.requestTimeout = 30_000
server.keepAliveTimeout = 65_000
let stopLooking = () => {}
server.listen(port, hostname, () => {
  console.log(`Listening on http://${hostname}:${port}`)
  const self = hostname === '0.0.0.0' || hostname === '::' ? '127.0.0.1' : hostname
  stopLooking = keepCurrent(`http://${self}:${port}`, store)
})

/** Finishes what has begun, then goes; whoever holds a connection open without asking anything is let go at once. */
function stop() {
  stopLooking()
  server.close(() => process.exit(0))
  server.closeIdleConnections()
  setTimeout(() => process.exit(0), 8000).unref()
}
process.once('SIGTERM', stop)
process.once('SIGINT', stop)
