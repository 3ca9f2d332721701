import Link from 'next/link'
import type { ReactNode } from 'react'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { evidenceOf } from '@/lib/findings/evidence'
import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatNumber, formatUnit } from '@/lib/format/number'
import type { Edition } from '@/lib/method/types'
import { countedSets, unitsOf } from './dossier'

/** What the figures rest on: how many readings, where, when, with what, and whose units. */
export function HowWeKnow({ record, entry, edition }: { record: DeviceRecord; entry: DeviceEntry; edition: Edition }) {
  const sets = countedSets(record, entry)
  const evidence = evidenceOf(sets)
  const units = unitsOf(record, entry)
  const instruments = [...new Set(sets.map(({ source }) => source.instrument))]
  const apertures = [...new Set(sets.map(({ source }) => source.apertureMm))].sort((one, other) => one - other)
  if (!evidence) return null
  return (
    <section aria-labelledby="how" className="print:hidden">
      <h2 id="how" className="text-h3">
        How we know
      </h2>
      <dl className="mt-3 text-small">
        <Row name="Readings">
          {formatNumber(evidence.readings)} in {formatNumber(evidence.sets)} sets, at {formatNumber(evidence.positions)}{' '}
          {evidence.positions === 1 ? 'position' : 'positions'}, on {formatNumber(evidence.units)}{' '}
          {evidence.units === 1 ? 'unit' : 'units'}
        </Row>
        <Row name="Geometry">d/8°, specular included</Row>
        <Row name="Instrument">
          {formatList(instruments)}, aperture {formatList(apertures.map((mm) => formatUnit(mm, 'mm')))}
        </Row>
        <Row name="Measured">
          {evidence.from === evidence.to
            ? formatDay(evidence.from)
            : `${formatDay(evidence.from)} to ${formatDay(evidence.to)}`}
        </Row>
        <Row name="Repeatability">{spread(evidence.repeatability, 'no set has two readings')}</Row>
        <Row name="Between units">{spread(evidence.betweenUnits, 'one unit only')}</Row>
        <Row name="Between sessions">{spread(edition.uncertainty.session.L, '')}, on the control tile</Row>
        <Row name="Bought or lent">{obtained(units)}</Row>
        <Row name="Revision">{entry.revision}</Row>
      </dl>
      <ul className="mt-4 grid">
        <li>
          <Link
            href={`/devices/${record.slug}/readings`}
            prefetch={false}
            className="inline-flex min-h-11 items-center md:min-h-8"
          >
            Every reading
          </Link>
        </li>
        <li>
          <Link href="/method#figures" prefetch={false} className="inline-flex min-h-11 items-center md:min-h-8">
            How readings become figures
          </Link>
        </li>
      </ul>
    </section>
  )
}

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="flex justify-between gap-6 border-b border-rule py-2">
      <dt className="shrink-0">{name}</dt>
      <dd className="text-right">{children}</dd>
    </div>
  )
}

/** A standard deviation of L*, or why there is none. */
function spread(deviation: number | null, none: string): string {
  return deviation === null ? none : `${formatNumber(deviation, 2)} L*`
}

function obtained(units: DeviceRecord['units']): string {
  const count = (how: 'bought' | 'lent') => units.filter((unit) => unit.obtained === how).length
  return [
    count('bought') > 0 && `${formatNumber(count('bought'))} bought`,
    count('lent') > 0 && `${formatNumber(count('lent'))} lent`,
  ]
    .filter(Boolean)
    .join(', ')
}
