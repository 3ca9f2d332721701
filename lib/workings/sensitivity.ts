import { derive } from '@/lib/method/derived-figures'
import { clamp } from '@/lib/method/light'
import type { Lab } from '@/lib/method/types'
import type { Part } from './budget'

/** Figures whose sensitivities we state; each follows from a page and its ink. */
export type FigureId = 'whiteness' | 'tint' | 'contrast'

/** Change of a figure for one CIELAB unit more of each channel: ∂/∂L*, ∂/∂a*, ∂/∂b* of the page, ∂/∂L* of the ink. */
export type Slopes = { page: Lab; ink: number }

/** Half the step of a central difference, in CIELAB units (house): far above rounding, far below any curve. */
const STEP = 0.01

/**
 * Slopes of a derived figure by central differences.
 * @param page L* 0–100; at either end the slope is taken just inside
 * @see JCGM 100:2008, 5.1.3 and 5.1.4
 */
export function slopesOf(figure: FigureId, page: Lab, ink: Lab): Slopes {
  const [from, dark] = [inside(page), inside(ink)]
  const at = (dL: number, da: number, db: number, dInk: number) =>
    derive({ L: from.L + dL, a: from.a + da, b: from.b + db }, { ...dark, L: dark.L + dInk })[figure]
  const slope = (L: number, a: number, b: number, k: number) =>
    (at(L * STEP, a * STEP, b * STEP, k * STEP) - at(-L * STEP, -a * STEP, -b * STEP, -k * STEP)) / (2 * STEP)
  return { page: { L: slope(1, 0, 0, 0), a: slope(0, 1, 0, 0), b: slope(0, 0, 1, 0) }, ink: slope(0, 0, 0, 1) }
}

function inside({ L, a, b }: Lab): Lab {
  return { L: clamp(L, 2 * STEP, 100 - 2 * STEP), a, b }
}

/**
 * What one line of the budget brings to a figure, standard, in the figure's unit. An error shared by page and ink moves
 * both lightnesses at once; of the ink only its lightness matters.
 */
export function contribution({ u, shared }: Part, { page, ink }: Slopes): number {
  const lightness = shared ? [(page.L + ink) * u.page.L] : [page.L * u.page.L, ink * u.ink.L]
  return Math.hypot(...lightness, page.a * u.page.a, page.b * u.page.b)
}
