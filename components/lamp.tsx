import type { CSSProperties } from 'react'
import { clamp } from '@/lib/method/light'
import styles from './lamp.module.css'

/** Light at which the drawn beam is full, lux: a lamp over the shoulder. Above it daylight whitens it (house). */
const FULL = 250
const WHITE = 80_000

/**
 * The lamp over the pages and its beam: out with the lights off, amber at the bedside, white as the sun. Decoration;
 * the light stands in words beside it.
 */
export function Lamp({ lux }: { lux: number }) {
  const glow = clamp(Math.log10(lux / 0.1) / Math.log10(FULL / 0.1))
  const day = clamp(Math.log10(lux / FULL) / Math.log10(WHITE / FULL))
  return (
    <div aria-hidden="true" className="pointer-events-none absolute inset-0 hidden sm:block">
      <div
        className={`${styles.beam} absolute inset-x-0 top-40 h-72 transition-opacity duration-200 paper:hidden`}
        style={{ opacity: glow, '--day': `${Math.round(day * 100)}%` } as CSSProperties}
      />
      <svg
        aria-hidden="true"
        viewBox="0 0 260 170"
        className="paper:[--lamp-fill:var(--color-sheet)] absolute top-0 left-1/2 w-62 -translate-x-1/2 overflow-visible"
        fill="none"
      >
        <path d="M130 0v60" className="stroke-brass-lit stroke-4" />
        <path d="M40 157C40 100 78 58 130 58s90 42 90 99z" className={styles.shade} />
        <path d="M60 146c4-38 30-68 58-74" className={`${styles.shine} stroke-5 paper:hidden`} strokeLinecap="round" />
        <path
          d="M88 170L18 238M172 170l70 68"
          className="hidden stroke-ink stroke-2 paper:block"
          strokeDasharray="6 6"
        />
        <path d="M26 160.5h208" className="stroke-brass-lit stroke-8" strokeLinecap="round" />
      </svg>
    </div>
  )
}
