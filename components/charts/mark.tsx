import type { ReactNode } from 'react'

/** A point of a chart is a picture of its own that can have the focus: a reader may want just this one. */
const POINT = { role: 'img', tabIndex: 0 } as const

/** One point of a chart, with its value in words for whoever points at it, focuses it or has it read out. */
export function Mark({ label, children }: { label: string; children: ReactNode }) {
  return (
    <g data-mark {...POINT} aria-label={label}>
      <title>{label}</title>
      {children}
    </g>
  )
}
