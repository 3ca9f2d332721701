import * as z from 'zod/mini'
import { MAX_SPOTS, SPOTS, type SpotSlug } from '@/lib/method/spots'
import { AIMS, type Aim, HOLDS, LIGHT_NEEDS, READING_KINDS, TEXT_SIZES, WHITES } from '@/lib/method/types'
import { AMOUNTS, PLACES, STEPS, type Step } from './answers'
import { lineOfText, listOf, numberBetween, oneOf, pence, wordsOf } from './values'

/** Longest name of a reader's own spot, characters. */
export const LONGEST_NAME = 40
// The bounds of limits are those of the API's contract.
const MOST_PENCE = 1_000_000_000
const MOST_FORMATS = 20

const numbers = <const T extends number>(values: readonly T[]) => values.map((value) => [String(value), value] as const)
const amount = () => z.optional(oneOf(numbers(AMOUNTS)))
const place = () => z.optional(oneOf(numbers(PLACES)))
const hours = () => z.optional(numberBetween(0, 168, 'a number of hours a week from 0 to 168'))
const lux = () => z.optional(numberBetween(0, 200_000, 'a number of lux from 0 to 200,000'))
const onOff = () =>
  z.optional(
    oneOf([
      ['on', true],
      ['off', false],
    ]),
  )
const must = () =>
  z.optional(
    oneOf([
      ['must', true],
      ['must-not', false],
    ]),
  )
const inches = () => z.optional(numberBetween(0, 100, 'a number of inches from 0 to 100'))
const weight = () => z.optional(numberBetween(0, 1000, 'a number from 0 to 1,000'))

type OwnNumber = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 10 | 11 | 12
export const OWN_NUMBERS = Array.from({ length: MAX_SPOTS }, (_, i) => (i + 1) as OwnNumber)

type Of<Name extends string, Schema> = Record<Name, Schema>
const each = <Name extends string, Schema>(names: readonly Name[], schema: () => Schema) =>
  Object.fromEntries(names.map((name) => [name, schema()])) as Of<Name, Schema>

/** The parameters of a listed spot: its hours under its own name, and what the reader changed about its light. */
const spotFields = Object.assign(
  {},
  ...SPOTS.map(({ slug }) => ({ [slug]: hours(), [`${slug}.lux`]: lux(), [`${slug}.light`]: onOff() })),
) as Of<SpotSlug, ReturnType<typeof hours>> &
  Of<`${SpotSlug}.lux`, ReturnType<typeof lux>> &
  Of<`${SpotSlug}.light`, ReturnType<typeof onOff>>

const ownName = () => z.optional(lineOfText(LONGEST_NAME, `a name of at most ${LONGEST_NAME} letters on one line`))
const ownFields = Object.assign(
  {},
  ...OWN_NUMBERS.map((n) => ({
    [`own${n}`]: hours(),
    [`own${n}.name`]: ownName(),
    [`own${n}.lux`]: lux(),
    [`own${n}.light`]: onOff(),
  })),
) as Of<`own${OwnNumber}`, ReturnType<typeof hours>> &
  Of<`own${OwnNumber}.name`, ReturnType<typeof ownName>> &
  Of<`own${OwnNumber}.lux`, ReturnType<typeof lux>> &
  Of<`own${OwnNumber}.light`, ReturnType<typeof onOff>>

const weightNames = AIMS.map((aim) => `weight.${aim}` as const)

const reading = { ...each(READING_KINDS, amount), hold: z.optional(oneOf(wordsOf(HOLDS))) }
const eyes = {
  'light-need': z.optional(oneOf(wordsOf(LIGHT_NEEDS))),
  'type-size': z.optional(oneOf(wordsOf(TEXT_SIZES))),
}
const matters = { ...each(AIMS, place), white: z.optional(oneOf(wordsOf(WHITES))) }
const limits = {
  budget: z.optional(pence(MOST_PENCE, 'a number of pounds from 0 to 10,000,000')),
  'min-size': inches(),
  'max-size': inches(),
  'max-weight': z.optional(numberBetween(0, 100_000, 'a number of grams from 0 to 100,000')),
  pen: must(),
  colour: must(),
  'front-light': must(),
  water: z.optional(oneOf(numbers([0, 1, 2, 3, 4, 5, 6, 7, 8, 9]))),
  'page-buttons': must(),
  'on-sale': must(),
  lending: must(),
  speech: must(),
  formats: z.optional(
    listOf(
      (name) => (/^[A-Za-z0-9][A-Za-z0-9 .+-]{0,19}$/.test(name) ? name.toUpperCase() : undefined),
      MOST_FORMATS,
      `at most ${MOST_FORMATS} usual names of formats, such as EPUB`,
    ),
  ),
}
const skipped = z.optional(
  listOf((text) => STEPS.find((step) => String(step) === text), STEPS.length, 'the numbers of steps, from 1 to 5'),
)

const fields = {
  ...reading,
  ...spotFields,
  ...ownFields,
  ...eyes,
  ...matters,
  ...limits,
  ...each(weightNames, weight),
  skipped,
}
const ASKED_IN: readonly (readonly [Step, object])[] = [
  [1, reading],
  [2, { ...spotFields, ...ownFields }],
  [3, eyes],
  [4, matters],
  [5, limits],
]

const raw = z.object(fields)
export type FieldValues = z.output<typeof raw>
export type FieldName = keyof typeof fields

/** Every parameter of an address that holds an answer, in canonical order. */
export const FIELD_NAMES = Object.keys(fields) as FieldName[]

/** The one schema of the quiz's answers in an address: a text each, understood, and in keeping with one another. */
export const fieldsSchema = raw.check(({ value, issues }) => {
  const refuse = (field: FieldName, message: string) =>
    issues.push({ code: 'custom', input: value[field], path: [field], message })

  if (value['min-size'] !== undefined && value['max-size'] !== undefined && value['min-size'] > value['max-size']) {
    refuse('min-size', 'it is above the largest size, and no page is both larger and smaller')
  }
  if (weightNames.some((name) => value[name] !== undefined) && weightNames.every((name) => !value[name])) {
    refuse('weight.clarity', 'all four are 0; give at least one above 0')
  }
  for (const n of OWN_NUMBERS) {
    if (value[`own${n}.lux`] === undefined && (value[`own${n}.name`] || value[`own${n}`])) {
      refuse(`own${n}.lux`, 'it is missing; give a number of lux, or estimate the light')
    }
  }
  const used = [...SPOTS.map(({ slug }) => slug), ...OWN_NUMBERS.map((n) => `own${n}` as const)].filter(
    (name) => (value[name] ?? 0) > 0,
  )
  const over = used[MAX_SPOTS]
  if (over) refuse(over, `that is one spot too many; the method takes ${MAX_SPOTS}`)
})

/** The parameters that stand or fall together: a spot of one's own without its light is none. */
export function togetherWith(field: FieldName): FieldName[] {
  const own = /^own\d+/.exec(field)?.[0]
  if (own) return FIELD_NAMES.filter((name) => name === own || name.startsWith(`${own}.`))
  return field.startsWith('weight.') ? weightNames : [field]
}

/** The step whose page asks for this; null for what no step asks (weights by hand, steps passed over). */
export function stepOf(field: FieldName): Step | null {
  return ASKED_IN.find(([, asked]) => Object.hasOwn(asked, field))?.[0] ?? null
}

/** A weight by hand. */
export const weightField = (aim: Aim) => `weight.${aim}` as const
