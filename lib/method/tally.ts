import { METHOD } from './constants'

/** What the draws say of one device. */
export type Tally = { sd: number; first: number; rank95: [number, number] }

/** Draws turned from rows of devices to rows of draws at a time: as many as fill two lines of a processor's cache. */
const BLOCK = 16

/**
 * Spread, first-place share and 95 % rank interval of each device. In a draw a rank is 1 + the number strictly ahead,
 * and those level in first place share it equally. Method 1, section 6.
 * @param fits one row of `draws` values a device
 */
export function rankDraws(fits: Float64Array, devices: number, draws: number): Tally[] {
  const firsts = new Float64Array(devices)
  // How often each device (row) had each rank (column, from 0).
  const counts = new Uint32Array(devices * devices)
  const block = new Float64Array(BLOCK * devices)
  for (let start = 0; start < draws; start += BLOCK) {
    const size = Math.min(BLOCK, draws - start)
    for (let d = 0; d < devices; d++) {
      for (let k = 0; k < size; k++) block[k * devices + d] = fits[d * draws + start + k]!
    }
    for (let k = 0; k < size; k++) rankOne(block.subarray(k * devices, (k + 1) * devices), firsts, counts)
  }
  return Array.from({ length: devices }, (_, d) => {
    const places = counts.subarray(d * devices, (d + 1) * devices)
    return {
      sd: spread(fits.subarray(d * draws, (d + 1) * draws)),
      first: firsts[d]! / draws,
      rank95: [
        nearestRank(places, draws, METHOD.ties.rankLowPermille.value),
        nearestRank(places, draws, METHOD.ties.rankHighPermille.value),
      ],
    }
  })
}

function rankOne(row: Float64Array, firsts: Float64Array, counts: Uint32Array): void {
  const devices = row.length
  const ascending = row.slice().sort()
  const best = ascending[devices - 1]
  let level = 0
  for (let d = 0; d < devices; d++) {
    const ahead = countAbove(ascending, row[d]!)
    const cell = d * devices + ahead
    counts[cell] = counts[cell]! + 1
    if (row[d] === best) level++
  }
  for (let d = 0; d < devices; d++) if (row[d] === best) firsts[d] = firsts[d]! + 1 / level
}

/** How many of the values, in ascending order, are strictly greater. */
function countAbove(ascending: Float64Array, value: number): number {
  let base = 0
  for (let length = ascending.length; length > 1; ) {
    const half = length >>> 1
    base += half * Number(ascending[base + half - 1]! <= value)
    length -= half
  }
  return ascending.length - base - Number(ascending[base]! <= value)
}

/** The rank at place ⌈p·n⌉ of the sorted ranks, p in thousandths: a division of whole numbers is exact where it can be. */
function nearestRank(places: Uint32Array, draws: number, permille: number): number {
  const wanted = Math.max(Math.ceil((permille * draws) / 1000), 1)
  let seen = 0
  for (let rank = 0; rank < places.length; rank++) {
    seen += places[rank]!
    if (seen >= wanted) return rank + 1
  }
  return places.length
}

/** Standard deviation, n − 1; 0 for a single draw. */
function spread(values: Float64Array): number {
  if (values.length < 2) return 0
  let sum = 0
  for (const value of values) sum += value
  const mean = sum / values.length
  let squares = 0
  for (const value of values) squares += (value - mean) ** 2
  return Math.sqrt(squares / (values.length - 1))
}

/**
 * For each device the others it is too close to call with, in ranked order: of a pair, the one ranked higher is
 * strictly ahead in fewer than 95 % of the draws.
 * @param fits one row of `draws` values a device, rows in ranked order (by fit, equal fits by slug)
 */
export function tooClose(fits: Float64Array, devices: number, draws: number): number[][] {
  // The most draws not ahead with which a pair is still settled.
  const allowed = Math.floor(((100 - METHOD.ties.clearlyAheadPercent.value) * draws) / 100)
  const ties: number[][] = Array.from({ length: devices }, () => [])
  const { lows, highs } = tails(fits, devices, draws, Math.floor(allowed / 2))
  for (let upper = 0; upper < devices; upper++) {
    for (let lower = upper + 1; lower < devices; lower++) {
      // At most half the allowed draws of the one are below `lows`, and as few of the other above `highs`: if the one
      // tail starts above where the other ends, too few draws can be not ahead, and none need be counted.
      if (lows[upper]! > highs[lower]!) continue
      if (countNotAhead(fits, upper * draws, lower * draws, draws, allowed) <= allowed) continue
      ties[upper]!.push(lower)
      ties[lower]!.push(upper)
    }
  }
  return ties
}

/** Comparisons between two looks at whether enough are counted. */
const STRETCH = 64

/** Draws in which the first row is not strictly ahead of the second; stops counting soon after `enough`. */
function countNotAhead(fits: Float64Array, one: number, other: number, draws: number, enough: number): number {
  let count = 0
  for (let start = 0; start < draws && count <= enough; start += STRETCH) {
    const end = Math.min(start + STRETCH, draws)
    // A number from a comparison, not a branch on it: which way it falls is a toss-up, and guessing wrong is slow.
    for (let k = start; k < end; k++) count += Number(fits[one + k]! <= fits[other + k]!)
  }
  return count
}

/** For each row a value that at most `cut` of its draws lie strictly below, and one that at most `cut` lie above. */
function tails(fits: Float64Array, devices: number, draws: number, cut: number) {
  const lows = new Float64Array(devices)
  const highs = new Float64Array(devices)
  for (let d = 0; d < devices; d++) {
    const row = fits.slice(d * draws, (d + 1) * draws)
    lows[d] = select(row, cut)
    highs[d] = select(row, draws - 1 - cut)
  }
  return { lows, highs }
}

/**
 * The value that would stand at `place` if the values were sorted; they are left partly sorted.
 * @see C. A. R. Hoare, Algorithm 65: FIND, Communications of the ACM 4(7), 1961 (from memory)
 */
function select(values: Float64Array, place: number): number {
  let left = 0
  let right = values.length - 1
  while (left < right) {
    const pivot = values[place]!
    let i = left
    let j = right
    do {
      while (values[i]! < pivot) i++
      while (values[j]! > pivot) j--
      if (i <= j) {
        const swapped = values[i]!
        values[i++] = values[j]!
        values[j--] = swapped
      }
    } while (i <= j)
    if (j < place) left = i
    if (i > place) right = j
  }
  return values[place]!
}
