import Link from 'next/link'
import type { Look } from '@/lib/look'
import { LookChoice } from './look-choice'
import { ALL_ROOMS } from './rooms'

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
      <div className="measure grid gap-10 md:grid-cols-2 lg:grid-cols-[1.5fr_1fr_1.1fr]">
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
        <nav aria-label="Foot of the page" className="grid grid-cols-2 gap-x-6">
          {ALL_ROOMS.map(({ name, rooms }) => (
            <section key={name}>
              <h2 className="font-text text-body font-semibold">{name}</h2>
              <ul className="mt-1 grid text-small">
                {rooms.map((room) => (
                  <li key={room.href}>
                    <Link prefetch={false} href={room.href} className="inline-flex min-h-11 items-center md:min-h-9">
                      {room.name}
                    </Link>
                  </li>
                ))}
                {name === 'Checking' && (
                  <li>
                    <a href="/feed.xml" className="inline-flex min-h-11 items-center md:min-h-9">
                      News as a feed
                    </a>
                  </li>
                )}
              </ul>
            </section>
          ))}
        </nav>
        <LookChoice look={look} />
      </div>
      <p className="measure mt-10 text-note text-soft">
        All devices, makers, people and figures here are invented for demonstration.
      </p>
    </footer>
  )
}
