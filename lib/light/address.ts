import * as z from 'zod/mini'
import { shown } from '@/lib/contract/shown'
import { formatExact } from '@/lib/format/number'
import { BRIGHTEST_LUX, DARKEST_LUX, LAST_STEP, luxAt, parseLux } from '@/lib/lamp/levels'
import { LIGHT_NEEDS, TEXT_SIZES } from '@/lib/method/types'
import { type LightChoice, OPENING } from './choice'
import { LAMP_NAMES } from './lamps'

/** An address read: what is shown, and in words whatever was not taken as it stood. */
export type LightAddress = { choice: LightChoice; notes: string[] }

/** Longer than any list of devices; what follows is not read. */
const MOST_CHOSEN = 60
const LONGEST_SLUG = 80

const slug = z.string().check(z.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/), z.maxLength(LONGEST_SLUG))
const fields = {
  lux: z.string(),
  step: z.string().check(z.regex(/^\d{1,3}$/)),
  lamp: z.enum(LAMP_NAMES),
  front: z.enum(['on', 'off']),
  'light-need': z.enum(LIGHT_NEEDS),
  'type-size': z.enum(TEXT_SIZES),
  page: z.string().check(z.regex(/^[1-9]\d{0,3}$/)),
} as const
type Field = keyof typeof fields

const RIGHT: Record<Field, string> = {
  lux: `a number of lux from ${formatExact(DARKEST_LUX)} to ${formatExact(BRIGHTEST_LUX)}`,
  step: 'a step of the slider',
  lamp: `one of the lamps (${LAMP_NAMES.join(', ')})`,
  front: 'on or off',
  'light-need': `one of ${LIGHT_NEEDS.join(', ')}`,
  'type-size': `one of ${TEXT_SIZES.join(', ')}`,
  page: 'a number of a page',
}

type Search = Record<string, string | string[] | undefined>

/**
 * Reads the choice in an address or a form, tolerantly: blanks and unknown names count for nothing, a light outside the
 * slider takes its nearer end, and whatever else is not understood is left as it opens, and told. Never throws.
 * @param known slugs of the devices there are; null where nobody knows yet
 */
export function readLight(search: Search, known: readonly string[] | null): LightAddress {
  const notes: string[] = []
  function read<F extends Field>(field: F): z.infer<(typeof fields)[F]> | undefined {
    const given = [search[field] ?? []].flat().filter((text) => text.trim() !== '')
    if (given.length === 0) return undefined
    if (given.length > 1) {
      notes.push(`“${field}” is given ${given.length} times, so it is left as it opens.`)
      return undefined
    }
    const parsed = z.safeParse(fields[field], given[0]?.trim())
    if (parsed.success) return parsed.data as z.infer<(typeof fields)[F]>
    notes.push(`${shown(given[0] ?? '')} is not ${RIGHT[field]}.`)
    return undefined
  }

  const lux = luxFrom(read('lux'), notes)
  const step = read('step')
  const choice: LightChoice = {
    lux: lux ?? (step === undefined ? OPENING.lux : luxAt(Math.min(Number(step), LAST_STEP))),
    lamp: read('lamp') ?? OPENING.lamp,
    frontLight: read('front') === 'on',
    lightNeed: read('light-need') ?? OPENING.lightNeed,
    text: read('type-size') ?? OPENING.text,
    chosen: chosenFrom(search.with, known, notes),
    page: Number(read('page') ?? OPENING.page),
  }
  return { choice, notes }
}

function luxFrom(text: string | undefined, notes: string[]): number | undefined {
  if (text === undefined) return undefined
  const held = parseLux(text)
  if (held === null) {
    notes.push(`${shown(text)} is not ${RIGHT.lux}.`)
    return undefined
  }
  const asked = Number(text.replaceAll(',', ''))
  if (held !== asked) {
    notes.push(`${formatExact(asked)} lux lies outside the lamp’s range; shown is ${formatExact(held)} lux.`)
  }
  return held
}

/** The chosen devices in the order of the alphabet, each once; all of them is the same as none. */
function chosenFrom(given: string | string[] | undefined, known: readonly string[] | null, notes: string[]): string[] {
  const asked = [...new Set([given ?? []].flat().flatMap((text) => text.split(',')))]
    .map((text) => text.trim())
    .filter((text) => text !== '')
  if (asked.length > MOST_CHOSEN) notes.push(`No more than ${MOST_CHOSEN} devices are read from an address.`)
  const taken = asked.slice(0, MOST_CHOSEN)
  const there = taken.filter((text) => z.safeParse(slug, text).success && (known?.includes(text) ?? true))
  const missing = taken.filter((text) => !there.includes(text))
  if (missing.length > 0) {
    const [first = '', ...more] = missing
    notes.push(
      more.length === 0
        ? `There is no device ${shown(first)} in this edition.`
        : `There is no device ${shown(first)} in this edition, nor ${more.length} more that were named.`,
    )
  }
  return known && there.length === known.length ? [] : there.sort()
}
