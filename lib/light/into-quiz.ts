import { SPOTS } from '@/lib/method/spots'
import { type LightChoice, queryFrom } from './choice'

/** Hours a week a light is taken into the quiz with: an hour a day (house); the reader changes them there. */
const HOURS = '7'

/**
 * The quiz's second step with this light as a reading spot, a listed one where its light is the same. Written out here
 * and in the quiz's own canonical form, so that the browser need not carry the quiz to link to it.
 */
export function quizWithLight({ lux, frontLight, lightNeed, text }: LightChoice): string {
  const listed = SPOTS.find((spot) => spot.lux === lux)
  const spot: [string, string | null][] = listed
    ? [
        [listed.slug, HOURS],
        [`${listed.slug}.light`, frontLight === listed.frontLight ? null : frontLight ? 'on' : 'off'],
      ]
    : [
        ['own1', HOURS],
        ['own1.name', 'In+my+light'],
        ['own1.lux', String(lux)],
        ['own1.light', frontLight ? null : 'off'],
      ]
  const eyes: [string, string | null][] = [
    ['light-need', lightNeed === 'usual' ? null : lightNeed],
    ['type-size', text === 'normal' ? null : text],
  ]
  const given = [['step', '2'], ...spot, ...eyes].filter((pair): pair is [string, string] => pair[1] !== null)
  return `/quiz?${queryFrom(given)}`
}
