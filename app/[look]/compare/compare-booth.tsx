import Link from 'next/link'
import type { CSSProperties } from 'react'
import { labInWords } from '@/components/booth'
import { Sheet } from '@/components/sheet'
import { labToHex } from '@/lib/colour/display'
import { compareHref } from '@/lib/compare/address'
import type { EditionDevice, Lab } from '@/lib/method/types'

// A shadow at an edge where two pages meet would be seen as a difference.
const TOUCHING: CSSProperties = {
  width: '100%',
  height: 'auto',
  aspectRatio: '3 / 4',
  padding: 'clamp(0.3rem, 1.4vw, 1.1rem)',
  fontSize: 'clamp(0.4rem, 1.3vw, 1rem)',
  boxShadow: 'none',
}
/** The widest a page is drawn, so that all of them are in view at once. */
const WIDEST_REM = 17

/**
 * The pages edge to edge on a neutral grey, a strip of the control paper along the foot of all: a small difference is
 * seen at an edge and nowhere else. Captions stand outside.
 */
export function CompareBooth({ devices, paper }: { devices: readonly EditionDevice[]; paper: Lab }) {
  const columns = { gridTemplateColumns: `repeat(${devices.length}, minmax(0, 1fr))` }
  const strip = { '--page': labToHex(paper), '--page-ink': '#000' } as CSSProperties
  const slugs = devices.map(({ slug }) => slug)
  return (
    <figure className="mt-8 min-w-0">
      <div className="rounded-card border-(length:--sheet-edge) border-ink bg-booth px-5 py-6 sm:px-12 sm:py-10">
        <div className="mx-auto" style={{ maxWidth: `${WIDEST_REM * devices.length}rem` }}>
          <div className="grid" style={columns}>
            {devices.map(({ slug, page, ink }) => (
              <Sheet key={slug} page={page} ink={ink} style={TOUCHING} />
            ))}
          </div>
          <span aria-hidden="true" className="leaf block h-5 w-full sm:h-10" style={{ ...strip, boxShadow: 'none' }} />
        </div>
      </div>
      <figcaption className="mt-3">
        <p className="text-note text-soft">From left to right:</p>
        <ol
          className="grid gap-x-6 gap-y-3 sm:grid-cols-(--columns)"
          style={{ '--columns': columns.gridTemplateColumns } as CSSProperties}
        >
          {devices.map((device) => (
            <li key={device.slug}>
              <Link href={`/devices/${device.slug}`} prefetch={false} className="font-semibold">
                {device.name}
              </Link>
              {device.provisional && <span className="block text-note text-soft">provisional: one unit</span>}
              <span className="block text-note text-soft">{labInWords(device.page)}</span>
              <Link
                href={compareHref(slugs.filter((slug) => slug !== device.slug))}
                prefetch={false}
                className="inline-flex min-h-11 items-center text-small print:hidden"
              >
                Remove<span className="sr-only"> {device.name}</span>
              </Link>
            </li>
          ))}
        </ol>
        <p className="mt-2 max-w-[68ch] text-note text-soft">
          The strip along the foot is our control paper: {labInWords(paper)}. Colours are approximate on your display,
          and so is the difference between them; the words and figures below are measured.
        </p>
      </figcaption>
    </figure>
  )
}
