import { lightnessToY } from '@/lib/colour/lab'
import { log10ThresholdContrast } from '@/lib/vision/contrast-reserve'
import type { Prepared } from './fit'
import { luminanceIn } from './reserve'

/** Straight pieces in a window; with a typical doubt of a page this keeps log Ct to some 1e-7. */
const PIECES = 48

/**
 * log₁₀ of a threshold nothing can pass: what stands in the table where the model ends and the reserve is 0. A piece from
 * here to a threshold is half of this off in its middle, so a window that holds the model's end is found useless.
 */
const NEVER = 1e6

/** How near a spot's table comes to the model, the limit tried at the middle of every piece. */
export const FINE = 0
/** Within COARSE_ERROR: enough to see that the reserve is off the scale of ρ, not to place it on it. */
export const COARSE = 1
/** Not at all: the window holds an edge of the model, or one of the light with too sharp a bend. */
export const USELESS = 2

/** Largest error of log Ct for which a table is of use. At a bend the middle shows at least half of the error. */
export const COARSE_ERROR = 1e-5

/** Share of Σ η(ρ_bright − ρ_dim) that an error of log Ct may have: 4e-6 of it moves a fit by at most 0.0008 points. */
const FINE_SHARE = 4e-6

/**
 * log₁₀ of the threshold contrast over a window of page lightness, for each spot, front light inside: straight pieces
 * between nodes, so that a draw costs two look-ups a spot where the model costs a dozen transcendental functions.
 */
export type ThresholdTable = {
  /** The window, L*. */
  from: number
  to: number
  piecesPerUnit: number
  /** Node by node, within a node spot by spot; one node more than is needed, so that the last piece has an end. */
  logCt: Float64Array
  grade: Uint8Array
}

/**
 * @param centre L* of the page
 * @param halfWidth of the window, L*; it ends at 0 and 100
 * @param frontLight most the device's front light gives, cd/m²
 */
export function thresholdTable(
  centre: number,
  halfWidth: number,
  frontLight: number,
  prepared: Prepared,
): ThresholdTable {
  const from = Math.max(centre - halfWidth, 0)
  const to = Math.min(centre + halfWidth, 100)
  const step = (to - from) / PIECES
  const { spots, eye } = prepared
  const logCt = new Float64Array((PIECES + 2) * spots.length)
  const grade = new Uint8Array(spots.length)
  const fine = Math.min(FINE_SHARE * prepared.claritySpan, COARSE_ERROR)

  spots.forEach((spot, s) => {
    const luminanceAt = (L: number) => luminanceIn({ yPage: lightnessToY(Math.min(L, 100)), frontLight }, spot)
    const thresholdAt = (L: number) => Math.min(log10ThresholdContrast(luminanceAt(L), eye.age, eye.size), NEVER)
    const level = luminanceAt(from) === luminanceAt(to)
    let last = thresholdAt(from)
    let worst = 0
    logCt[s] = last
    for (let node = 1; node <= PIECES; node++) {
      const next = level ? last : thresholdAt(from + node * step)
      if (!level) worst = Math.max(worst, Math.abs((last + next) / 2 - thresholdAt(from + (node - 0.5) * step)))
      logCt[node * spots.length + s] = next
      last = next
    }
    logCt[(PIECES + 1) * spots.length + s] = last
    grade[s] = worst <= fine ? FINE : worst <= COARSE_ERROR ? COARSE : USELESS
  })
  return { from, to, piecesPerUnit: to > from ? PIECES / (to - from) : 0, logCt, grade }
}
