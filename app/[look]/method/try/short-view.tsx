import { formatDoubt, formatNumber as n } from '@/lib/format/number'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import { reserveWords } from '@/lib/workings/reserve'
import type { Workings } from '@/lib/workings/workings'

/** The figures that come out, with their doubts where an edition gives the spreads they need. */
export function ShortView({ workings: { page, budget, figures, seen } }: { workings: Workings }) {
  const mark = figures.withinLimits ? '' : '†'
  const rows: [name: string, value: string, doubt: number | undefined, decimals: number, more?: string][] = [
    ['Lightness L*', n(page.L, 1), budget?.expanded.page.L, 1],
    ['Whiteness W₁₀', `${n(figures.whiteness, 1)}${mark}`, budget?.derived?.whiteness, 1],
    ['Tint T₁₀', `${n(figures.tint, 1)}${mark}`, budget?.derived?.tint, 1],
    ['Contrast ratio', n(figures.contrast, 1), budget?.derived?.contrast, 1],
    ['Contrast reserve', `${n(seen.reserve, 1)}×`, undefined, 1, reserveWords(seen.reserve)],
  ]
  return (
    <>
      <dl className="grid grid-cols-2 gap-x-6 gap-y-3 sm:grid-cols-3 lg:grid-cols-2">
        {rows.map(([name, value, doubt, decimals, more]) => (
          <div key={name}>
            <dt className="text-note text-soft">{name}</dt>
            <dd>
              <span className="text-h3 font-semibold tabular-nums">{value}</span>{' '}
              {doubt !== undefined && <span className="text-small text-soft">{formatDoubt(doubt, decimals)}</span>}
              {more && <span className="block text-small text-soft">{more}</span>}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 text-note text-soft">
        {budget
          ? `± at k = ${COVERAGE_FACTOR}, about 95 %, for so many units and places as stated.`
          : 'No doubts: without an edition there are no spreads to take them from.'}
        {mark && ' † Outside the formula’s limits.'}
      </p>
    </>
  )
}
