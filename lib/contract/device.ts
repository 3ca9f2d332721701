import { z } from 'zod'
import * as mini from 'zod/mini'
import { countUpTo } from '@/lib/catalogue/schema'
import { editionSchema } from './edition'
import { MAX_EDITION } from './match-request'

const MOST_READINGS = 500
const DEFAULT_READINGS = 100
const MOST_PAGES = 9999

const EDITION_WORDS = 'the number of a released edition'
const edition = mini.optional(countUpTo(MAX_EDITION, EDITION_WORDS))

function known(...parameters: string[]) {
  const told =
    parameters.length === 1 ? `the parameter is ${parameters}` : `the parameters are ${parameters.join(', ')}`
  return {
    error: (issue: { code?: string | undefined }) =>
      issue.code === 'unrecognized_keys' ? `is not known here; ${told}` : undefined,
  }
}

/** What `GET /api/v1/devices/{slug}` may be asked. */
export const deviceQuery = mini.strictObject({ edition }, known('edition'))

/** What `GET /api/v1/devices/{slug}/readings` may be asked. */
export const deviceReadingsQuery = mini.strictObject(
  {
    edition,
    page: mini._default(mini.optional(countUpTo(MOST_PAGES, `a whole number from 1 to ${MOST_PAGES}`)), 1),
    limit: mini._default(
      mini.optional(countUpTo(MOST_READINGS, `a whole number from 1 to ${MOST_READINGS}`)),
      DEFAULT_READINGS,
    ),
  },
  known('edition', 'page', 'limit'),
)

/** Each parameter in a sentence, with a value that works. */
export const DEVICE_PARAMETERS = {
  edition: { description: 'A released edition by its number; the newest where nothing is said.', example: '2' },
} as const
export const DEVICE_READINGS_PARAMETERS = {
  ...DEVICE_PARAMETERS,
  page: { description: 'Which page of the readings, from 1.', example: '1' },
  limit: {
    description: `Readings on a page, 1 to ${MOST_READINGS}; ${DEFAULT_READINGS} where nothing is said.`,
    example: '20',
  },
} as const

/** Units of the figures, as the answer names them. */
export const FIGURE_UNITS = {
  lightness: 'L*',
  a: 'a*',
  b: 'b*',
  whiteness: '1',
  tint: '1',
  chroma: 'C*ab',
  hue: 'deg',
  contrast: '1',
  yPage: '%',
  yInk: '%',
  fromPaper: 'ΔE00',
  timesTheLight: '1',
} as const
type FigureName = keyof typeof FIGURE_UNITS

const figureIn = (unit: string) =>
  z.strictObject({
    value: z.number(),
    /** Expanded uncertainty, k = 2, about 95 %. */
    doubt: z.number().min(0),
    unit: z.literal(unit),
  })
const figures = Object.fromEntries(
  Object.entries(FIGURE_UNITS).map(([name, unit]) => [
    name,
    // A neutral page has no hue.
    name === 'hue' ? figureIn(unit).nullable() : figureIn(unit),
  ]),
) as Record<FigureName, ReturnType<typeof figureIn>>

const place = z.number().int().min(1)
const standing = z.strictObject({ place, best: place, worst: place, of: place })
const address = (pattern: RegExp) => z.string().regex(pattern)

/** The answer of `GET /api/v1/devices/{slug}`: the device as the edition froze it, and all that follows from it. */
export const deviceSchema = z.strictObject({
  edition: editionSchema.pick({ number: true, publishedAt: true, sha256: true }),
  device: editionSchema.shape.devices.element,
  figures: z.strictObject(figures),
  /** The place by a figure, largest first, and the places the doubt allows. Not by whiteness: see the method. */
  standing: z.strictObject({ lightness: standing, contrast: standing }),
  links: z.strictObject({
    self: address(/^\/api\/v1\/devices\/[a-z0-9-]+\?edition=\d+$/),
    readings: address(/^\/api\/v1\/devices\/[a-z0-9-]+\/readings\?edition=\d+$/),
    edition: address(/^\/api\/v1\/editions\/\d+$/),
    page: address(/^\/devices\/[a-z0-9-]+$/),
    data: address(/^\/data\/\d+$/),
  }),
})
export type DeviceAnswer = z.input<typeof deviceSchema>

const count = z.number().int().min(0)
const reading = z.strictObject({
  set: z.number().int(),
  ordinal: place,
  /** Serial number of the unit. */
  unit: z.string(),
  session: z.string(),
  position: z.string(),
  state: z.enum(['page', 'ink']),
  L: z.number(),
  a: z.number(),
  b: z.number(),
  instrumentWhiteness: z.number().nullable(),
  flag: z.enum(['none', 'flagged', 'left-out']),
  /** Why it is flagged, left out or cleared; null: never flagged. */
  reason: z.string().nullable(),
  /** Whether it is in the mean of its set. */
  counted: z.boolean(),
})

/** Units of a reading, as the answer names them. */
export const READING_UNITS = { L: 'L*', a: 'a*', b: 'b*', instrumentWhiteness: '1' } as const

/** The answer of `GET /api/v1/devices/{slug}/readings`: every reading in the sets the edition's figures rest on. */
export const deviceReadingsSchema = z.strictObject({
  edition: place,
  device: z.string(),
  total: count,
  page: place,
  pages: place,
  limit: place,
  /** Of L, a, b and the whiteness; colours are for D65 and the 10° observer, d/8°, specular included. */
  units: z.strictObject({
    L: z.literal(READING_UNITS.L),
    a: z.literal(READING_UNITS.a),
    b: z.literal(READING_UNITS.b),
    instrumentWhiteness: z.literal(READING_UNITS.instrumentWhiteness),
  }),
  readings: z.array(reading),
})
export type DeviceReadingsAnswer = z.input<typeof deviceReadingsSchema>
