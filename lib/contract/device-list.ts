import { z } from 'zod'
import * as mini from 'zod/mini'
import { catalogueFields, countUpTo, sizesAgree } from '@/lib/catalogue/schema'
import { editionSchema } from './edition'

export const MOST_DEVICES = 100
const DEFAULT_DEVICES = 50

const known = [...Object.keys(catalogueFields), 'limit'].join(', ')

/** What `GET /api/v1/devices` may be asked: what the catalogue's own address may say, and how many devices a page has. */
export const deviceListQuery = mini
  .strictObject(
    {
      ...catalogueFields,
      limit: mini._default(
        mini.optional(countUpTo(MOST_DEVICES, `a whole number from 1 to ${MOST_DEVICES}`)),
        DEFAULT_DEVICES,
      ),
    },
    {
      error: (issue) =>
        issue.code === 'unrecognized_keys' ? `is not known here; the parameters are ${known}` : undefined,
    },
  )
  .check(sizesAgree)

/** Each parameter in a sentence, with a value that works. */
export const DEVICE_LIST_PARAMETERS = {
  q: { description: 'Words the name or the maker must contain, in any order.', example: 'reed' },
  maker: { description: 'Makers with commas between, or the parameter several times.', example: 'ostler,tamber' },
  'min-size': { description: 'Smallest diagonal of the page, inches, 0 to 100.', example: '6' },
  'max-size': { description: 'Largest diagonal of the page, inches, 0 to 100.', example: '8' },
  'max-price': {
    description: 'Highest price in pounds; prices in another currency count as not stated.',
    example: '250',
  },
  'max-weight': { description: 'Greatest weight, grams, 0 to 100,000.', example: '200' },
  pen: { description: 'With a pen (yes) or without (no).', example: 'yes' },
  colour: { description: 'In colour (yes) or not (no).', example: 'no' },
  'front-light': { description: 'With a front light (yes) or without (no).', example: 'yes' },
  water: { description: 'Lowest second digit of the IEC 60529 code, 0 to 9.', example: '7' },
  'on-sale': { description: 'On sale (yes) or no longer (no), as of the edition.', example: 'yes' },
  sort: { description: 'What the list is ordered by; lightness where nothing is said.', example: 'price' },
  order: { description: 'ascending or descending; each order has its own usual one.', example: 'ascending' },
  page: { description: 'Which page of the list, from 1.', example: '1' },
  limit: {
    description: `Devices on a page, 1 to ${MOST_DEVICES}; ${DEFAULT_DEVICES} where nothing is said.`,
    example: '20',
  },
} as const satisfies Record<keyof z.input<typeof deviceListQuery>, { description: string; example: string }>

const device = editionSchema.shape.devices.element.extend({
  /** Fields the question looked at and the device does not state: such a device is neither ruled in nor out. */
  notStated: z.array(z.string()),
  href: z.string().regex(/^\/api\/v1\/devices\/[a-z0-9-]+$/),
})

const count = z.number().int().min(0)

/** The answer of `GET /api/v1/devices`: devices known to match first, then those not ruled out, each part in order. */
export const deviceListSchema = z.strictObject({
  edition: z.number().int().min(1),
  /** Devices found, and how many of them are known to meet every filter. */
  total: count,
  matching: count,
  page: z.number().int().min(1),
  pages: z.number().int().min(1),
  limit: z.number().int().min(1).max(MOST_DEVICES),
  devices: z.array(device),
})
export type DeviceListAnswer = z.output<typeof deviceListSchema>
