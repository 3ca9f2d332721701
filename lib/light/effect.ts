import { formatNumber, formatRange } from '@/lib/format/number'
import type { LampColour } from './colours'
import { type LampName, lampNamed } from './lamps'

/** Change of colour that is just seen side by side, ΔE00; see lib/colour/difference.ts. */
const JUST_SEEN = 1
/** Smaller moves of one channel are not named, units of a* or b* (house). */
const WORTH_NAMING = 0.2

/**
 * What a lamp does to the colours of these pages, in sentences that say only what the figures show: how far they move,
 * which moves most and which way, and what becomes of the light they return.
 */
export function lampEffect(lamp: LampName, pages: readonly { name: string; colour: LampColour }[]): string[] {
  const { phrase } = lampNamed(lamp)
  if (lamp === 'D65') return ['This is the light every page was measured for, so nothing moves.']
  const byChange = [...pages].sort((one, other) => other.colour.change - one.colour.change)
  const [most, least] = [byChange[0], byChange.at(-1)]
  if (!most || !least) return []
  const count = pages.length === 1 ? 'the page moves' : `the ${formatNumber(pages.length)} pages with a spectrum move`
  const range = formatRange(least.colour.change, most.colour.change, 1)
  const seen = byChange.filter(({ colour }) => colour.change >= JUST_SEEN).length
  const way = direction(most.colour)
  const returned = pages.map(({ colour }) => 100 * (colour.lamp.xyz.Y / colour.daylight.xyz.Y - 1))
  return [
    `To eyes used to it, ${count} by ΔE00 ${range} from how daylight shows ${pages.length === 1 ? 'it' : 'them'} ${phrase}; about ${JUST_SEEN} is just seen side by side, and ${seenInWords(seen, pages.length)}.`,
    ...(pages.length > 1 && way ? [`${most.name} moves most: it turns ${way}.`] : way ? [`It turns ${way}.`] : []),
    `The light they return changes by ${formatRange(Math.min(...returned), Math.max(...returned), 1).replace('–', ' to ')} %, which is left out of the order.`,
  ]
}

function seenInWords(seen: number, all: number): string {
  if (seen === 0) return all === 1 ? 'this is less' : 'all of them move less'
  if (seen === all) return all === 1 ? 'this is more' : 'all of them move as much or more'
  return `${formatNumber(seen)} of them ${seen === 1 ? 'moves' : 'move'} as much or more`
}

/** Which way a colour moves, the larger part first; null where it hardly does. */
function direction({ lamp, daylight }: LampColour): string | null {
  const a = lamp.inDaylight.a - daylight.inDaylight.a
  const b = lamp.inDaylight.b - daylight.inDaylight.b
  const parts = [
    { by: a, word: a < 0 ? 'greener' : 'redder', channel: 'a*' },
    { by: b, word: b < 0 ? 'bluer' : 'yellower', channel: 'b*' },
  ]
    .filter(({ by }) => Math.abs(by) >= WORTH_NAMING)
    .sort((one, other) => Math.abs(other.by) - Math.abs(one.by))
    .map(({ by, word, channel }) => `${word} (${channel} ${by > 0 ? '+' : ''}${formatNumber(by, 1)})`)
  return parts.length > 0 ? parts.join(' and ') : null
}
