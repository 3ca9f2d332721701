// `npm start`: from a clone to a running site with the demo data. Every step is safe to repeat.
import { ensurePackages } from './lib/packages.mjs'
import { isFree } from './lib/ports.mjs'
import { ensureDatabase, ensurePostgres, startCluster } from './lib/postgres.mjs'
import { stopEverything, stopOnSignals } from './lib/processes.mjs'
import { buildSite, startSite, tsx } from './lib/site.mjs'
import { sayAndExit, step, Trouble } from './lib/steps.mjs'

const port = Number(process.env.PORT || 3000)
const outside = process.env.DATABASE_URL

async function start() {
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new Trouble(`PORT is ${process.env.PORT}. It must be a whole number from 1 to 65535.`)
  }
  if (!(await isFree(port))) {
    throw new Trouble(`Port ${port} is in use. Stop what runs there, or choose another: PORT=${port + 1} npm start`)
  }
  await step('npm packages', ensurePackages)
  const databaseUrl = outside || (await ownDatabase())
  const env = {
    DATABASE_URL: databaseUrl,
    LAMPLEAF_DEMO: process.env.LAMPLEAF_DEMO || '1',
    BASE_URL: process.env.BASE_URL || `http://127.0.0.1:${port}`,
  }
  await step('Migrations', async () => lastLine(await tsx('db/migrate.ts', env)))
  if (env.LAMPLEAF_DEMO === '1') {
    await step('Demo data', async () => lastLine(await tsx('seed/load.ts', env, ['--if-empty'])))
  }
  await step('Build', () => buildSite({ distDir: '.next' }))
  let isUp = false
  const address = await step('Site', () =>
    startSite({ distDir: '.next', port, env, log: (text) => isUp && process.stderr.write(text), onExit: siteStopped }),
  )
  isUp = true
  console.log(`\nLampleaf is at ${address}\nPress Ctrl-C to stop it and everything it started.`)
}

async function ownDatabase() {
  await step('Debian’s PostgreSQL', ensurePostgres)
  let server
  await step('Database server', async () => {
    server = await startCluster()
    return server.note
  })
  let url
  await step('Database', async () => {
    url = await ensureDatabase(server.url, 'lampleaf')
  })
  return url
}

const lastLine = (text) => text.trim().split('\n').at(-1) ?? ''

async function siteStopped(code) {
  console.error(`The site stopped by itself with ${code}.`)
  await stopEverything()
  process.exit(1)
}

stopOnSignals()
start().catch(async (error) => {
  await stopEverything()
  sayAndExit(error)
})
