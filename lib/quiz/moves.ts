import { SPOTS } from '@/lib/method/spots'
import { type Address, readAddress } from './address'
import { STEPS, type Step } from './answers'
import { OWN_NUMBERS, stepOf } from './fields'
import { canonicalTexts, queryOf } from './write-address'

/** A spot whose light is being estimated: a listed one, or one of the reader's own. */
export type EstimateTarget = string

const TARGETS = new Set<string>([...SPOTS.map(({ slug }) => slug), ...OWN_NUMBERS.map((n) => `own${n}`)])

/** Which step an address asks for; the first where it asks for none there is. */
export function stepIn(text: string | null | undefined): Step {
  return STEPS.find((step) => String(step) === text) ?? 1
}

export function targetIn(text: string | null | undefined): EstimateTarget | null {
  return text && TARGETS.has(text) ? text : null
}

type Shown = Pick<Address, 'answers' | 'problems' | 'texts'>

/** A page of the quiz with these answers, canonical: the first step and blanks are not spelt out. */
export function quizHref(step: Step, address: Shown, { estimate }: { estimate?: EstimateTarget } = {}): string {
  const query = queryOf([
    ...(step > 1 ? [['step', step] as const] : []),
    ...(estimate ? [['estimate', estimate] as const] : []),
    ...canonicalTexts(address),
  ])
  return query ? `/quiz?${query}` : '/quiz'
}

/** Path of the result's page. */
export const RESULT = '/quiz/result'

export function resultHref(address: Shown): string {
  const query = queryOf(canonicalTexts(address))
  return query ? `${RESULT}?${query}` : RESULT
}

/** What is wrong with the answers one step asks for. */
export function problemsIn(step: Step, { problems }: Pick<Address, 'problems'>): Address['problems'] {
  return problems.filter(({ field }) => field !== null && stepOf(field) === step)
}

/** What the buttons of a step's form ask for, as the value of `go`. */
export const GO = { next: 'next', back: 'back', skip: 'skip', here: 'here', estimate: 'estimate.' } as const

/**
 * Where a button of a step's form leads, with and without JavaScript alike.
 * @returns null where the reader has to look at this step again first
 */
export function hrefAfter(go: string, step: Step, address: Address): string | null {
  const onward = (from: Shown) => (step < 5 ? quizHref((step + 1) as Step, from) : resultHref(from))
  if (go === GO.back) return quizHref(Math.max(1, step - 1) as Step, address)
  if (go === GO.skip) return onward(passedOver(step, address))
  const target = go.startsWith(GO.estimate) ? targetIn(go.slice(GO.estimate.length)) : null
  if (target) return quizHref(2, address, { estimate: target })
  if (problemsIn(step, address).length > 0) return null
  return go === GO.next ? onward(address) : quizHref(step, address)
}

/** The address without the answers of a step, marked as one the reader was not sure of. */
function passedOver(step: Step, address: Address): Address {
  const kept = [...canonicalTexts(address)].filter(([name]) => stepOf(name) !== step && name !== 'skipped')
  return readAddress([...kept, ['skipped', [...address.answers.skipped, step].join(',')]])
}

/** The address with the light of a spot set; a spot of the reader's own comes to be by it. */
export function withLux(target: EstimateTarget, lux: number, address: Address): Address {
  const kept = [...canonicalTexts(address)].filter(([name]) => name !== `${target}.lux`)
  return readAddress([...kept, [`${target}.lux`, String(lux)]])
}
