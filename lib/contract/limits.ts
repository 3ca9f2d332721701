import { listOf, numberFrom, strictObject, textLike, truth, wholeFrom } from './values'

// The upper bounds are house: far above any reading device, and low enough to stay exact in a double.
const MOST_MINOR_UNITS = 1_000_000_000
const MOST_INCHES = 100
const MOST_GRAMS = 100_000
const MOST_FORMATS = 20

const inches = () => numberFrom(0, MOST_INCHES, 'a number of inches from 0 to 100')

/** A currency by its ISO 4217 letters. */
export const currencySchema = textLike(/^[A-Z]{3}$/, 'three capital letters of ISO 4217, such as "GBP"')

/** A file format by its usual name, such as EPUB. */
export const formatSchema = textLike(/^[A-Za-z0-9][A-Za-z0-9 .+-]{0,19}$/, 'a format’s usual name, such as "EPUB"')

// Formats are compared without regard to case, as the ranking does.
const differ = (list: readonly string[]) => new Set(list.map((format) => format.toUpperCase())).size === list.length

/** Limits of a request, Method 1 section 7. An absent field is no limit; booleans: true must have, false must not. */
export const limitsSchema = strictObject(
  {
    /** Minor units of `currency`; GBP where none is given. */
    budget: wholeFrom(0, MOST_MINOR_UNITS, 'a whole number of pence or other minor units from 0 to 1,000,000,000'),
    currency: currencySchema,
    minDiagonal: inches(),
    maxDiagonal: inches(),
    maxWeight: numberFrom(0, MOST_GRAMS, 'a number of grams from 0 to 100,000'),
    pen: truth(),
    colour: truth(),
    frontLight: truth(),
    water: wholeFrom(0, 9, 'the second digit of an IEC 60529 code, a whole number from 0 to 9'),
    pageButtons: truth(),
    onSale: truth(),
    lending: truth(),
    speech: truth(),
    formats: listOf(formatSchema, 1, MOST_FORMATS, 'one to 20 formats, or leave the field out').refine(differ, {
      error: 'names a format twice; name each once',
    }),
  },
  'an object of limits',
)
  .partial()
  .refine(
    ({ minDiagonal, maxDiagonal }) =>
      minDiagonal === undefined || maxDiagonal === undefined || minDiagonal <= maxDiagonal,
    { path: ['minDiagonal'], error: 'is above maxDiagonal; no page is both larger and smaller' },
  )
