// Bundles the code that worker threads run on the server into build/, where lib/server/match.ts expects it.
import { build } from 'esbuild'

await build({
  entryPoints: ['lib/server/match-worker.ts'],
  outfile: 'build/match-worker.mjs',
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  alias: { '@': process.cwd() },
  logLevel: 'warning',
})
