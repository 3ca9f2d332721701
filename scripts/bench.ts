import { drawFits } from '@/lib/method/draws'
import { errorSource } from '@/lib/method/errors'
import { type Prepared, prepareAnswers, scoreDevice } from '@/lib/method/fit'
import { rankByFit } from '@/lib/method/ranking'
import { rankDraws, tooClose } from '@/lib/method/tally'
import type { Edition } from '@/lib/method/types'
import { makeAnswers, syntheticEdition } from '@/tests/fixtures/edition'

/**
 * `npm run bench`: how long rankings take and how that grows, on synthetic editions. Fails where the tabulated draws are
 * less than five times as fast as a plain loop over `scoreDevice`, or where 1,600 devices cost more than twice as much as
 * 16 do a hundred times. Best of several runs, the two sides turn about, so that a busy machine slows both alike.
 */

const SIZES = [16, 160, 1600]
const DRAWS = 4000
const LEAST_SPEEDUP = 5
const MOST_GROWTH = 2

/** The way without tables: each device moved by the same errors and scored whole, draw by draw. */
function plainLoop(edition: Edition, prepared: Prepared): Float64Array {
  const errorsOf = errorSource(edition, prepared, DRAWS)
  const fits = new Float64Array(edition.devices.length * DRAWS)
  const within = (L: number) => Math.min(Math.max(L, 0), 100)
  edition.devices.forEach((device, row) => {
    const { L, a, b, ink } = errorsOf(device)
    for (let k = 0; k < DRAWS; k++) {
      const page = {
        ...device.page,
        L: within(device.page.L + L[k]!),
        a: device.page.a + a[k]!,
        b: device.page.b + b[k]!,
      }
      const drawn = { ...device, page, ink: { ...device.ink, L: within(device.ink.L + ink[k]!) } }
      fits[row * DRAWS + k] = scoreDevice(drawn, prepared).fit
    }
  })
  return fits
}

function milliseconds(work: () => unknown): number {
  const start = performance.now()
  work()
  return performance.now() - start
}

/** Best time of each, the works taken in turn. */
function bestOf(runs: number, works: Record<string, () => unknown>): Record<string, number> {
  const best: Record<string, number> = {}
  for (let run = 0; run < runs; run++) {
    for (const [name, work] of Object.entries(works)) {
      best[name] = Math.min(best[name] ?? Infinity, milliseconds(work))
    }
  }
  return best
}

function measure(devices: number) {
  const edition = syntheticEdition(devices)
  const answers = makeAnswers()
  const prepared = prepareAnswers(answers)
  const bySlug = new Map(edition.devices.map((device) => [device.slug, device]))
  const ranked = rankByFit(edition, answers).ranked.map(({ slug }) => bySlug.get(slug)!)
  const fits = drawFits(ranked, edition, prepared, DRAWS)
  const plain = devices > 160 ? null : () => plainLoop({ ...edition, devices: ranked }, prepared)
  const worst = plain ? largestDifference(fits, plain()) : null
  const best = bestOf(devices > 160 ? 3 : 7, {
    point: () => rankByFit(edition, answers),
    draws: () => drawFits(ranked, edition, prepared, DRAWS),
    ...(plain && { plain }),
    ranks: () => rankDraws(fits, devices, DRAWS),
    ties: () => tooClose(fits, devices, DRAWS),
  })
  return { devices, worst, best }
}

function largestDifference(one: Float64Array, other: Float64Array): number {
  return one.reduce((worst, value, i) => Math.max(worst, Math.abs(value - other[i]!)), 0)
}

function row(cells: (string | number)[]): string {
  return cells.map((cell, i) => (i === 0 ? String(cell).padEnd(30) : String(cell).padStart(12))).join('')
}

/** Time for 1,600 devices over that for 16 a hundred times. */
function growthOf(work: (edition: Edition) => unknown): number {
  const [few, many] = [syntheticEdition(16), syntheticEdition(1600)]
  const best = bestOf(4, {
    few: () => {
      for (let i = 0; i < 100; i++) work(few)
    },
    many: () => work(many),
  })
  return best.many! / best.few!
}

// Once unmeasured, so that no size pays for the compiler.
measure(16)
const measured = SIZES.map(measure)
const time = (name: string) => measured.map(({ best }) => (best[name] === undefined ? '–' : best[name].toFixed(2)))
const aDevice = (name: string) => measured.map(({ best, devices }) => (best[name]! / devices) * 1000)
const speedups = measured.flatMap(({ best }) => (best.plain === undefined ? [] : [best.plain / best.draws!]))
const answers = makeAnswers()
const prepared = prepareAnswers(answers)
const drawsGrowth = growthOf((edition) => drawFits(edition.devices, edition, prepared, DRAWS))
const pointGrowth = growthOf((edition) => rankByFit(edition, answers))

console.log(`${DRAWS.toLocaleString('en-GB')} draws, two reading spots; milliseconds, best of interleaved runs\n`)
console.log(row(['devices', ...SIZES]))
console.log(row(['point ranking', ...time('point')]))
console.log(row(['draws', ...time('draws')]))
console.log(row(['  a device, µs', ...aDevice('draws').map((us) => us.toFixed(0))]))
console.log(row(['plain loop, same normals', ...time('plain')]))
console.log(row(['  times the draws', ...speedups.map((times) => `${times.toFixed(1)}×`), '–']))
console.log(row(['  largest difference, points', ...measured.map(({ worst }) => worst?.toExponential(1) ?? '–')]))
console.log(row(['ranks of the draws', ...time('ranks')]))
console.log(row(['ties of the draws', ...time('ties')]))
console.log(
  `\n1,600 devices to 16 a hundred times: draws ${drawsGrowth.toFixed(2)}×, point ranking ${pointGrowth.toFixed(2)}×`,
)

const failures = [
  ...(Math.min(...speedups) < LEAST_SPEEDUP ? [`draws must be ${LEAST_SPEEDUP}× as fast as the plain loop`] : []),
  ...(drawsGrowth > MOST_GROWTH ? [`draws must grow with the devices, to ${MOST_GROWTH}× a device at most`] : []),
]
for (const failure of failures) console.error(`Failed: ${failure}`)
process.exitCode = failures.length > 0 ? 1 : 0
