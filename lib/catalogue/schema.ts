import * as z from 'zod/mini'
import { lineOfText, listOf, numberBetween, oneOf, pence, wordsOf } from '@/lib/quiz/values'
import { LONGEST_MAKER, makerKey } from './maker'
import { ORDERS, SORTS, type SortKey } from './sort'

/** Longest search, characters. */
export const LONGEST_SEARCH = 80
const MOST_MAKERS = 30
// The bounds of limits are those of the API's contract.
const MOST_PENCE = 1_000_000_000
export const MOST_PAGES = 9999

const inches = () => z.optional(numberBetween(0, 100, 'a number of inches from 0 to 100'))
const yesNo = () =>
  z.optional(
    oneOf([
      ['yes', true],
      ['no', false],
    ]),
  )
const digits = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9].map((digit) => [String(digit), digit] as const)
const maker = (text: string) => (text.length <= LONGEST_MAKER && makerKey(text) ? makerKey(text) : undefined)

/** A whole number from 1, as an address names pages and amounts. */
export function countUpTo(most: number, right: string) {
  return z.pipe(
    numberBetween(1, most, right),
    z.number().check(z.refine((value) => Number.isInteger(value), `a fraction is not ${right}`)),
  )
}

/** Every parameter an address of the catalogue understands, a text each; the site and the API read it by this alone. */
export const catalogueFields = {
  q: z.optional(lineOfText(LONGEST_SEARCH, `at most ${LONGEST_SEARCH} letters on one line`)),
  maker: z.optional(listOf(maker, MOST_MAKERS, `at most ${MOST_MAKERS} names of makers with commas between`)),
  'min-size': inches(),
  'max-size': inches(),
  /** Pounds in the address, pence when read. */
  'max-price': z.optional(pence(MOST_PENCE, 'a number of pounds from 0 to 10,000,000')),
  'max-weight': z.optional(numberBetween(0, 100_000, 'a number of grams from 0 to 100,000')),
  pen: yesNo(),
  colour: yesNo(),
  'front-light': yesNo(),
  water: z.optional(oneOf(digits)),
  'on-sale': yesNo(),
  sort: z.optional(oneOf(wordsOf(Object.keys(SORTS) as SortKey[]))),
  order: z.optional(oneOf(wordsOf(ORDERS))),
  page: z.optional(countUpTo(MOST_PAGES, `a whole number from 1 to ${MOST_PAGES}`)),
}

/** No page is both larger and smaller: a smallest size above the largest is refused. */
export function sizesAgree(context: {
  value: { 'min-size'?: number | undefined; 'max-size'?: number | undefined }
  issues: z.core.$ZodRawIssue[]
}): void {
  const { 'min-size': least, 'max-size': most } = context.value
  if (least === undefined || most === undefined || least <= most) return
  const message = 'is above the largest size, and no page is both larger and smaller'
  context.issues.push({ code: 'custom', input: least, path: ['min-size'], message })
}

export const catalogueSchema = z.object(catalogueFields).check(sizesAgree)
export type CatalogueQuery = z.output<typeof catalogueSchema>
