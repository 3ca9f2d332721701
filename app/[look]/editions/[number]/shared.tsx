import Link from 'next/link'
import type { SharedChange } from '@/lib/edition/changes'
import { formatNumber } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import type { Changelog } from './changelog'

const NAMES: Record<SharedChange['what'], { name: string; decimals: number }> = {
  paper: { name: 'Control paper, mean of its sessions', decimals: 2 },
  common: { name: 'Standard uncertainty common to all figures', decimals: 3 },
  session: { name: 'Standard uncertainty of one session', decimals: 3 },
}

/** What the figures of both editions have in common, where it changed; and that doubts move with it. */
export function Shared({ changelog }: { changelog: Changelog }) {
  const { changes, previous, edition } = changelog
  if (!changes || !previous) return null
  return (
    <section aria-labelledby="shared">
      <h2 id="shared">Under all figures</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        The spread between readings, positions and units is pooled over an edition, so a doubt may change although its
        figure does not.{' '}
        {changes.method
          ? `Method ${changes.method.before} gave way to Method ${changes.method.after}.`
          : `Both are by Method ${edition.method}.`}
      </p>
      {changes.shared.length > 0 && (
        <ul className="mt-3 grid gap-1">
          {changes.shared.map(({ what, before, after }) => (
            <li key={what}>
              {NAMES[what].name}: {words(before, NAMES[what].decimals)} <span aria-hidden="true">→</span>
              <span className="sr-only">, now</span> {words(after, NAMES[what].decimals)}
            </li>
          ))}
        </ul>
      )}
      <p className="mt-3 max-w-[68ch] text-note text-soft">
        What both editions share drops out of the doubt of a difference; the rest is taken as independent although some
        readings are the same, so that doubt is rather too large than too small. † outside the formula’s limits.{' '}
        <Link href="/method#figures" prefetch={false}>
          How doubts come about
        </Link>
      </p>
    </section>
  )
}

function words({ L, a, b }: Lab, decimals: number): string {
  return `L* ${formatNumber(L, decimals)}, a* ${formatNumber(a, decimals)}, b* ${formatNumber(b, decimals)}`
}
