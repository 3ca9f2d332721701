import { expandedUncertainty, propagate } from '@/lib/stats/uncertainty'
import { METHOD } from './constants'
import { besidePaper, type DerivedFigures, derive } from './derived-figures'
import { clamp } from './light'
import type { Edition, EditionDevice, Lab } from './types'

const K = METHOD.figures.coverage.value

type Measured = Pick<EditionDevice, 'page' | 'ink' | 'sessions'>
type Uncertainty = Edition['uncertainty']

/**
 * Expanded uncertainty of one channel of a device's figure, U = 2·√(u² + s_session²·Σ share² + u_common²).
 * @param u of the device's own part
 * @param shares of the device's sets in each session
 */
export function expandedFigure(u: number, session: number, shares: Record<string, number>, common: number): number {
  return expandedUncertainty([u, session * together(shares), common], K)
}

/** √Σ share²: the independent errors of several sessions, each by its share. */
function together(shares: Record<string, number>): number {
  return Math.hypot(...Object.values(shares))
}

/** Figures that are numbers for every page. */
const ALWAYS = ['whiteness', 'tint', 'contrast', 'chroma', 'yPage', 'yInk'] as const

/** Expanded uncertainties (k = 2); the hue's in degrees, null for a neutral. */
export type DerivedDoubts = Record<(typeof ALWAYS)[number], number> & { hue: number | null }

/**
 * Expanded uncertainty U = 2·u of the derived figures of a device, first order with numerical derivatives, channels
 * independent. Session and common errors move page and ink together (the ink on L* only), so they drop out of a contrast
 * ratio in part. Chroma has no slope at a neutral; there it is given the larger doubt of a* and b*. Method 1,
 * section 1; JCGM 100, 5.1.2.
 */
export function derivedUncertainty(device: Measured, uncertainty: Uncertainty): DerivedDoubts {
  const now = derive(device.page, device.ink)
  const doubt = (figure: (derived: DerivedFigures) => number) =>
    expandedOf(device, uncertainty, (page, ink) => figure(derive(page, ink)))
  const channel = (name: 'a' | 'b') =>
    expandedFigure(device.page.u[name], uncertainty.session[name], device.sessions, uncertainty.common[name])

  const [whiteness, tint, contrast, chroma, yPage, yInk] = ALWAYS.map((name) => doubt((derived) => derived[name])) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ]
  const { hue } = now
  if (hue === null) {
    return { whiteness, tint, contrast, chroma: Math.max(channel('a'), channel('b')), yPage, yInk, hue }
  }
  return { whiteness, tint, contrast, chroma, yPage, yInk, hue: doubt((derived) => turn(hue, derived.hue ?? hue)) }
}

/** The same beside the control paper, whose own figure moves with the common errors and otherwise counts as exact. */
export function besidePaperUncertainty(
  device: Measured,
  uncertainty: Uncertainty,
  paper: Lab,
): { deltaE00: number; timesTheLight: number } {
  const doubt = (name: 'deltaE00' | 'timesTheLight') =>
    expandedOf(device, uncertainty, (page, _, common) => besidePaper(page, plus(paper, common))[name])
  return { deltaE00: doubt('deltaE00'), timesTheLight: doubt('timesTheLight') }
}

/**
 * 2·u of a figure of page and ink. Its inputs are the errors, each of mean 0 and an input of its own: the page's, the
 * ink's (of which L* alone matters), those of the device's sessions together, and the common ones.
 */
function expandedOf(
  { page, ink, sessions }: Measured,
  { session, common }: Uncertainty,
  figure: (page: Lab, ink: Lab, common: Lab) => number,
): number {
  const share = together(sessions)
  const sizes = [page.u, { ...ink.u, a: 0, b: 0 }, scaled(session, share), common].flatMap(({ L, a, b }) => [L, a, b])
  const from = { page: inside(page), ink: inside(ink) }
  const withErrors = (errors: number[]) => {
    const [ofPage, ofInk, ofSessions, ofAll] = [0, 3, 6, 9].map((i) => labFrom(errors, i)) as [Lab, Lab, Lab, Lab]
    const shared = plus(ofSessions, ofAll)
    return figure(
      plus(plus(from.page, ofPage), shared),
      plus(plus(from.ink, ofInk), { L: shared.L, a: 0, b: 0 }),
      ofAll,
    )
  }
  return (
    K *
    propagate(
      withErrors,
      sizes.map(() => 0),
      sizes,
    )
  )
}

/** Room for a step of a slope between a lightness and the ends of its scale, L*: a thousandth of any u up to 20. */
const STEP_ROOM = 0.02

function inside(state: Lab): Lab {
  return { L: clamp(state.L, STEP_ROOM, 100 - STEP_ROOM), a: state.a, b: state.b }
}

function labFrom(values: number[], i: number): Lab {
  return { L: values[i]!, a: values[i + 1]!, b: values[i + 2]! }
}

function plus(one: Lab, other: Lab): Lab {
  return { L: one.L + other.L, a: one.a + other.a, b: one.b + other.b }
}

function scaled({ L, a, b }: Lab, by: number): Lab {
  return { L: by * L, a: by * a, b: by * b }
}

/** The signed angle from one hue to another the short way, degrees. */
function turn(from: number, to: number): number {
  return ((((to - from) % 360) + 540) % 360) - 180
}
