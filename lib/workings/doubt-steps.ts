import { formatUnit, formatNumber as n } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import type { Part, PartId } from './budget'
import { PART_WORDS } from './part-words'
import { put, type Step } from './step'
import type { Budget } from './workings'

const GUM = 'JCGM 100:2008'

/** From the parts of a doubt to that of lightness, and on to that of whiteness, step by step. */
export function doubtSteps({ parts, combined, expanded, largest, degrees, derived, slopes }: Budget): Step[] {
  const of = (id: PartId) => parts.find((part) => part.id === id)!
  const own = (['unit', 'position', 'reading'] as const).map(of)
  const ownPart = Math.hypot(...own.map(({ u }) => u.page.L))
  const [session, common] = [of('session').u.page.L, of('common').u.page.L]
  const steps: Step[] = [
    {
      id: 'own',
      name: 'The page’s own part, L*',
      formula: 'u = √(s(unit)²/k + s(pos)²/m + s(r)²/N)',
      worked: `u = √(${own.map(over).join(' + ')})`,
      result: `u ${n(ownPart, 4)}`,
      source: `Method 1, section 1; ${GUM}, 5.1.2`,
    },
    {
      id: 'combined',
      name: 'Combined standard uncertainty, L*',
      formula: 'u(c) = √(u² + s(session)² + u(common)²)',
      worked: `u(c) = √(${n(ownPart, 4)}² + ${n(session, 4)}² + ${n(common, 4)}²)`,
      result: `u(c) ${n(combined.page.L, 4)}`,
      source: `${GUM}, 5.1.2`,
      note: largest
        ? `The largest part: ${PART_WORDS[largest.id].name.toLowerCase()}, ${formatUnit(100 * largest.share, '%')} of u(c)².`
        : undefined,
    },
    {
      id: 'expanded',
      name: 'Expanded uncertainty, L*',
      formula: 'U = k·u(c)',
      worked: `U = ${COVERAGE_FACTOR}·${n(combined.page.L, 4)}`,
      result: `U ${n(expanded.page.L, 2)}, k = ${COVERAGE_FACTOR}, about 95 %`,
      source: `${GUM}, 6.2.1`,
      note: Number.isFinite(degrees)
        ? `k is fixed. By Welch and Satterthwaite (${GUM}, G.4.1) about ${n(Math.floor(degrees))} degrees of freedom stand behind it.`
        : undefined,
    },
  ]
  if (derived === null) {
    return [
      ...steps,
      {
        id: 'whiteness-doubt',
        name: 'Doubt of the whiteness',
        formula: 'U(W) = k·√(Σ(∂W/∂c·u(c))²), c = L*, a*, b*',
        worked: 'The readings scatter too widely for a slope to say anything',
        result: 'Not worked out',
        source: `${GUM}, 5.1.2`,
      },
    ]
  }
  const { page } = slopes.whiteness
  const term = (channel: keyof Lab) => `(${put(page[channel], 2)}·${n(combined.page[channel], 4)})²`
  return [
    ...steps,
    {
      id: 'whiteness-doubt',
      name: 'Doubt of the whiteness',
      formula: 'U(W) = k·√(Σ(∂W/∂c·u(c))²), c = L*, a*, b*',
      worked: `U(W) = ${COVERAGE_FACTOR}·√(${term('L')} + ${term('a')} + ${term('b')})`,
      result: `U(W) ${n(derived.whiteness, 2)}`,
      source: `${GUM}, 5.1.2; slopes by numerical derivatives`,
    },
  ]
}

/** A spread over what it is divided by: "0.36²/2". */
function over({ spread, divisor }: Part): string {
  return `${n(spread.page.L, 4)}²/${n(divisor.page ** 2)}`
}
