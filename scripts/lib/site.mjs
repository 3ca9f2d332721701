import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { keepRunning, run } from './processes.mjs'
import { Trouble } from './steps.mjs'

const NEXT = 'node_modules/next/dist/bin/next'
const SOURCES = [
  'app',
  'components',
  'db',
  'lib',
  'public',
  'scripts/build-worker.mjs',
  'instrumentation.ts',
  'next.config.ts',
  'proxy.ts',
]
const SETTINGS = ['package-lock.json', 'postcss.config.mjs', 'tsconfig.json']

export const tsx = (file, env, args = []) => run(process.execPath, ['--import', 'tsx', file, ...args], { env })

/** A fingerprint of everything a build is made from. */
function fingerprint(flags) {
  const hash = createHash('sha256').update(JSON.stringify(flags))
  const add = (path) => {
    const entries = readdirSync(path, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1))
    for (const entry of entries) {
      const file = join(path, entry.name)
      if (entry.isDirectory()) add(file)
      else hash.update(file).update(readFileSync(file))
    }
  }
  for (const source of [...SOURCES, ...SETTINGS]) {
    if (source.includes('.')) hash.update(source).update(existsSync(source) ? readFileSync(source) : '')
    else add(source)
  }
  return hash.digest('hex')
}

/** Builds the site and its worker thread's code where the sources changed since the last build. */
export async function buildSite({ distDir, env = {} }) {
  const mark = join(distDir, 'lampleaf-sources')
  const wanted = fingerprint(env)
  if (existsSync(mark) && existsSync('build/match-worker.mjs') && readFileSync(mark, 'utf8') === wanted)
    return 'unchanged'
  await run(process.execPath, ['scripts/build-worker.mjs'])
  await run(process.execPath, [NEXT, 'build'], {
    env: { ...env, NEXT_DIST_DIR: distDir, NEXT_TELEMETRY_DISABLED: '1' },
  })
  writeFileSync(mark, wanted)
  return 'built'
}

/**
 * Starts one web process on loopback and waits until it answers.
 * @returns its address
 */
export async function startSite({ distDir, port, env, log, onExit }) {
  let words = ''
  const keep = (text) => {
    words = (words + text).slice(-4000)
    log?.(text)
  }
  let ended = null
  keepRunning(process.execPath, ['scripts/serve.mjs'], {
    env: {
      NODE_ENV: 'production',
      NEXT_TELEMETRY_DISABLED: '1',
      NEXT_DIST_DIR: distDir,
      HOST: '127.0.0.1',
      PORT: String(port),
      ...env,
    },
    log: keep,
    onExit: (code) => {
      ended = code
      onExit?.(code)
    },
  })
  const address = `http://127.0.0.1:${port}`
  for (const began = Date.now(); Date.now() - began < 60_000; ) {
    if (ended !== null) throw new Trouble(`The site stopped with ${ended} while starting.\n${words.trim()}`)
    const answer = await fetch(address, { redirect: 'manual' }).catch(() => null)
    if (answer) return address
    await new Promise((resolve) => setTimeout(resolve, 150))
  }
  throw new Trouble(`The site did not answer within a minute.\n${words.trim()}`)
}
