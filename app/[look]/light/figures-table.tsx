import Link from 'next/link'
import { Pager, type Paging } from '@/components/ui/pager'
import { Table } from '@/components/ui/table'
import { formatDoubt, formatNumber, formatTimes, THIN_SPACE } from '@/lib/format/number'
import type { LightChoice } from '@/lib/light/choice'
import type { LitPaper, LitRow } from '@/lib/light/ranking'
import { FRONT_LIGHT_WORDS, placeInWords, READING_WORDS } from '@/lib/light/words'
import { METHOD } from '@/lib/method/constants'
import { PRINT_LIGHTNESS } from '@/lib/quiz/in-light'
import type { LitPage } from './lit-page'

type Row = LitRow<LitPage>

/** The same pages in figures, each with its doubt; numbered pages where the theme wants them. */
export function FiguresTable({
  rows,
  paper,
  choice,
  paging,
}: {
  rows: readonly Row[]
  paper: LitPaper
  choice: LightChoice
  paging: Paging | null
}) {
  const { page, perPage } = paging ?? { page: 1, perPage: rows.length }
  const at = Math.min(page, Math.max(1, Math.ceil(rows.length / perPage)))
  return (
    <div className="card p-4 sm:p-5">
      <Table
        caption={caption(choice)}
        columns={COLUMNS}
        rows={rows.slice((at - 1) * perPage, at * perPage)}
        rowKey={({ device }) => device.slug}
      />
      {paging && <Pager paging={{ ...paging, page: at }} total={rows.length} what="Pages" />}
      <p className="mt-4 max-w-[80ch] text-note text-soft">
        Our control paper in the same light: {cd(paper.luminance)}, and {formatTimes(paper.reserve)} with print of L*{' '}
        {formatNumber(PRINT_LIGHTNESS)} (house); it has no light of its own. “±” is at about 95 %; what is closer than
        the doubt of the difference is too close to call. The marks 3, 10 and 30 are from memory. Lux are a band and not
        a measurement, so luminances are only as good as the light you set.
      </p>
    </div>
  )
}

function caption({ lightNeed, text, frontLight }: LightChoice): string {
  const age = METHOD.reserve.age.value[lightNeed]
  const need = {
    usual: 'the usual need of light',
    more: 'a need of more light',
    'much-more': 'a need of much more light',
  }
  const lit = frontLight
    ? ` Front lights are turned up to ${METHOD.light.comfort.value} cd/m² of page, or as far as they go.`
    : ' Front lights are off.'
  return `For ${text} text and eyes with ${need[lightNeed]} (worked as at ${age} years). Reading takes 3 times what the eye needs, fluent reading 10, the easiest 30.${lit}`
}

const cd = (luminance: number) => `${figure(luminance)}${THIN_SPACE}cd/m²`

/** Three figures or so: luminances run from a thousandth to ten thousand. */
function figure(luminance: number): string {
  return formatNumber(luminance, decimalsOf(luminance))
}

function decimalsOf(luminance: number): number {
  if (luminance >= 100) return 0
  if (luminance >= 10) return 1
  return luminance >= 0.1 ? 2 : 3
}

const COLUMNS = [
  {
    key: 'device',
    head: 'Device',
    label: 'Device',
    heading: true,
    cell: ({ device }: Row) => (
      <Link prefetch={false} href={`/devices/${device.slug}`}>
        {device.name}
      </Link>
    ),
  },
  {
    key: 'place',
    head: 'Place',
    label: 'Place',
    cell: (row: Row) => <span className="block sm:w-24">{placeInWords(row)}</span>,
  },
  {
    key: 'reserve',
    head: 'Contrast reserve',
    label: 'Contrast reserve',
    numeric: true,
    cell: ({ reserve, reserveDoubt }: Row) => (
      <Doubted value={formatTimes(reserve)} doubt={reserveDoubt} decimals={1} />
    ),
  },
  {
    key: 'reading',
    head: 'Enough for',
    label: 'Enough for',
    cell: ({ reading }: Row) => <span className="sm:whitespace-nowrap">{READING_WORDS[reading]}</span>,
  },
  {
    key: 'luminance',
    head: 'Page luminance, cd/m²',
    label: 'Page luminance, cd/m²',
    numeric: true,
    cell: ({ luminance, luminanceDoubt, ofPaper, frontLight }: Row) => (
      <span>
        <Doubted value={figure(luminance)} doubt={luminanceDoubt} decimals={decimalsOf(luminance)} />
        <span className="block text-note text-soft">
          {ofPaper !== null && `${formatNumber(ofPaper, ofPaper < 10 ? 2 : 0)}× the paper`}
          {frontLight !== 'off' && `, ${FRONT_LIGHT_WORDS[frontLight]}`}
        </span>
      </span>
    ),
  },
  {
    key: 'needs',
    head: 'Light it needs to match the paper, front light off',
    label: 'Light to match the paper',
    numeric: true,
    cell: ({ device: { timesTheLight } }: Row) => (
      <Doubted value={`${formatNumber(timesTheLight.value, 2)}×`} doubt={timesTheLight.doubt} decimals={2} />
    ),
  },
]

/** Below this a doubt is only the rounding of the arithmetic. */
const NO_DOUBT = 1e-6

/** A figure and its doubt; without one where there is none: a front light alone sets it, or nothing is seen. */
function Doubted({ value, doubt, decimals }: { value: string; doubt: number; decimals: number }) {
  return (
    <span className="whitespace-nowrap">
      {value} {doubt >= NO_DOUBT && <span className="text-note text-soft">{formatDoubt(doubt, decimals)}</span>}
    </span>
  )
}
