import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { keepRunning, run } from './processes.mjs'
import { Trouble } from './steps.mjs'

const NEXT = 'node_modules/next/dist/bin/next'
const FOLDER = 'tests/bench/bare'
const ENV = { NEXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' }

/** Builds the bare application anew; `removeBare` takes the build away again. */
export const buildBare = () => run(process.execPath, [NEXT, 'build', FOLDER], { env: ENV })
export const removeBare = () => rmSync(join(FOLDER, '.next-bare'), { recursive: true, force: true })

/**
 * Starts the bare application on loopback and waits until it answers.
 * @returns its address
 */
export async function startBare(port) {
  let words = ''
  keepRunning(process.execPath, [NEXT, 'start', FOLDER, '-H', '127.0.0.1', '-p', String(port)], {
    env: ENV,
    log: (text) => {
      words = (words + text).slice(-4000)
    },
  })
  const address = `http://127.0.0.1:${port}`
  for (const began = Date.now(); Date.now() - began < 30_000; ) {
    if (await fetch(`${address}/pad/0`).catch(() => null)) return address
    await new Promise((resolve) => setTimeout(resolve, 150))
  }
  throw new Trouble(`The bare application did not answer within half a minute.\n${words.trim()}`)
}

/**
 * The path of a bare page with the bytes of another. Its length is a straight line over its words, so two lengths tell
 * the number; every word stands in it twice, as in any page of such an application.
 */
export async function bareOfSize(address, bytes) {
  const length = async (words) => (await (await fetch(`${address}/pad/${words}`)).arrayBuffer()).byteLength
  const [none, many] = [await length(0), await length(20_000)]
  const path = `/pad/${Math.max(0, Math.round((bytes - none) / ((many - none) / 20_000)))}`
  const own = await length(path.split('/')[2])
  if (Math.abs(own - bytes) > 0.02 * bytes && own > none)
    throw new Trouble(`A bare page of ${bytes} bytes came out with ${own}`)
  return path
}
