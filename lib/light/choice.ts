import { OPENING_LUX } from '@/lib/lamp/levels'
import type { LightNeed, TextSize } from '@/lib/method/types'
import type { LampName } from './lamps'

/** What the page of a light is asked for. */
export type LightChoice = {
  /** Light on the page, lux, 0.1–80,000. */
  lux: number
  lamp: LampName
  /** Whether devices that have a front light have it on. */
  frontLight: boolean
  lightNeed: LightNeed
  text: TextSize
  /** Slugs of the pages to show; none means all. */
  chosen: readonly string[]
  /** Which numbered page, from 1, where a theme has numbered pages. */
  page: number
}

/** What is shown where nothing is asked: the lamp of the home page, in the light everything was measured for. */
export const OPENING: LightChoice = {
  lux: OPENING_LUX,
  lamp: 'D65',
  frontLight: false,
  lightNeed: 'usual',
  text: 'normal',
  chosen: [],
  page: 1,
}

/** Names and texts of the address, in canonical order, without what is as it opens. */
export function pairsOf(choice: LightChoice): [string, string][] {
  const pairs: [string, string, boolean][] = [
    ['lux', String(choice.lux), choice.lux !== OPENING.lux],
    ['lamp', choice.lamp, choice.lamp !== OPENING.lamp],
    ['front', 'on', choice.frontLight],
    ['light-need', choice.lightNeed, choice.lightNeed !== OPENING.lightNeed],
    ['type-size', choice.text, choice.text !== OPENING.text],
    ['with', choice.chosen.join(','), choice.chosen.length > 0],
    ['page', String(choice.page), choice.page > 1],
  ]
  return pairs.filter(([, , told]) => told).map(([name, text]) => [name, text])
}

/** Names and texts as a query; all of them are of letters that may stand in one as they are. */
export function queryFrom(pairs: readonly (readonly [name: string, text: string])[]): string {
  return pairs.map(([name, text]) => `${name}=${text}`).join('&')
}

/** The short, canonical address of a choice. */
export function lightHref(choice: LightChoice): string {
  const query = queryFrom(pairsOf(choice))
  return query ? `/light?${query}` : '/light'
}
