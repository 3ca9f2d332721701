// `npm run check`: types, format and lint (forbidden imports among its rules), purity of the core, dead code.
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { run, stopEverything } from './lib/processes.mjs'

const CORE = ['lib/colour', 'lib/vision', 'lib/stats', 'lib/method']

/** Chance and the clock are arguments in the core, never looked up. */
function checkPurity() {
  const found = []
  for (const folder of CORE) {
    for (const name of readdirSync(folder, { recursive: true })) {
      if (!/\.tsx?$/.test(name)) continue
      const file = join(folder, name)
      readFileSync(file, 'utf8')
        .split('\n')
        .forEach((line, i) => {
          if (/Math\.random|Date\.now|new Date\(\)|performance\.now|process\.env|crypto\./.test(line))
            found.push(`${file}:${i + 1}: ${line.trim()}`)
        })
    }
  }
  if (found.length > 0)
    throw Object.assign(new Error('The core reached for chance, clock or environment'), { output: found.join('\n') })
}

const bin = (name) => join('node_modules', '.bin', name)
export const CHECKS = [
  { name: 'The types hold', work: () => run(bin('tsc'), ['--noEmit', '-p', '.']) },
  {
    name: 'Format, lint and forbidden imports are clean',
    work: () => run(bin('biome'), ['ci', '--colors=off', '--error-on-warnings', '.']),
  },
  { name: 'The core is pure', work: checkPurity },
  { name: 'No code is dead', work: () => run(bin('knip'), ['--no-progress']) },
]

/** Runs each check; says which failed and why. */
export async function runChecks() {
  let passed = 0
  for (const { name, work } of CHECKS) {
    try {
      await work()
      passed++
      console.log(`✓ ${name}`)
    } catch (error) {
      console.log(`✗ ${name}\n${error.output ?? error.message}`)
    }
  }
  return { passed, failed: CHECKS.length - passed }
}

if (process.argv[1]?.endsWith('check.mjs')) {
  const { failed } = await runChecks()
  await stopEverything()
  process.exit(failed ? 1 : 0)
}
