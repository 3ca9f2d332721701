import { formatList } from '@/lib/format/list'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatLux, formatNumber, formatOrdinal, formatUnit, THIN_SPACE } from '@/lib/format/number'
import { AIMS, READING_KINDS } from '@/lib/method/types'
import { PLACES, type QuizAnswers, SWITCHES } from './answers'
import { namedSpots } from './request'
import {
  AIM_PHRASES,
  AMOUNT_NAMES,
  HOLD_NAMES,
  KIND_NAMES,
  NEED_WORDS,
  SIZE_NAMES,
  SWITCH_WORDS,
  WHITE_NAMES,
} from './words'

export type Told = { topic: string; words: string }

/** What a reader answered, in words, by topic and in the order of the steps; only what was answered. */
export function toldBy(quiz: QuizAnswers): Told[] {
  const { reads, hold, lightNeed, text, preferredWhite } = quiz
  const told: (Told | null)[] = [
    about(
      'You read',
      READING_KINDS.flatMap((kind) => {
        const amount = reads[kind]
        return amount ? [`${AMOUNT_NAMES[amount].toLowerCase()}: ${lower(KIND_NAMES[kind])}`] : []
      }),
    ),
    about('You hold it', hold ? [lower(HOLD_NAMES[hold])] : []),
    about('Where', Object.keys(quiz.spots).length > 0 || quiz.own.length > 0 ? spotWords(quiz) : []),
    about('Light', lightNeed ? [NEED_WORDS[lightNeed]] : []),
    about('Type', text ? [SIZE_NAMES[text].toLowerCase()] : []),
    about('What matters', aimWords(quiz)),
    about('White', preferredWhite ? [WHITE_NAMES[preferredWhite].toLowerCase()] : []),
    about('Limits', limitWords(quiz)),
  ]
  return told.filter((one) => one !== null)
}

function about(topic: string, parts: string[]): Told | null {
  return parts.length > 0 ? { topic, words: parts.join('; ') } : null
}

const lower = (text: string) => `${text[0]?.toLowerCase()}${text.slice(1)}`

function spotWords(quiz: QuizAnswers): string[] {
  return namedSpots(quiz).map(({ name, lux, hours, frontLight }) => {
    const light = `${formatLux(lux)}${THIN_SPACE}lux${frontLight ? ', front light allowed' : ''}`
    return `${formatExact(hours)}${THIN_SPACE}h ${name} (${light})`
  })
}

function aimWords({ weights, places }: QuizAnswers): string[] {
  if (weights)
    return [`weights by hand: ${AIMS.map((aim) => `${AIM_PHRASES[aim]} ${formatExact(weights[aim])}`).join(', ')}`]
  const ranked = PLACES.flatMap((place) => {
    const aims = AIMS.filter((aim) => places[aim] === place).map((aim) => AIM_PHRASES[aim])
    return aims.length > 0 ? [`${formatOrdinal(place)} ${formatList(aims)}`] : []
  })
  const rest = AIMS.filter((aim) => !places[aim]).length
  return ranked.length > 0 && rest > 0 ? [...ranked, rest > 1 ? 'the others level behind' : 'the other behind'] : ranked
}

function limitWords({ limits }: QuizAnswers): string[] {
  const { budget, minDiagonal, maxDiagonal, maxWeight, water, formats } = limits
  const words: string[] = []
  if (budget !== undefined) words.push(`at most ${formatMoney({ amount: budget, currency: 'GBP' })}`)
  if (minDiagonal !== undefined) words.push(`from ${formatExact(minDiagonal)} inches`)
  if (maxDiagonal !== undefined) words.push(`up to ${formatExact(maxDiagonal)} inches`)
  if (maxWeight !== undefined) words.push(`up to ${formatUnit(maxWeight, 'g')}`)
  for (const field of SWITCHES) {
    const wanted = limits[field]
    if (wanted !== undefined) words.push(`${wanted ? 'must' : 'must not'} ${SWITCH_WORDS[field]}`)
  }
  if (water !== undefined) words.push(`water code of ${formatNumber(water)} or better`)
  if (formats) words.push(`opens ${formatList(formats)}`)
  return words
}
