import { clip } from '@/lib/contract/shown'
import { SPOTS } from '@/lib/method/spots'
import { AIMS, READING_KINDS } from '@/lib/method/types'
import { NO_ANSWERS, type OwnSpot, type QuizAnswers, STEPS, type Step } from './answers'
import {
  FIELD_NAMES,
  type FieldName,
  type FieldValues,
  fieldsSchema,
  OWN_NUMBERS,
  togetherWith,
  weightField,
} from './fields'
import { labelOf } from './words'

/** One thing that is wrong with an address; `field` is null where it is the whole. */
export type Problem = { field: FieldName | null; message: string }

/** An address read: what was understood, what was not, and the texts as they stood. */
export type Address = {
  answers: QuizAnswers
  problems: Problem[]
  /** The text of every known parameter, so that a form can show again what was typed. */
  texts: ReadonlyMap<FieldName, string>
  /** Names that mean nothing here; they do no harm and are left out. */
  unknown: string[]
}

/** More parts than any form of ours sends. */
const MOST_PARTS = 300
/** Kept of a text that was not understood, characters. */
const LONGEST_TEXT = 500
const MOST_UNKNOWN = 5

const KNOWN = new Set<string>(FIELD_NAMES)
/** Parameters of the pages themselves. */
const CONTROLS = new Set([
  'step',
  'go',
  'page',
  'estimate',
  'way',
  'see',
  'lamp',
  'lumens',
  'distance',
  'ev',
  'use',
  'for',
])

/** The pairs of an address as Next hands them to a page. */
export function pairsFrom(search: Record<string, string | string[] | undefined>): [string, string][] {
  return Object.entries(search).flatMap(([name, value]) =>
    (Array.isArray(value) ? value : [value ?? '']).map((text): [string, string] => [name, text]),
  )
}

/**
 * Reads the answers in an address or a form, tolerantly: blanks are no answer, unknown names are left out, and what is
 * not understood comes back as a problem in words while everything else still counts. Never throws.
 */
export function readAddress(pairs: Iterable<readonly [string, string]>): Address {
  const problems: Problem[] = []
  const unknown = new Set<string>()
  const given = new Map<FieldName, string[]>()
  let parts = 0
  for (const [name, text] of pairs) {
    parts += 1
    if (parts > MOST_PARTS) continue
    if (isField(name)) {
      if (text.trim() !== '') given.set(name, [...(given.get(name) ?? []), text])
    } else if (!CONTROLS.has(name) && unknown.size < MOST_UNKNOWN) unknown.add(clip(name))
  }
  if (parts > MOST_PARTS) {
    problems.push({
      field: null,
      message: `The address has ${parts} parts; the quiz has no more than ${MOST_PARTS}, and read no further.`,
    })
  }

  const texts = new Map<FieldName, string>()
  for (const [name, all] of given) {
    // Boxes of one name are how a form gives a list.
    const different = name === 'formats' ? [all.join(',')] : [...new Set(all)]
    texts.set(name, kept(different[0]!))
    if (different.length > 1)
      problems.push({ field: name, message: `${labelOf(name)}: it is given twice; give it once.` })
    else if (different[0]!.length > LONGEST_TEXT) {
      problems.push({ field: name, message: `${labelOf(name)}: it is longer than any answer.` })
    }
  }

  const values = understand(texts, problems)
  return { answers: assemble(values), problems, texts, unknown: [...unknown] }
}

/** The start of a text, without halves of surrogate pairs, which no address can hold. */
function kept(text: string): string {
  return Array.from(text)
    .slice(0, LONGEST_TEXT)
    .join('')
    .replace(/\p{Cs}/gu, '\ufffd')
}

function isField(name: string): name is FieldName {
  return KNOWN.has(name)
}

/** What the schema makes of the texts, round by round: each takes out what was refused until the rest stands. */
function understand(texts: ReadonlyMap<FieldName, string>, problems: Problem[]): FieldValues {
  const rest = new Map(texts)
  for (const { field } of problems) if (field) for (const name of togetherWith(field)) rest.delete(name)
  for (;;) {
    const parsed = fieldsSchema.safeParse(Object.fromEntries(rest))
    if (parsed.success) return parsed.data
    for (const { path, message } of parsed.error.issues) {
      const field = path[0] as FieldName
      problems.push({ field, message: `${labelOf(field)}: ${message}.` })
      for (const name of togetherWith(field)) rest.delete(name)
    }
  }
}

function assemble(values: FieldValues): QuizAnswers {
  const answers: QuizAnswers = structuredClone(NO_ANSWERS)
  for (const kind of READING_KINDS) if (values[kind] !== undefined) answers.reads[kind] = values[kind]
  for (const aim of AIMS) if (values[aim] !== undefined) answers.places[aim] = values[aim]
  for (const { slug, lux, frontLight } of SPOTS) {
    // What agrees with the listed spot is no change, and no hours are no hours.
    const spot = defined({
      hours: values[slug] || undefined,
      lux: unless(lux, values[`${slug}.lux`]),
      frontLight: unless(frontLight, values[`${slug}.light`]),
    })
    if (Object.keys(spot).length > 0) answers.spots[slug] = spot
  }
  answers.own = OWN_NUMBERS.flatMap((n): OwnSpot[] => {
    const lux = values[`own${n}.lux`]
    if (lux === undefined) return []
    const frontLight = values[`own${n}.light`] ?? true
    return [{ name: values[`own${n}.name`] ?? '', hours: values[`own${n}`] ?? 0, lux, frontLight }]
  })
  Object.assign(
    answers,
    defined({
      hold: values.hold,
      lightNeed: values['light-need'],
      text: values['type-size'],
      preferredWhite: values.white,
    }),
  )
  answers.limits = defined({
    budget: values.budget,
    minDiagonal: values['min-size'],
    maxDiagonal: values['max-size'],
    maxWeight: values['max-weight'],
    pen: values.pen,
    colour: values.colour,
    frontLight: values['front-light'],
    water: values.water,
    pageButtons: values['page-buttons'],
    onSale: values['on-sale'],
    lending: values.lending,
    speech: values.speech,
    formats: values.formats?.length ? values.formats : undefined,
  })
  if (AIMS.some((aim) => values[weightField(aim)] !== undefined)) {
    const [clarity, whiteness, tint, handling] = AIMS.map((aim) => values[weightField(aim)] ?? 0) as [
      number,
      number,
      number,
      number,
    ]
    answers.weights = { clarity, whiteness, tint, handling }
  }
  const answered = answeredSteps(answers)
  answers.skipped = STEPS.filter((step) => values.skipped?.includes(step) && !answered.includes(step))
  return answers
}

function unless<T>(usual: T, value: T | undefined): T | undefined {
  return value === usual ? undefined : value
}

/** Without the parts that are undefined. */
function defined<T extends object>(parts: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(parts).filter(([, value]) => value !== undefined)) as {
    [K in keyof T]?: Exclude<T[K], undefined>
  }
}

/** The steps of which at least one question has an answer. */
export function answeredSteps({
  reads,
  hold,
  spots,
  own,
  lightNeed,
  text,
  places,
  preferredWhite,
  limits,
}: QuizAnswers) {
  const some = (object: object) => Object.keys(object).length > 0
  const answered: Record<Step, boolean> = {
    1: some(reads) || hold !== undefined,
    2: some(spots) || own.length > 0,
    3: lightNeed !== undefined || text !== undefined,
    4: some(places) || preferredWhite !== undefined,
    5: some(limits),
  }
  return STEPS.filter((step) => answered[step])
}
