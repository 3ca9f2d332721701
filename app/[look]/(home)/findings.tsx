import Link from 'next/link'
import type { ReactNode } from 'react'
import { Sheet } from '@/components/sheet'
import type { Quantity } from '@/lib/findings/difference'
import { leaderBy } from '@/lib/findings/standing'
import { formatList } from '@/lib/format/list'
import { formatDoubt, formatLux, formatNumber } from '@/lib/format/number'
import { OPENING_LUX } from '@/lib/lamp/levels'
import { rankUnderLamp } from '@/lib/lamp/ranking'
import { derivedUncertainty, expandedFigure } from '@/lib/method/figure-doubts'
import type { Edition, EditionDevice } from '@/lib/method/types'

const lightness: Quantity = ({ page }) => page.L
const chroma: Quantity = ({ page }) => Math.hypot(page.a, page.b)

/** What the newest edition says at a glance: the lightest page and the least tinted one, each with its doubt and ties. */
export function Findings({ edition }: { edition: Edition }) {
  const lightest = leaderBy(edition, lightness)
  const leastTinted = leaderBy(edition, (states) => -chroma(states))
  if (!lightest || !leastTinted) return null
  const { session, common } = edition.uncertainty
  const doubtOfLightness = ({ page, sessions }: EditionDevice) =>
    expandedFigure(page.u.L, session.L, sessions, common.L)

  return (
    <section aria-labelledby="findings" className="measure">
      <div className="card grid border-t-0 max-lg:divide-y max-lg:divide-rule lg:grid-cols-[1.15fr_1fr_1fr] lg:divide-x lg:divide-rule">
        <div className="p-7">
          <h2 id="findings">What the bench found this edition</h2>
          <p className="mt-3">{sentence(edition, lightest)}</p>
          <p className="mt-3">
            <Link href="/devices">See all {formatNumber(edition.devices.length)} devices</Link>
          </p>
        </div>
        <Finding
          title="Lightest page"
          leader={lightest}
          figure={formatNumber(lightness(lightest.first), 1)}
          unit={<>L*, {formatDoubt(doubtOfLightness(lightest.first), 1)} at about 95 %</>}
        />
        <Finding
          title="Least tint"
          leader={leastTinted}
          figure={formatNumber(chroma(leastTinted.first), 1)}
          unit={
            <>
              chroma C*<sub>ab</sub>,{' '}
              {formatDoubt(derivedUncertainty(leastTinted.first, edition.uncertainty).chroma, 1)} at about 95 %
            </>
          }
        />
      </div>
    </section>
  )
}

type Leader = { first: EditionDevice; tied: EditionDevice[] }

function sentence(edition: Edition, { first, tied }: Leader): string {
  const found =
    tied.length === 0
      ? `${first.name} has the lightest page of the edition.`
      : `${names([first, ...tied])} have the lightest pages of the edition, too close to call.`
  const [best] = rankUnderLamp(edition.devices, OPENING_LUX)
  if (!best || [first, ...tied].some(({ slug }) => slug === best.device.slug)) {
    return `${found} Lightness is one of four things that count.`
  }
  return `${found} Under a bedside lamp of ${formatLux(OPENING_LUX)} lux ${best.device.name} fits a reader of novels better: lightness is one of four things that count.`
}

function Finding({
  title,
  leader: { first, tied },
  figure,
  unit,
}: {
  title: string
  leader: Leader
  figure: string
  unit: ReactNode
}) {
  return (
    <div className="p-7">
      <h3>{title}</h3>
      <div className="mt-3 flex items-center gap-4">
        <Sheet page={first.page} ink={first.ink} size="small" />
        <div>
          <p className="text-h2 leading-none tabular-nums">{figure}</p>
          <p className="mt-1">
            <Link href={`/devices/${first.slug}`}>{first.name}</Link>
          </p>
          <p className="text-note text-soft">{unit}</p>
        </div>
      </div>
      {tied.length > 0 && <p className="mt-3 text-small text-soft">Too close to call with {names(tied)}.</p>}
    </div>
  )
}

const MOST_NAMES = 3

/** The names of those tied; from four on the first two and how many more. */
function names(devices: readonly EditionDevice[]): string {
  const all = devices.map(({ name }) => name)
  return all.length <= MOST_NAMES ? formatList(all) : formatList([...all.slice(0, 2), `${all.length - 2} more`])
}
