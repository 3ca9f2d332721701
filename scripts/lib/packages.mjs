import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { run } from './processes.mjs'

const MARK = 'node_modules/.lampleaf-lock'

/** Installs the npm packages of the lockfile where they are missing or of another lockfile. */
export async function ensurePackages() {
  const wanted = createHash('sha256').update(readFileSync('package-lock.json')).digest('hex')
  if (existsSync(MARK) && readFileSync(MARK, 'utf8') === wanted) return 'present'
  await run('npm', ['ci', '--ignore-scripts', '--no-audit', '--no-fund'])
  writeFileSync(MARK, wanted)
  return 'installed'
}
