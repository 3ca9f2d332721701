import { spawn } from 'node:child_process'
import { cpSync, mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'

type Outcome = { code: number | null; words: string }

function run(args: string[], options: { env?: Record<string, string>; cwd?: string; uid?: number } = {}) {
  return new Promise<Outcome>((resolve) => {
    const { env, cwd, uid } = options
    const child = spawn(process.execPath, args, { cwd, env: { ...process.env, ...env }, uid, gid: uid })
    let words = ''
    child.stdout.on('data', (chunk) => {
      words += chunk
    })
    child.stderr.on('data', (chunk) => {
      words += chunk
    })
    child.on('close', (code) => resolve({ code, words }))
  })
}

describe('npm start', () => {
  test.each(['abc', '0', '65536', '80.5'])('refuses PORT=%s and says what would be right', async (PORT) => {
    const { code, words } = await run(['scripts/start.mjs'], { env: { PORT } })
    expect(code).toBe(1)
    expect(words).toContain('must be a whole number from 1 to 65535')
  })

  test('says so before doing anything where the port is taken, and names a way out', async () => {
    const server = createServer()
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
    const port = (server.address() as { port: number }).port
    const { code, words } = await run(['scripts/start.mjs'], { env: { PORT: String(port) } })
    server.close()
    expect(code).toBe(1)
    expect(words).toContain(`Port ${port} is in use`)
    expect(words).toContain(`PORT=${port + 1} npm start`)
    expect(words).not.toContain('npm packages')
  })
})

describe('installing what Debian has', () => {
  let folder: string
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'lampleaf-'))
    cpSync('scripts/lib', folder, { recursive: true })
    // Somebody without any rights reads this copy, wherever the clone lies.
    cpSync('tests/fixtures/ensure-package.mjs', join(folder, 'ensure-package.mjs'))
  })
  afterAll(() => rmSync(folder, { recursive: true }))

  test('a file that is there needs nothing', async () => {
    const { code, words } = await run(['ensure-package.mjs', 'coreutils', '/bin/sh'], { cwd: folder })
    expect({ code, words: words.trim() }).toEqual({ code: 0, words: 'present' })
  })

  test('a user without rights is told the one line an administrator must run', async () => {
    const nobody = process.getuid?.() === 0 ? 65534 : undefined
    if (nobody) await run(['-e', `require('node:fs').chmodSync(${JSON.stringify(folder)}, 0o755)`])
    const args = ['ensure-package.mjs', 'lampleaf-not-a-package', '/nowhere/at/all', 'without-sudo']
    const { code, words } = await run(args, { cwd: folder, uid: nobody })
    expect(code).toBe(1)
    expect(words).toContain('An administrator must run:')
    expect(words).toContain('apt-get update && apt-get install -y --no-install-recommends lampleaf-not-a-package')
  })
})
