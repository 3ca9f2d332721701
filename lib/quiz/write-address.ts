import { SPOTS } from '@/lib/method/spots'
import { AIMS, READING_KINDS } from '@/lib/method/types'
import type { Address } from './address'
import type { QuizAnswers } from './answers'
import { FIELD_NAMES, type FieldName, stepOf, weightField } from './fields'

/** The canonical text of every answer given, by the name of its parameter. `readAddress` gives back the same answers. */
function textsOf(answers: QuizAnswers): Map<FieldName, string> {
  const texts = new Map<FieldName, string>()
  const set = (name: FieldName, value: string | number | undefined) => {
    if (value !== undefined && value !== '') texts.set(name, String(value))
  }
  const onOff = (value: boolean | undefined) => (value === undefined ? undefined : value ? 'on' : 'off')
  const must = (value: boolean | undefined) => (value === undefined ? undefined : value ? 'must' : 'must-not')
  const { reads, places, spots, own, limits, weights, skipped } = answers

  for (const kind of READING_KINDS) set(kind, reads[kind])
  set('hold', answers.hold)
  for (const { slug } of SPOTS) {
    set(slug, spots[slug]?.hours)
    set(`${slug}.lux`, spots[slug]?.lux)
    set(`${slug}.light`, onOff(spots[slug]?.frontLight))
  }
  own.forEach(({ name, hours, lux, frontLight }, i) => {
    const at = `own${i + 1}` as 'own1'
    set(at, hours || undefined)
    set(`${at}.name`, name)
    set(`${at}.lux`, lux)
    set(`${at}.light`, frontLight ? undefined : 'off')
  })
  set('light-need', answers.lightNeed)
  set('type-size', answers.text)
  for (const aim of AIMS) set(aim, places[aim])
  set('white', answers.preferredWhite)
  set('budget', limits.budget === undefined ? undefined : limits.budget / 100)
  set('min-size', limits.minDiagonal)
  set('max-size', limits.maxDiagonal)
  set('max-weight', limits.maxWeight)
  set('pen', must(limits.pen))
  set('colour', must(limits.colour))
  set('front-light', must(limits.frontLight))
  set('water', limits.water)
  set('page-buttons', must(limits.pageButtons))
  set('on-sale', must(limits.onSale))
  set('lending', must(limits.lending))
  set('speech', must(limits.speech))
  set('formats', limits.formats?.join(','))
  for (const aim of AIMS) set(weightField(aim), weights?.[aim])
  set('skipped', skipped.join(','))
  return texts
}

/**
 * What the fields of a form hold, and the canonical address: only what was answered, in canonical order. A step with a
 * problem keeps its texts as they were typed, so that going back and forth loses nothing.
 */
export function canonicalTexts({ answers, problems, texts }: Pick<Address, 'answers' | 'problems' | 'texts'>) {
  const asTyped = new Set(problems.flatMap(({ field }) => (field === null ? [] : [stepOf(field)])))
  const canonical = textsOf(answers)
  const kept = new Map<FieldName, string>()
  for (const name of FIELD_NAMES) {
    const text = asTyped.has(stepOf(name)) ? texts.get(name) : canonical.get(name)
    if (text !== undefined) kept.set(name, text)
  }
  return kept
}

/** Bytes that may stand in a query as they are, and read better so. */
const READABLE: Record<string, string> = { '%2C': ',', '%3A': ':', '%20': '+' }

/** Names and texts as a query, without the question mark: readable, and never needing a second look by a server. */
export function queryOf(pairs: Iterable<readonly [string, string | number]>): string {
  return Array.from(pairs, ([name, text]) => {
    const encoded = encodeURIComponent(String(text)).replace(/%(2C|3A|20)/g, (byte) => READABLE[byte] ?? byte)
    return `${encodeURIComponent(name)}=${encoded}`
  }).join('&')
}

/** The query of these answers alone. */
export function queryOfAnswers(answers: QuizAnswers): string {
  return queryOf(textsOf(answers))
}
