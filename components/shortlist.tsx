'use client'

import { LazyMotion, MotionConfig } from 'framer-motion'
import * as m from 'framer-motion/m'
import { useEffect, useState } from 'react'
import { formatNumber } from '@/lib/format/number'
import { motionWhenUsed } from './motion-when-used'

export type ShortlistRow = {
  slug: string
  name: string
  /** 0–100. */
  fit: number
  /** Standard deviation of the fit; null while the draws are still running. */
  sd: number | null
  /** Too close to call with the first. */
  tied: boolean
}

/**
 * The order of the devices so far, on a dark band. Rows glide to their new place in 200 ms when answers change; they
 * do not in the paper theme or where the reader asked for stillness.
 * @param excluded devices the limits leave out, each with the reason in words
 */
export function Shortlist({
  rows,
  excluded = [],
  limit = 7,
}: {
  rows: readonly ShortlistRow[]
  excluded?: readonly { slug: string; name: string; why: string }[]
  limit?: number
}) {
  const moves = useMotion()
  const shown = rows.slice(0, limit)
  const level = shown.filter((row) => row.tied).length
  return (
    <div>
      <LazyMotion features={motionWhenUsed} strict>
        <MotionConfig reducedMotion="user" transition={{ duration: moves / 1000, ease: 'easeOut' }}>
          <ol className="grid gap-3.5">
            {shown.map((row, i) => (
              <m.li key={row.slug} layout={moves > 0 ? 'position' : false}>
                <Place row={row} place={i + 1} />
              </m.li>
            ))}
          </ol>
        </MotionConfig>
      </LazyMotion>
      {level > 1 && <p className="mt-4 text-note text-soft">The {level} marked ● are too close to call.</p>}
      {rows.length > limit && (
        <p className="mt-2 text-note text-soft">and {formatNumber(rows.length - limit)} more behind them</p>
      )}
      {rows.length === 0 && <p>No device meets all of these limits.</p>}
      {excluded.length > 0 && <LeftOut excluded={excluded} />}
    </div>
  )
}

function Place({ row, place }: { row: ShortlistRow; place: number }) {
  const doubt = row.sd === null ? 0 : 2 * row.sd
  const from = Math.max(0, row.fit - doubt)
  const to = Math.min(100, row.fit + doubt)
  return (
    <div className="grid grid-cols-[1.5rem_1fr_3.5rem] items-center gap-2.5 text-small">
      <span className="text-soft tabular-nums">{place}</span>
      <div>
        <span>{row.name}</span>
        {row.tied && (
          <span className="ml-2 text-brass-lit">
            <span aria-hidden="true">●</span>
            <span className="sr-only">, too close to call</span>
          </span>
        )}
        <div
          aria-hidden="true"
          className="relative mt-1 h-1.5 rounded-card bg-deep-track paper:h-3 paper:border paper:border-ink"
        >
          <span className="absolute inset-y-0 left-0 rounded-card bg-brass-lit" style={{ width: `${row.fit}%` }} />
          {doubt > 0 && (
            <span
              className="doubt absolute inset-y-px rounded-card"
              style={{ left: `${from}%`, width: `${to - from}%` }}
            />
          )}
        </div>
      </div>
      <span className="text-right text-h3 tabular-nums">
        {formatNumber(row.fit)}
        {doubt > 0 && <span className="sr-only">, give or take {formatNumber(doubt)}</span>}
      </span>
    </div>
  )
}

function LeftOut({ excluded }: { excluded: readonly { slug: string; name: string; why: string }[] }) {
  return (
    <details className="mt-5 border-t border-rule pt-2 text-note">
      <summary className="flex min-h-11 cursor-pointer items-center">
        {formatNumber(excluded.length)} {excluded.length === 1 ? 'device' : 'devices'} left out, and why
      </summary>
      <ul className="grid gap-1 text-soft">
        {excluded.map((device) => (
          <li key={device.slug}>
            <span className="text-ink">{device.name}</span>: {device.why}
          </li>
        ))}
      </ul>
    </details>
  )
}

/** How long a movement may take here, ms: 0 in the paper theme and for those who asked for stillness. */
function useMotion(): number {
  const [milliseconds, setMilliseconds] = useState(0)
  useEffect(() => {
    setMilliseconds(Number(getComputedStyle(document.documentElement).getPropertyValue('--motion-ms')) || 0)
  }, [])
  return milliseconds
}
