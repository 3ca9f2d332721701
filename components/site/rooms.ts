/** A room of the site as the navigation names it. */
export type Room = { href: `/${string}`; name: string }

/** The rooms of the masthead, in its order. */
export const ROOMS: readonly Room[] = [
  { href: '/quiz', name: 'Quiz' },
  { href: '/devices', name: 'Devices' },
  { href: '/compare', name: 'Compare' },
  { href: '/light', name: 'In your light' },
  { href: '/for', name: 'Readers' },
  { href: '/method', name: 'Method' },
  { href: '/editions', name: 'Editions' },
  { href: '/data', name: 'Data' },
]

/** Every room, as the foot of each page lists them: for choosing, and for checking what we say. */
export const ALL_ROOMS: readonly { name: string; rooms: readonly Room[] }[] = [
  {
    name: 'Choosing',
    rooms: [
      { href: '/quiz', name: 'Quiz' },
      { href: '/devices', name: 'Devices' },
      { href: '/compare', name: 'Compare' },
      { href: '/light', name: 'In your light' },
      { href: '/for', name: 'Typical readers' },
    ],
  },
  {
    name: 'Checking',
    rooms: [
      { href: '/method', name: 'Method' },
      { href: '/glossary', name: 'Glossary' },
      { href: '/editions', name: 'Editions' },
      { href: '/corrections', name: 'Corrections' },
      { href: '/data', name: 'Data and API' },
      { href: '/about', name: 'About' },
    ],
  },
]

/** Whether an address lies in a room: the room itself or anything below it. */
export function isIn(room: Room, pathname: string): boolean {
  return pathname === room.href || pathname.startsWith(`${room.href}/`)
}
