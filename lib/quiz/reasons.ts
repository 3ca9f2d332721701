import { standingBy } from '@/lib/findings/standing'
import { formatList } from '@/lib/format/list'
import { formatExact, formatNumber, formatUnit } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { handlingWish, trapezoid } from '@/lib/method/handling'
import { eyeOf } from '@/lib/method/reserve'
import { AIMS, type Aim, type Answers, type Edition, type EditionDevice, type ScoredDevice } from '@/lib/method/types'
import { READING_ANCHORS } from '@/lib/vision/contrast-reserve'
import { deviceInLight } from './in-light'
import type { NamedSpot } from './request'
import { spotPhrase } from './spot-phrases'
import { HEAVY_TO_HOLD, LIGHT_TO_HOLD, LITTLE_TINT, SAME_FIT, SUITS, TINTS, UNSUITED } from './thresholds'
import { AIM_PHRASES } from './words'

/** What speaks for a device and what against it, each a clause about "it", with the numbers it rests on. */
export type Reasons = { pro: string[]; contra: string[] }

type Clause = { aim: Aim; text: string; good: boolean }
type Reader = { edition: Edition; answers: Answers; spots: readonly NamedSpot[]; left: readonly EditionDevice[] }

/** More reasons than this are none. */
const MOST_REASONS = 4

/**
 * Why this device, in plain words built from its own numbers; of many reasons the light's and those of the aims that
 * weigh most.
 * @param reader.left devices the limits leave, this one among them
 */
export function reasonsFor(device: EditionDevice, weights: Record<Aim, number>, reader: Reader): Reasons {
  const clauses = [
    ...clarityClauses(device, reader),
    ...lightnessClause(device, reader),
    ...tintClause(device, reader),
    ...handlingClauses(device, reader),
  ].filter(({ aim }) => weights[aim] > 0)
  const pro = clauses.filter(({ good }) => good)
  // What a page gives in the reader's light is what we are asked; it is never left out.
  const rank = (aim: Aim) => (aim === 'clarity' ? Infinity : weights[aim])
  const weightiest = [...pro].sort((one, other) => rank(other.aim) - rank(one.aim)).slice(0, MOST_REASONS)
  return {
    pro: pro.filter((clause) => weightiest.includes(clause)).map(({ text }) => text),
    contra: clauses.filter(({ good }) => !good).map(({ text }) => text),
  }
}

/** Clauses as one sentence with a capital and a full stop; empty where there are none. */
export function sentenceOf(clauses: readonly string[]): string {
  const all = formatList(clauses)
  return all && `${all[0]?.toUpperCase()}${all.slice(1)}.`
}

/** In the spot with the most hours of those it can be read in, then every spot in which it cannot. */
function clarityClauses(device: EditionDevice, { answers, spots }: Reader): Clause[] {
  const eye = eyeOf(answers.lightNeed, answers.text)
  const seen = spots.map((spot) => ({ spot, ...deviceInLight(device, spot, eye) }))
  const lit = seen.filter(({ readable }) => readable)
  const main = lit.reduce<(typeof lit)[number] | null>(
    (most, one) => (most && most.spot.hours >= one.spot.hours ? most : one),
    null,
  )
  const clauses: Clause[] = []
  if (main) {
    const { fluent, best } = READING_ANCHORS
    const enough =
      main.reserve < fluent
        ? ', enough to read but short of fluent'
        : main.reserve >= best
          ? ', all that the easiest reading asks for'
          : ''
    const aided = main.frontLightOn ? ', with its front light on,' : ''
    clauses.push({
      aim: 'clarity',
      text: `${spotPhrase(main.spot)}${aided} its page keeps ${formatNumber(main.reserve, 1)} times the contrast your eyes need${enough}`,
      good: main.reserve >= fluent,
    })
  }
  const dark = seen.filter(({ readable }) => !readable).map(({ spot }) => spotPhrase(spot))
  if (dark.length > 0) clauses.push({ aim: 'clarity', text: `${formatList(dark)} it cannot be read`, good: false })
  return clauses
}

function tintClause(device: EditionDevice, { answers }: Reader): Clause[] {
  const white = METHOD.criteria.preferredWhite.value[answers.preferredWhite]
  const [a, b] = [device.page.a - white.a, device.page.b - white.b]
  const distance = Math.hypot(a, b)
  const tint = TINTS.find(({ below }) => distance < below)!
  const colour = Math.abs(a) > Math.abs(b) ? (a < 0 ? 'greenish' : 'pinkish') : b < 0 ? 'bluish' : 'yellowish'
  const figure = `a*\u00a0${formatNumber(device.page.a, 1)}, b*\u00a0${formatNumber(device.page.b, 1)}`
  const text =
    answers.preferredWhite !== 'neutral'
      ? `it ${tint.near} the ${answers.preferredWhite} white you like (${figure})`
      : `it ${tint.words.replace('tint', tint === TINTS[0] ? 'tint' : `${colour} tint`)} (${figure})`
  return [{ aim: 'tint', text, good: distance < LITTLE_TINT }]
}

/** Where its lightness stands among the devices left, as far as the doubts allow to say. */
function lightnessClause(device: EditionDevice, { edition, left }: Reader): Clause[] {
  if (left.length < 3) return []
  const { place, best, worst, of } = standingBy({ ...edition, devices: left }, device, ({ page }) => page.L)
  const clause = (words: string, good: boolean): Clause[] => [
    { aim: 'whiteness', text: `its page is ${words} (L*\u00a0${formatNumber(device.page.L, 1)})`, good },
  ]
  const these = `of these ${formatNumber(of)}`
  if (place === 1 && worst === 1) return clause(`the lightest ${these}`, true)
  if (best === 1) return clause(`among the lightest ${these}`, true)
  if (worst === of) return clause(`among the darkest ${these}`, false)
  return place <= of / 2 ? clause('lighter than most', true) : clause('darker than most', false)
}

const HOLD_WORDS = { 'one-hand': 'in one hand', 'two-hands': 'in two hands', table: '' } as const

function handlingClauses({ weight, diagonal }: EditionDevice, { answers }: Reader): Clause[] {
  const clauses: Clause[] = []
  const say = (text: string, good: boolean) => clauses.push({ aim: 'handling', text, good })
  const [light, heavy] = [LIGHT_TO_HOLD[answers.hold], HEAVY_TO_HOLD[answers.hold]]
  if (weight !== null && light !== null && heavy !== null) {
    const held = `to hold ${HOLD_WORDS[answers.hold]} (${formatUnit(weight, 'g')})`
    if (weight <= light) say(`it is light ${held}`, true)
    else if (weight >= heavy) say(`it is heavy ${held}`, false)
  }
  const { shares } = handlingWish(answers.reads, answers.hold)
  if (diagonal !== null && shares.length > 0) {
    const sizes = METHOD.handling.sizes.value
    const suits = shares.reduce((sum, { kind, share }) => sum + share * trapezoid(diagonal, sizes[kind]), 0)
    const middle = shares.reduce((sum, { kind, share }) => sum + (share * (sizes[kind][1] + sizes[kind][2])) / 2, 0)
    const size = `its ${formatExact(diagonal)} inches`
    if (suits >= SUITS) say(`${size} suit what you read`, true)
    else if (suits < UNSUITED) say(`${size} are ${diagonal < middle ? 'small' : 'large'} for what you read`, false)
  }
  return clauses
}

/**
 * Where the lead over the next comes from: the aims that bring the most and cost the most points.
 * @returns null where there is no next
 */
export function leadSentence(
  ranked: readonly Pick<ScoredDevice, 'slug' | 'fit' | 'contributions'>[],
  nameOf: (slug: string) => string,
): string | null {
  const [first, second] = ranked
  if (!first || !second) return null
  const same = ranked.filter(({ fit }) => first.fit - fit < SAME_FIT)
  if (same.length === ranked.length) return 'Nothing in your answers tells these devices apart: all have the same fit.'
  if (same.length > 1) {
    const names = formatList(same.slice(1, 5).map(({ slug }) => nameOf(slug)))
    const more = same.length > 5 ? ` and ${same.length - 5} more` : ''
    return `It has the same fit as ${names}${more}, to a tenth of a point.`
  }
  const gains = AIMS.map((aim) => ({ aim, points: first.contributions[aim] - second.contributions[aim] }))
  const [most, least] = [
    gains.reduce((one, other) => (other.points > one.points ? other : one)),
    gains.reduce((one, other) => (other.points < one.points ? other : one)),
  ]
  const ahead = `${points(first.fit - second.fit)} ahead of ${nameOf(second.slug)}`
  const gain = `${points(most.points)} more for ${AIM_PHRASES[most.aim]}`
  if (least.points > -SAME_FIT) return `It is ${ahead}, with ${gain}.`
  return `It is ${ahead}: ${gain}, ${points(-least.points)} fewer for ${AIM_PHRASES[least.aim]}.`
}

function points(value: number): string {
  const shown = formatNumber(value, 1)
  return `${shown} ${shown === '1.0' ? 'point' : 'points'}`
}
