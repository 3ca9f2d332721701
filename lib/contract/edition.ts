import { z } from 'zod'

const finite = z.number()
const share = z.number().min(0).max(1)
const lab = z.strictObject({ L: z.number().min(0).max(100), a: finite, b: finite })
/** A standard uncertainty per channel, never negative. */
const doubt = z.strictObject({ L: z.number().min(0), a: z.number().min(0), b: z.number().min(0) })
const state = lab.extend({ u: doubt })
const known = z.boolean().nullable()
const slug = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)
const sha256 = z.string().regex(/^[0-9a-f]{64}$/)
const editionNumber = z.number().int().min(1)
const sumsToOne = (shares: Record<string, number>) =>
  Math.abs(Object.values(shares).reduce((sum, part) => sum + part, 0) - 1) < 1e-9

const device = z.strictObject({
  slug,
  name: z.string().min(1),
  maker: z.string().min(1),
  revision: z.string(),
  provisional: z.boolean(),
  units: z.number().int().min(1),
  page: state,
  ink: state,
  sessions: z.record(z.string(), share).refine(sumsToOne, 'the shares of the sessions must sum to 1'),
  whiteness: finite,
  tint: finite,
  withinLimits: z.boolean(),
  contrast: z.number().positive(),
  /** Luminances on a white page, cd/m²; false: has none; null: not stated. */
  frontLight: z
    .union([z.strictObject({ max: z.number().min(0), min: z.number().min(0).nullable() }), z.literal(false)])
    .nullable(),
  diagonal: z.number().positive().nullable(),
  ppi: z.number().positive().nullable(),
  weight: z.number().positive().nullable(),
  price: z.strictObject({ amount: z.number().int().min(0), currency: z.string().regex(/^[A-Z]{3}$/) }).nullable(),
  pen: known,
  colour: known,
  water: z.number().int().min(0).max(9).nullable(),
  pageButtons: known,
  onSale: known,
  lending: known,
  speech: known,
  formats: z.array(z.string().min(1)).nullable(),
})

/** The document of `GET /api/v1/editions/{number}`, Method 1 section 8, with no field more and none less. */
export const editionSchema = z.strictObject({
  number: editionNumber,
  publishedAt: z.iso.datetime(),
  sha256,
  method: z.number().int().min(1),
  control: z.strictObject({ paper: lab }),
  uncertainty: z.strictObject({ common: doubt, session: doubt }),
  devices: z.array(device),
})

/** The document of `GET /api/v1/editions`: every released edition, newest first. */
export const editionListSchema = z.strictObject({
  editions: z.array(
    z.strictObject({
      number: editionNumber,
      publishedAt: z.iso.datetime(),
      sha256,
      title: z.string().min(1),
      note: z.string(),
      href: z.string().regex(/^\/api\/v1\/editions\/[1-9]\d*$/),
    }),
  ),
})
export type EditionList = z.output<typeof editionListSchema>
