import * as z from 'zod/mini'
import { METHOD } from '@/lib/method/constants'
import type { Lab, TextSize } from '@/lib/method/types'
import { numberBetween, oneOf, plainNumber, wordsOf } from '@/lib/quiz/values'
import { MODEL_RANGE } from '@/lib/vision/contrast-reserve'
import type { Example } from '@/lib/workings/workings'
import { FIELDS, LABELS, type Problem, type Texts } from './fields'

// A content policy without eval would report zod's probe for it.
z.config({ jitless: true })

/** The figures are refused below this lightness of a page; the bounds of a* and b* are those readings are kept in. */
const LEAST_PAGE = METHOD.figures.leastLightness.value
const LEAST_INK = 0.1
const MOST_AB = 60
const MOST_READINGS = 40
const LONGEST_LIST = 4000

const lightness = (least: number) => numberBetween(least, 100, `a number from ${least} to 100`)
const ab = () => numberBetween(-MOST_AB, MOST_AB, `a number from −${MOST_AB} to ${MOST_AB}`)
const whole = (most: number) =>
  z.pipe(
    numberBetween(1, most, `a whole number from 1 to ${most}`),
    z.number().check(z.multipleOf(1, `must be a whole number from 1 to ${most}`)),
  )

const common = {
  units: whole(20),
  positions: whole(100),
  lux: numberBetween(0, METHOD.light.mostLux.value, 'a number of lux from 0 to 200,000'),
  frontLight: numberBetween(0, 1000, 'a number of cd/m² from 0 to 1,000'),
  age: numberBetween(
    MODEL_RANGE.lowestAge,
    MODEL_RANGE.highestAge,
    `a number of years from ${MODEL_RANGE.lowestAge} to ${MODEL_RANGE.highestAge}`,
  ),
  text: oneOf(wordsOf(['small', 'normal', 'large'] as const satisfies readonly TextSize[])),
}

/** What the form takes, with or without JavaScript; the colours not asked for are not looked at. */
const exampleForm = z.discriminatedUnion('from', [
  z.object({
    from: z.literal('numbers'),
    pageL: lightness(LEAST_PAGE),
    pageA: ab(),
    pageB: ab(),
    inkL: lightness(LEAST_INK),
    inkA: ab(),
    inkB: ab(),
    ...common,
  }),
  z.object({
    from: z.literal('readings'),
    pageReadings: listOfReadings(LEAST_PAGE),
    inkReadings: listOfReadings(LEAST_INK),
    ...common,
  }),
])

/** Readings one a line, each L*, a*, b* with spaces, commas or semicolons between. */
function listOfReadings(least: number) {
  return z.pipe(
    z.string(),
    z.transform((text, context): Lab[] => {
      const refuse = (message: string) => {
        context.issues.push({ code: 'custom', input: text, message })
        return z.NEVER
      }
      if (text.length > LONGEST_LIST) return refuse('is too long a list')
      const lines = text
        .split(/\r\n|\r|\n/)
        .map((line) => line.trim())
        .filter((line) => line !== '')
      if (lines.length === 0) return refuse('must hold one reading at least: L*, a*, b* on a line')
      if (lines.length > MOST_READINGS) return refuse(`may hold ${MOST_READINGS} readings at most`)
      const readings: Lab[] = []
      for (const [i, line] of lines.entries()) {
        const numbers = line
          .split(/[\s;,]+/)
          .filter((part) => part !== '')
          .map(plainNumber)
        const [L, a, b] = numbers
        if (numbers.length !== 3 || L === undefined || a === undefined || b === undefined) {
          return refuse(`line ${i + 1} must be three numbers, L*, a*, b*, with a point for decimals`)
        }
        if (L < least || L > 100) return refuse(`line ${i + 1}: L* must be from ${least} to 100`)
        if (Math.abs(a) > MOST_AB || Math.abs(b) > MOST_AB) {
          return refuse(`line ${i + 1}: a* and b* must be from −${MOST_AB} to ${MOST_AB}`)
        }
        readings.push({ L, a, b })
      }
      return readings
    }),
  )
}

export type Parsed = { example: Example; problems: [] } | { example: null; problems: Problem[] }

/** The example these texts make, or what is wrong with which of them. */
export function parseExample(texts: Texts): Parsed {
  const parsed = exampleForm.safeParse(texts)
  if (!parsed.success) return { example: null, problems: problemsOf(parsed.error.issues, texts) }
  const form = parsed.data
  const { units, positions, lux, frontLight, age, text } = form
  const light = { units, positions, lux, frontLight, age, size: METHOD.reserve.size.value[text] }
  const colours =
    form.from === 'readings'
      ? { page: form.pageReadings, ink: form.inkReadings }
      : {
          page: [{ L: form.pageL, a: form.pageA, b: form.pageB }],
          ink: [{ L: form.inkL, a: form.inkA, b: form.inkB }],
        }
  return { example: { ...colours, ...light }, problems: [] }
}

type Issue = { path: readonly PropertyKey[]; message: string }

/** The first problem of each field, in the order of the form. */
function problemsOf(issues: readonly Issue[], texts: Texts): Problem[] {
  return FIELDS.flatMap((id) => {
    const issue = issues.find(({ path }) => path[0] === id)
    if (!issue) return []
    const blank = texts[id].trim() === ''
    const message =
      id === 'from'
        ? 'must be one of the two ways'
        : blank && !id.endsWith('Readings')
          ? issue.message.replace('"" is not', 'is missing: it must be')
          : issue.message
    return [{ id, message: `${LABELS[id]}: ${message}` }]
  })
}
