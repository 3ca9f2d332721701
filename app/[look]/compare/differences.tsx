import Link from 'next/link'
import type { ReactNode } from 'react'
import { type Column, Table } from '@/components/ui/table'
import type { Compared, Difference, PairDifferences } from '@/lib/compare/differences'
import { SEEN, SMALLEST_STEP, seenWords } from '@/lib/compare/seen'
import { DECIMALS } from '@/lib/findings/decimals'
import { formatDoubt, formatNumber, THIN_SPACE } from '@/lib/format/number'

/** How the pages differ, pair by pair: in words first, then each difference with its doubt. */
export function Differences({ pairs }: { pairs: readonly PairDifferences[] }) {
  return (
    <section aria-labelledby="differences" className="mt-14">
      <h2 id="differences">How far the pages differ</h2>
      <ul className="mt-4 grid max-w-[68ch] gap-2">
        {pairs.map((pair) => (
          <li key={keyOf(pair)}>
            <SeenSentence pair={pair} />
          </li>
        ))}
      </ul>
      <Table
        className="mt-6"
        caption={`Differences of the pages. ± at about 95${THIN_SPACE}%; what two devices share of the doubt has dropped out.`}
        columns={COLUMNS}
        rows={pairs}
        rowKey={keyOf}
      />
      <div className="mt-4 grid max-w-[68ch] gap-2 text-small text-soft">
        <p>
          The words are a convention of this house, by the colour difference ΔE<sub>00</sub> of the two pages: below{' '}
          {SEEN[1].from} {SEEN[0].words}; from {SEEN[1].from} {SEEN[1].words}; from {SEEN[2].from} {SEEN[2].words}. A
          difference no larger than its doubt is too close to call.
        </p>
        <p>
          † Whiteness and tint are outside their formula’s limits on every electronic page. Steps of whiteness below
          about {SMALLEST_STEP.whiteness} and of tint below about {formatNumber(SMALLEST_STEP.tint, 1)} are commonly
          described as too small to be seen.{' '}
          <Link href="/method#q-whiteness" prefetch={false}>
            Why we publish them
          </Link>
          .
        </p>
      </div>
    </section>
  )
}

const keyOf = ({ one, other }: PairDifferences) => `${one.slug} ${other.slug}`

function SeenSentence({ pair: { one, other, colour } }: { pair: PairDifferences }) {
  const { words, orPerhaps } = seenWords(colour.deltaE00, colour.doubt)
  return (
    <>
      <strong>{one.name}</strong> and <strong>{other.name}</strong>: {words}
      {orPerhaps.length > 0 && `; within the doubt perhaps ${orPerhaps.join(', or ')}`}.
    </>
  )
}

const MORE: Record<Compared, string> = {
  lightness: 'lighter',
  whiteness: 'whiter by the formula',
  tint: 'greener by the formula',
  contrast: 'more contrast',
}

function difference(name: Compared, label: string, head: ReactNode = label): Column<PairDifferences> {
  return {
    key: name,
    label,
    head,
    cell: (pair) => <DifferenceText pair={pair} name={name} />,
  }
}

function DifferenceText({ pair, name }: { pair: PairDifferences; name: Compared }) {
  const { by, doubt, close, small }: Difference = pair[name]
  const more = by > 0 ? pair.one : pair.other
  const figure = (
    <span className="whitespace-nowrap tabular-nums">
      {formatNumber(Math.abs(by), DECIMALS[name])}{' '}
      <span className="text-soft">{formatDoubt(doubt, DECIMALS[name])}</span>
    </span>
  )
  return (
    <span className="@max-[40rem]:text-right">
      {figure}
      <span className="block text-note text-soft">
        {close ? 'too close to call' : `${more.name}: ${MORE[name]}${small ? ', a step too small to be seen' : ''}`}
      </span>
    </span>
  )
}

const COLUMNS: Column<PairDifferences>[] = [
  {
    key: 'pair',
    label: 'Pages of',
    head: 'Pages of',
    heading: true,
    cell: ({ one, other }) => `${one.name} and ${other.name}`,
  },
  {
    key: 'colour',
    label: 'Colour ΔE00',
    head: (
      <>
        Colour ΔE<sub>00</sub>
      </>
    ),
    cell: ({ colour }) => (
      <span className="whitespace-nowrap tabular-nums">
        {formatNumber(colour.deltaE00, DECIMALS.difference)}{' '}
        <span className="text-soft">{formatDoubt(colour.doubt, DECIMALS.difference)}</span>
      </span>
    ),
  },
  difference('lightness', 'Lightness L*'),
  difference(
    'whiteness',
    'Whiteness W10 †',
    <>
      Whiteness W<sub>10</sub> †
    </>,
  ),
  difference(
    'tint',
    'Tint T10 †',
    <>
      Tint T<sub>10</sub> †
    </>,
  ),
  difference('contrast', 'Contrast, to 1'),
]
