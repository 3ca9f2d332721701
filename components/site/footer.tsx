import Link from 'next/link'
import type { Look } from '@/lib/look'
import { LookChoice } from './look-choice'
import { ROOMS } from './rooms'

const CAUTIONS = [
  'Not medical advice. Sudden changes in sight, pain or haloes belong to an eye-care professional.',
  'Comfort, “eye strain” and sleep are not rated.',
  'Light levels are bands, not measurements. Colours are approximate on your display.',
  'Water-resistance codes describe new devices in fresh water. Batteries and chargers: as their makers say.',
  'Local consumer law comes first.',
]

/** The cautions the product always carries, the rooms, the choice of theme, and that all of it is invented. */
export function Footer({ look }: { look: Look }) {
  return (
    <footer className="mt-16 border-t border-rule bg-sheet py-10">
      <div className="measure grid gap-10 md:grid-cols-[1.6fr_0.7fr_1.2fr]">
        <section aria-labelledby="cautions">
          <h2 id="cautions" className="font-text text-body font-semibold">
            Cautions
          </h2>
          <ul className="mt-2 grid max-w-prose gap-1 text-note text-soft">
            {CAUTIONS.map((caution) => (
              <li key={caution}>{caution}</li>
            ))}
          </ul>
        </section>
        <nav aria-label="Foot of the page">
          <ul className="grid text-small">
            {ROOMS.map((room) => (
              <li key={room.href}>
                <Link prefetch={false} href={room.href} className="inline-flex min-h-9 items-center">
                  {room.name}
                </Link>
              </li>
            ))}
            <li>
              <a href="/api/v1/editions/latest" className="inline-flex min-h-9 items-center">
                Latest edition as data
              </a>
            </li>
          </ul>
        </nav>
        <LookChoice look={look} />
      </div>
      <p className="measure mt-10 text-note text-soft">
        All devices, makers and figures here are invented for demonstration.
      </p>
    </footer>
  )
}
