import { D65_10 } from '@/lib/colour/white'
import { WHITENESS_D65_10, WHITENESS_FACTORS } from '@/lib/colour/whiteness'
import { METHOD } from './constants'
import { clarityScore, LEAST_TOTAL, WHITENESS_DIM, WHITENESS_SPAN } from './criteria'
import { type Errors, errorSource, lightnessSpread } from './errors'
import type { Prepared } from './fit'
import { handlingScore } from './handling'
import { clamp, frontLightMax } from './light'
import { fluency, LOG_BEST_READING, LOG_SPOT_READING, reserveIn, SPOT_READING } from './reserve'
import { COARSE_ERROR, FINE, thresholdTable, USELESS } from './threshold-table'
import type { Edition, EditionDevice } from './types'

/** Half of a table's window, in standard deviations of L*: a draw beyond it comes once in 4e11, and is scored in full. */
const WINDOW = 7
/** Nor narrower than this, L*, so that a figure without doubt has a window too. */
const LEAST_WINDOW = 1e-3
/** Twice what a table may be off. */
const MARGIN = 2 * COARSE_ERROR

/**
 * Fits of the devices in every draw, one row of `draws` values a device, in the order given. The weights are held.
 * Agrees with `scoreDevice` on each draw to better than 0.001 points. Method 1, section 6; JCGM 101.
 */
export function drawFits(
  devices: readonly EditionDevice[],
  edition: Edition,
  prepared: Prepared,
  draws: number,
): Float64Array {
  const errorsOf = errorSource(edition, prepared, draws)
  const fits = new Float64Array(devices.length * draws)
  devices.forEach((device, row) => {
    const halfWidth = Math.max(WINDOW * lightnessSpread(edition, device), LEAST_WINDOW)
    drawDevice(device, prepared, errorsOf(device), halfWidth, fits.subarray(row * draws, (row + 1) * draws))
  })
  return fits
}

function drawDevice(
  device: EditionDevice,
  prepared: Prepared,
  errors: Errors,
  halfWidth: number,
  fits: Float64Array,
): void {
  const { page, ink } = device
  const { spots, weights, white, eye, claritySpan } = prepared
  const frontLight = frontLightMax(device.frontLight)
  const table = thresholdTable(page.L, halfWidth, frontLight, prepared)
  const { logCt, grade, from, to, piecesPerUnit } = table
  const shares = Float64Array.from(spots, (spot) => spot.share)
  const spotCount = spots.length
  // Σ η ρ_dim once: the shares sum to 1, so the gain is Σ η ρ less this.
  const rhoDim = spots.reduce((sum, spot) => sum + spot.share * spot.rhoDim, 0)
  const handling = weights.handling * handlingScore(device, prepared.handling).score
  const tintSpan = METHOD.criteria.tintSpan.value

  for (let k = 0; k < fits.length; k++) {
    const L = Math.min(Math.max(page.L + errors.L[k]!, 0), 100)
    const a = page.a + errors.a[k]! - white.a
    const b = page.b + errors.b[k]! - white.b
    const yPage = luminanceFactor(L)
    const yInk = luminanceFactor(Math.min(Math.max(ink.L + errors.ink[k]!, 0), 100))
    const logContrast = yPage > yInk ? Math.log10(1 - yInk / yPage) : -Infinity
    const inWindow = L >= from && L <= to
    const place = inWindow ? (L - from) * piecesPerUnit : 0
    const piece = Math.floor(place)
    const past = place - piece

    let rho = 0
    let unreadable = 0
    let readable = 0
    for (let s = 0, i = piece * spotCount; s < spotCount; s++, i++) {
      const share = shares[s]!
      const low = logCt[i]!
      const reserve = logContrast - (low + past * (logCt[i + spotCount]! - low))
      const useful = inWindow && grade[s] !== USELESS
      if (useful && reserve > LOG_BEST_READING + MARGIN) {
        rho += share * LOG_BEST_READING
        readable++
      } else if (useful && reserve < LOG_SPOT_READING - MARGIN) {
        rho += share * LOG_SPOT_READING
        unreadable += share
      } else if (useful && grade[s] === FINE && reserve > LOG_SPOT_READING + MARGIN) {
        rho += share * Math.min(reserve, LOG_BEST_READING)
        readable++
      } else {
        // At the step from readable to not, at an edge of the model, or outside the window: the model itself.
        const exact = reserveIn({ yPage, yInk, frontLight }, spots[s]!, eye)
        rho += share * fluency(exact)
        if (exact < SPOT_READING) unreadable += share
        else readable++
      }
    }
    const clarity = clarityScore(rho - rhoDim, claritySpan)
    const whiteness = clamp((whitenessOf(L, yPage, a, Math.max(b, 0)) - WHITENESS_DIM) / WHITENESS_SPAN)
    const tint = clamp(1 - Math.sqrt(a * a + b * b) / tintSpan)
    const points = weights.clarity * clarity + weights.whiteness * whiteness + weights.tint * tint + handling
    fits[k] = readable > 0 ? 100 * (1 - Math.min(unreadable, 1)) * points : 0
  }
}

const { xn, yn } = WHITENESS_D65_10
const { x: toX, y: toY } = WHITENESS_FACTORS

/** W₁₀ straight from L*, a*, b*, without an object a draw; the same sums as lib/colour's, held to them by the tests. */
function whitenessOf(L: number, Y: number, a: number, b: number): number {
  const fy = (L + 16) / 116
  const X = D65_10.X * expand(fy + a / 500)
  const total = X + Y + D65_10.Z * expand(fy - b / 200)
  return total > LEAST_TOTAL ? Y + toX * (xn - X / total) + toY * (yn - Y / total) : Y
}

/** lib/colour's lightnessToY, its range already kept. */
function luminanceFactor(L: number): number {
  return 100 * expand((L + 16) / 116)
}

/** CIELAB's inverse of the cube root, with its straight branch; ISO/CIE 11664-4. */
function expand(f: number): number {
  return f > 6 / 29 ? f * f * f : (f - 4 / 29) * (108 / 841)
}
