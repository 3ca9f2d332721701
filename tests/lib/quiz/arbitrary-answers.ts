import fc from 'fast-check'
import { MAX_SPOTS, SPOTS } from '@/lib/method/spots'
import { AIMS, HOLDS, LIGHT_NEEDS, READING_KINDS, TEXT_SIZES, WHITES } from '@/lib/method/types'
import { answeredSteps } from '@/lib/quiz/address'
import { AMOUNTS, PLACES, type QuizAnswers, STEPS, SWITCHES } from '@/lib/quiz/answers'

/** A number with at most four decimals, as an address keeps them. */
const number = (low: number, high: number) =>
  fc
    .double({ min: low, max: high, noNaN: true, noDefaultInfinity: true })
    .map((value) => Math.min(high, Math.max(low, Number(value.toFixed(4)))))
    .map((value) => (value === 0 ? 0 : value))
const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined })
const hours = number(0.0001, 168)
const lux = number(0, 200_000)

const name = fc
  .string({ unit: 'grapheme', maxLength: 12 })
  .filter((text) => text === text.trim() && !/[\p{Cc}\p{Cs}\p{Co}\p{Cn}\u202a-\u202e\u2066-\u2069]/u.test(text))
  .filter((text) => text.length <= 40)

const spots = fc
  .tuple(
    ...SPOTS.map((spot) =>
      maybe(
        fc.record(
          {
            hours,
            lux: lux.filter((value) => value !== spot.lux),
            frontLight: fc.constant(!spot.frontLight),
          },
          { requiredKeys: [] },
        ),
      ),
    ),
  )
  .map(
    (each) =>
      Object.fromEntries(
        SPOTS.map(({ slug }, i) => [slug, each[i]] as const).filter(([, spot]) => spot && Object.keys(spot).length > 0),
      ) as QuizAnswers['spots'],
  )

const limits = fc
  .record(
    {
      budget: fc.integer({ min: 0, max: 1_000_000_000 }),
      minDiagonal: number(0, 50),
      maxDiagonal: number(50, 100),
      maxWeight: number(0, 100_000),
      water: fc.integer({ min: 0, max: 9 }),
      formats: fc.uniqueArray(fc.constantFrom('EPUB', 'PDF', 'CBZ', 'TXT', 'DJVU+OCR', 'FB2.ZIP'), { minLength: 1 }),
      ...(Object.fromEntries(SWITCHES.map((field) => [field, fc.boolean()])) as Record<
        (typeof SWITCHES)[number],
        fc.Arbitrary<boolean>
      >),
    },
    { requiredKeys: [] },
  )
  .map((given) => ({ ...given }) as QuizAnswers['limits'])

const weights = fc
  .record(
    Object.fromEntries(AIMS.map((aim) => [aim, number(0, 1000)])) as Record<
      (typeof AIMS)[number],
      fc.Arbitrary<number>
    >,
  )
  .filter((given) => AIMS.some((aim) => given[aim] > 0))

/** Anything a reader can have answered, as `readAddress` gives it back. */
export const anyQuizAnswers: fc.Arbitrary<QuizAnswers> = fc
  .record({
    reads: fc.dictionary(fc.constantFrom(...READING_KINDS), fc.constantFrom(...AMOUNTS), { noNullPrototype: true }),
    hold: maybe(fc.constantFrom(...HOLDS)),
    spots,
    own: fc.array(fc.record({ name, hours: fc.oneof(fc.constant(0), hours), lux, frontLight: fc.boolean() }), {
      maxLength: 3,
    }),
    lightNeed: maybe(fc.constantFrom(...LIGHT_NEEDS)),
    text: maybe(fc.constantFrom(...TEXT_SIZES)),
    places: fc.dictionary(fc.constantFrom(...AIMS), fc.constantFrom(...PLACES), { noNullPrototype: true }),
    preferredWhite: maybe(fc.constantFrom(...WHITES)),
    limits,
    weights: maybe(weights),
    skipped: fc.subarray([...STEPS]),
  })
  .map((given) => {
    const answers = Object.fromEntries(Object.entries(given).filter(([, part]) => part !== undefined)) as QuizAnswers
    const answered = answeredSteps(answers)
    const listed = Object.values(answers.spots).filter((spot) => (spot.hours ?? 0) > 0).length
    return {
      ...answers,
      own: answers.own.slice(0, Math.max(0, MAX_SPOTS - listed)),
      skipped: answers.skipped.filter((step) => !answered.includes(step)),
    }
  })
