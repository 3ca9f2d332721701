import Link from 'next/link'
import { formatTimes } from '@/lib/format/number'
import type { LitRow } from '@/lib/light/ranking'
import { canBeRead, FRONT_LIGHT_WORDS, placeInWords } from '@/lib/light/words'
import type { Lab } from '@/lib/method/types'
import { BesidePaper } from './beside-paper'
import type { LitPage } from './lit-page'

/**
 * The pages in their colours, in order, in rows of the booth: each touches a strip of the control paper under the same
 * lamp, and its words stand outside. Where sheets cannot be tinted the table below carries everything, so it goes.
 */
export function Gallery({
  rows,
  paper,
  paperGloom,
}: {
  rows: readonly LitRow<LitPage>[]
  paper: Lab
  paperGloom: number
}) {
  return (
    <ol
      aria-label="The pages in this light, most contrast first"
      className="grid grid-cols-2 gap-y-6 sm:grid-cols-3 md:grid-cols-4 lg:grid-cols-6 paper:hidden"
    >
      {rows.map(({ device, gloom, frontLight, ...row }) => (
        <li key={device.slug} className="min-w-0 content-start">
          <div className="flex justify-center bg-booth px-2 pt-5 pb-4">
            <BesidePaper drawn={device.drawn} gloom={gloom} paper={paper} paperGloom={paperGloom} />
          </div>
          <p className="px-1 pt-2.5 text-center leading-tight">
            <span className="block text-note text-soft">{placeInWords(row)}</span>
            <Link
              prefetch={false}
              href={`/devices/${device.slug}`}
              className="inline-flex min-h-11 items-center text-small sm:min-h-8"
            >
              {device.name}
            </Link>
            {canBeRead(row) && (
              <span className="block text-h3 font-semibold tabular-nums">{formatTimes(row.reserve)}</span>
            )}
            <span className="block text-note text-soft">
              {FRONT_LIGHT_WORDS[frontLight]}
              {device.assumed && <span className="block">colour as in daylight*</span>}
            </span>
          </p>
        </li>
      ))}
    </ol>
  )
}
