import Link from 'next/link'
import { Pager } from '@/components/ui/pager'
import { type Column, Table } from '@/components/ui/table'
import type { Move, Standing } from '@/lib/edition/changes-ranks'
import { moveReasons } from '@/lib/edition/changes-words'
import { formatDoubt, formatNumber, formatOrdinal, formatRange } from '@/lib/format/number'
import { PER_PAGE } from '@/lib/server/path-page'
import { type Changelog, namesIn } from './changelog'

export const movedHref = (number: number, page: number) =>
  page === 1 ? `/editions/${number}#moved` : `/editions/${number}/moved/${page}`

/** Who moved in the ranking of a reader who answers nothing, from which band to which, and why. */
export function Moved({ changelog, page }: { changelog: Changelog; page: number }) {
  const { edition, previous, moves } = changelog
  if (!previous) return null
  const still = edition.devices.length - moves.filter(({ after }) => after).length
  return (
    <section aria-labelledby="moved">
      <h2 id="moved">Who moved, and why</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        The ranking of a reader who answers nothing, so that the{' '}
        <Link href="/method#spots" prefetch={false}>
          assumptions of the method
        </Link>{' '}
        stand in for the answers. A place is given with the band it may truly hold, at about 95 %; devices whose bands
        overlap may well stand the other way round.{' '}
        {still > 0 &&
          `${formatNumber(still)} ${still === 1 ? 'device keeps its place and band' : 'devices keep their place and band'}.`}
      </p>
      <Table
        className="mt-4"
        caption={`Places in the ranking by default answers, edition ${previous.number} and edition ${edition.number}`}
        captionHidden
        columns={columnsFor(changelog)}
        rows={moves.slice((page - 1) * PER_PAGE, page * PER_PAGE)}
        rowKey={({ slug }) => slug}
        empty="Nobody moved."
      />
      <Pager
        paging={{ page, perPage: PER_PAGE, hrefFor: (to) => movedHref(edition.number, to) }}
        total={moves.length}
        what="Devices"
      />
    </section>
  )
}

function columnsFor(changelog: Changelog): Column<Move>[] {
  const { edition, changes, corrected } = changelog
  const nameOf = namesIn(changelog)
  const change = new Map(changes?.changed.map((one) => [one.slug, one]))
  const isCorrected = (slug: string) => corrected.some((one) => one.slug === slug)
  const fit = ({ after }: Move) =>
    after ? (
      <span className="whitespace-nowrap">
        {formatNumber(after.fit, 1)} <span className="text-soft">{formatDoubt(2 * after.sd, 1)}</span>
      </span>
    ) : (
      '–'
    )
  return [
    {
      key: 'device',
      head: 'Device',
      label: 'Device',
      heading: true,
      cell: ({ slug }) => (
        <Link href={`/devices/${slug}`} prefetch={false} className="text-ink">
          {nameOf(slug)}
        </Link>
      ),
    },
    column('before', `Edition ${edition.number - 1}`, ({ before }) => <Place standing={before} />),
    column('after', `Edition ${edition.number}`, ({ after }) => <Place standing={after} />),
    column('fit', 'Fit now', fit, true),
    column('why', 'Why', (move) => (
      <span className="block max-w-[48ch] text-left">
        {moveReasons(move, change.get(move.slug), isCorrected(move.slug), nameOf).join(' ')}
      </span>
    )),
  ]
}

function column(key: string, label: string, cell: Column<Move>['cell'], numeric = false): Column<Move> {
  return { key, head: label, label, cell, numeric }
}

function Place({ standing }: { standing: Standing | null }) {
  if (!standing) return <span className="text-soft">not in it</span>
  const [best, worst] = standing.rank95
  return (
    <span className="whitespace-nowrap">
      {formatOrdinal(standing.place)} <span className="text-soft">({formatRange(best, worst)})</span>
    </span>
  )
}
