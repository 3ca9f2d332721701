'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { publicPath } from '@/lib/look'
import { ALL_ROOMS, isIn, ROOMS } from './rooms'

const PHONE_ROOMS = ALL_ROOMS.flatMap(({ rooms }) => rooms)

/**
 * The rooms in a line; the one we are in is marked, by the server too, so it needs no JavaScript. Nothing is fetched
 * ahead: such a request tells the server where the reader is, and in the quiz that is what they answered.
 */
export function WideNavigation() {
  const pathname = publicPath(usePathname())
  return (
    <nav aria-label="Main" className="hidden gap-6 self-stretch text-small md:flex">
      {ROOMS.map((room) => (
        <Link
          prefetch={false}
          key={room.href}
          href={room.href}
          aria-current={isIn(room, pathname) ? 'page' : undefined}
          className="flex items-center border-y-3 border-transparent text-ink no-underline hover:underline aria-[current]:border-b-shade aria-[current]:font-semibold"
        >
          {room.name}
        </Link>
      ))}
    </nav>
  )
}

/** Every room behind a button on a phone. Going to another page closes it: `key` makes a new, closed one. */
export function PhoneNavigation() {
  const pathname = publicPath(usePathname())
  return (
    <details key={pathname} className="group/menu ml-auto md:hidden">
      <summary className="flex min-h-11 cursor-pointer list-none items-center rounded-card border border-edge px-4 font-semibold group-open/menu:bg-tint [&::-webkit-details-marker]:hidden">
        Menu
      </summary>
      <nav
        aria-label="Main"
        className="absolute inset-x-0 top-full z-20 grid border-y border-rule bg-sheet px-4 py-2 text-lead"
      >
        {PHONE_ROOMS.map((room) => (
          <Link
            prefetch={false}
            key={room.href}
            href={room.href}
            aria-current={isIn(room, pathname) ? 'page' : undefined}
            className="flex min-h-12 items-center border-l-3 border-transparent pl-3 text-ink no-underline hover:underline aria-[current]:border-shade aria-[current]:font-semibold"
          >
            {room.name}
          </Link>
        ))}
      </nav>
    </details>
  )
}
