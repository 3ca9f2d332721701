import { createServer } from 'node:net'

/** Whether nobody listens on this loopback port. */
export function isFree(port) {
  return new Promise((resolve) => {
    const server = createServer()
    server.once('error', () => resolve(false))
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => server.close(() => resolve(true)))
  })
}

/** The first free loopback port from this one on. */
export async function freePort(from) {
  for (let port = from; port < from + 200; port++) if (await isFree(port)) return port
  throw new Error(`No free port between ${from} and ${from + 200}`)
}
