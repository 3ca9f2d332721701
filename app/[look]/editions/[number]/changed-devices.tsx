import Link from 'next/link'
import { Disclosure } from '@/components/ui/disclosure'
import { Pager } from '@/components/ui/pager'
import type { DeviceChange } from '@/lib/edition/changes'
import { FACT_NAMES } from '@/lib/edition/changes-facts'
import { factWords } from '@/lib/edition/changes-words'
import { formatNumber } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import { PER_PAGE } from '@/lib/server/path-page'
import { MovedFigures } from '../../corrections/moved-figures'
import type { Changelog } from './changelog'

/**
 * Devices of both editions of which a figure or a stated fact differs. The figures of corrected ones stand among the
 * corrections; here are only their facts.
 */
export function changedApartFromCorrected({ changes, corrected }: Changelog): DeviceChange[] {
  const slugs = new Set(corrected.map(({ slug }) => slug))
  return (changes?.changed ?? [])
    .map((change) => (slugs.has(change.slug) ? { ...change, figures: [] } : change))
    .filter(({ figures, facts }) => figures.length + facts.length > 0)
}

export const changedHref = (number: number, page: number) =>
  page === 1 ? `/editions/${number}#changed` : `/editions/${number}/changed/${page}`

export function ChangedDevices({ changelog, units, page }: { changelog: Changelog; units: Units; page: number }) {
  const { edition, previous, changes } = changelog
  if (!changes || !previous) return null
  const all = changedApartFromCorrected(changelog)
  const shown = all.slice((page - 1) * PER_PAGE, page * PER_PAGE)
  const same = changes.unchanged.length
  return (
    <section aria-labelledby="changed">
      <h2 id="changed">Changed</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        {all.length === 0
          ? 'Nothing else changed.'
          : `Figures that moved because readings or units were added, and facts stated differently, in ${formatNumber(all.length)} ${all.length === 1 ? 'device' : 'devices'}.`}{' '}
        {same > 0 && `${formatNumber(same)} ${same === 1 ? 'device has' : 'devices have'} the same figures and facts.`}
      </p>
      <div className="mt-6 grid grid-cols-[minmax(0,1fr)] gap-8">
        {shown.map((change) => (
          <Changed key={change.slug} change={change} units={units} from={previous.number} to={edition.number} />
        ))}
      </div>
      <Pager
        paging={{ page, perPage: PER_PAGE, hrefFor: (to) => changedHref(edition.number, to) }}
        total={all.length}
        what="Devices"
      />
    </section>
  )
}

function Changed({ change, units, from, to }: { change: DeviceChange; units: Units; from: number; to: number }) {
  const { slug, before, after, figures, facts } = change
  const beyond = figures.filter((figure) => figure.beyond).length
  const table = (
    <div className="mt-3 max-w-200">
      <MovedFigures
        figures={figures}
        from={from}
        to={to}
        caption={`Figures of ${after.name} that differ between edition ${from} and edition ${to}. ± is the doubt of the difference, at about 95 %.`}
      />
    </div>
  )
  return (
    <article className="border-t border-rule pt-5">
      <h3>
        <Link href={`/devices/${slug}`} prefetch={false}>
          {after.name}
        </Link>
      </h3>
      {facts.length > 0 && (
        <ul className="mt-2 grid gap-1">
          {facts.map(({ fact }) => (
            <li key={fact}>
              {FACT_NAMES[fact]}: {factWords(before, fact, units)} <span aria-hidden="true">→</span>
              <span className="sr-only">, now</span> {factWords(after, fact, units)}
            </li>
          ))}
        </ul>
      )}
      {beyond > 0 && (
        <>
          <p className="mt-2">
            {formatNumber(beyond)} of {formatNumber(figures.length)} figures moved by more than the doubt of the
            difference.
          </p>
          {table}
        </>
      )}
      {beyond === 0 && figures.length > 0 && (
        <>
          <p className="mt-2">No figure moved by more than the doubt of the difference.</p>
          <Disclosure summary={`Figures of ${after.name} before and after`}>{table}</Disclosure>
        </>
      )}
    </article>
  )
}
