'use client'

import { AnimatePresence, m } from 'framer-motion'
import type { CSSProperties } from 'react'
import { Gloom } from '@/components/gloom'
import { Sheet } from '@/components/sheet'
import { labToHex } from '@/lib/colour/display'
import { formatNumber } from '@/lib/format/number'
import type { LampRow } from '@/lib/lamp/ranking'
import type { Lab } from '@/lib/method/types'

/**
 * The best pages in this light, in order, standing in the booth with a strip of the control paper; names and fits
 * outside it. A row of sheets on a desk, a column on a phone. The sheets darken as the light goes.
 * @param still nothing moves: the reader or the display wants it so
 */
export function BoothRow({
  rows,
  paper,
  paperGloom,
  still,
}: {
  rows: readonly LampRow[]
  paper: Lab
  paperGloom: number
  still: boolean
}) {
  return (
    <div className="relative">
      <div
        aria-hidden="true"
        className="absolute inset-y-0 left-0 w-24 rounded-card border-(length:--sheet-edge) border-black bg-booth sm:inset-x-0 sm:bottom-auto sm:h-55 sm:w-auto"
      />
      <ol className="relative grid sm:grid-cols-5" aria-label="The pages that fit best in this light, best first">
        <AnimatePresence initial={false} mode="popLayout">
          {rows.map(({ device, fit, readable, frontLight, gloom }) => (
            <m.li
              key={device.slug}
              layout={still ? false : 'position'}
              initial={still ? false : { opacity: 0 }}
              animate={{ opacity: 1 }}
              exit={still ? undefined : { opacity: 0 }}
              className="grid min-w-0 grid-cols-[6rem_1fr] items-center gap-4 py-1.5 sm:grid-cols-1 sm:content-start sm:items-start sm:gap-0 sm:py-0"
            >
              <div className="flex items-end justify-center sm:h-55 sm:pb-4">
                <Standing device={device} gloom={gloom} paper={paper} paperGloom={paperGloom} />
              </div>
              <p className="leading-tight sm:px-1 sm:pt-3 sm:text-center">
                <span className="text-note text-soft">{device.name}</span>
                <span className="block text-h3 font-semibold tabular-nums">
                  {readable ? formatNumber(fit) : <span className="text-small">not readable</span>}
                  {readable && <span className="sr-only"> of 100</span>}
                </span>
                <span className="block min-h-5 text-note text-soft">{FRONT_LIGHT[frontLight]}</span>
              </p>
            </m.li>
          ))}
        </AnimatePresence>
      </ol>
    </div>
  )
}

const FRONT_LIGHT: Record<LampRow['frontLight'], string> = {
  on: 'front light on',
  none: 'no front light',
  unstated: 'front light not stated',
  off: '',
}

/** Enough to fill the smallest sheet and fit on it. */
const SAMPLE =
  'The rain had come in off the estuary before anyone thought to light the lamps, and so we read by the window until the letters ran together.'

/** A sheet whose height follows the device's diagonal (a hint, not to scale), touching a strip of the control paper. */
function Standing({
  device,
  gloom,
  paper,
  paperGloom,
}: {
  device: LampRow['device']
  gloom: number
  paper: Lab
  paperGloom: number
}) {
  const desk = { '--desk-height': `${112 + 6 * (device.diagonal ?? 7)}px` } as CSSProperties
  return (
    <div
      style={desk}
      className="flex [--font:4.5px] [--height:4.25rem] [--inset:6px] [--width:3.25rem] sm:[--font:10px] sm:[--height:var(--desk-height)] sm:[--inset:11px] sm:[--width:min(6.6rem,14vw)]"
    >
      <span className="relative">
        <Sheet
          page={device.page}
          ink={device.ink}
          text={SAMPLE}
          style={{ width: 'var(--width)', height: 'var(--height)', padding: 'var(--inset)', fontSize: 'var(--font)' }}
        />
        <Gloom gloom={gloom} />
      </span>
      <span className="relative -ml-(--sheet-edge) w-2 sm:w-3">
        <span className="leaf block h-full" style={{ '--page': labToHex(paper) } as CSSProperties} aria-hidden="true" />
        <Gloom gloom={paperGloom} />
      </span>
    </div>
  )
}
