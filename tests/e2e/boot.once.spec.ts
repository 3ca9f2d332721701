import { spawn } from 'node:child_process'
import { expect, test } from '@playwright/test'

/** Starts a web process of the tests' build with exactly these variables and waits for its end. */
function boot(env: Record<string, string>): Promise<{ code: number | null; words: string }> {
  return new Promise((resolve) => {
    const args = ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', '3999']
    const child = spawn(process.execPath, args, {
      env: { PATH: process.env.PATH ?? '', NODE_ENV: 'production', NEXT_DIST_DIR: '.next-test', ...env },
    })
    let words = ''
    child.stdout.on('data', (chunk) => {
      words += chunk
    })
    child.stderr.on('data', (chunk) => {
      words += chunk
    })
    const giveUp = setTimeout(() => child.kill('SIGKILL'), 20_000)
    child.on('close', (code) => {
      clearTimeout(giveUp)
      resolve({ code, words })
    })
  })
}

test('outside the demo a web process without a base URL refuses to start and names the variable', async () => {
  const { code, words } = await boot({ DATABASE_URL: 'postgres://nobody@127.0.0.1:9/none' })
  expect(code).toBe(1)
  expect(words).toContain('BASE_URL: is missing')
})

test('a web process without a database refuses to start and names the variable', async () => {
  const { code, words } = await boot({ BASE_URL: 'https://pages.example' })
  expect(code).toBe(1)
  expect(words).toContain('DATABASE_URL: is missing')
})
