import type { CSSProperties } from 'react'
import { Gloom } from '@/components/gloom'
import { Sheet } from '@/components/sheet'
import { labToHex } from '@/lib/colour/display'
import type { Lab } from '@/lib/method/types'

/** A page as the lamp shows it, touching a strip of the control paper in the same light. Decoration. */
export function BesidePaper({
  drawn,
  gloom,
  paper,
  paperGloom,
  className = 'h-34 w-24 p-2.5 text-[9px]',
}: {
  drawn: { page: Lab; ink: Lab }
  gloom: number
  paper: Lab
  paperGloom: number
  className?: string
}) {
  return (
    <span aria-hidden="true" className="flex">
      <span className="relative">
        <Sheet {...drawn} className={className} />
        <Gloom gloom={gloom} />
      </span>
      <span className="relative -ml-(--sheet-edge) w-3">
        <span className="leaf block h-full" style={{ '--page': labToHex(paper) } as CSSProperties} />
        <Gloom gloom={paperGloom} />
      </span>
    </span>
  )
}
