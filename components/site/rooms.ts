/** A room of the site as the navigation names it. */
export type Room = { href: `/${string}`; name: string }

/** The rooms there are, in the order of the masthead. A new room is added here and nowhere else. */
export const ROOMS: readonly Room[] = [
  { href: '/quiz', name: 'Quiz' },
  { href: '/devices', name: 'Devices' },
  { href: '/method', name: 'Method' },
]

/** Whether an address lies in a room: the room itself or anything below it. */
export function isIn(room: Room, pathname: string): boolean {
  return pathname === room.href || pathname.startsWith(`${room.href}/`)
}
