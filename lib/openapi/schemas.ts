import { z } from 'zod'
import { deviceReadingsSchema, deviceSchema } from '@/lib/contract/device'
import { deviceListSchema } from '@/lib/contract/device-list'
import { editionListSchema, editionSchema } from '@/lib/contract/edition'
import { matchAnswerSchema, problemSchema } from '@/lib/contract/match-answer'
import { matchRequestSchema } from '@/lib/contract/match-request'
import type { JsonSchema } from './types'
import { withMeanings } from './with-meanings'

/**
 * A zod schema as JSON Schema 2020-12, which OpenAPI 3.1 speaks. Rules that run code, such as that weights are not all
 * zero, have no form there; the descriptions and the problems tell them.
 * @param io what is sent to us is an input, what we send an output
 */
export function jsonSchema(schema: z.core.$ZodType, io: 'input' | 'output'): JsonSchema {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any', override: withoutSafeBounds })
  return rest
}

/** Zod bounds every whole number by what a double holds exactly, which says nothing of the value. */
function withoutSafeBounds({ jsonSchema: written }: { jsonSchema: z.core.JSONSchema.BaseSchema }): void {
  if (written.minimum === Number.MIN_SAFE_INTEGER) delete written.minimum
  if (written.maximum === Number.MAX_SAFE_INTEGER) delete written.maximum
  // A default is of the value as read; what is sent is text.
  delete written.default
}

const ANSWERS = {
  Edition: editionSchema,
  EditionList: editionListSchema,
  DeviceList: deviceListSchema,
  Device: deviceSchema,
  DeviceReadings: deviceReadingsSchema,
  MatchAnswer: matchAnswerSchema,
  Problem: problemSchema,
}
const QUESTIONS = { MatchRequest: matchRequestSchema }
type SchemaName = keyof typeof ANSWERS | keyof typeof QUESTIONS

function all(schemas: Record<string, z.core.$ZodType>, io: 'input' | 'output') {
  return Object.entries(schemas).map(([name, schema]) => [name, withMeanings(jsonSchema(schema, io), name)] as const)
}

/** Every schema of the API by name, each field with its meaning. */
export const SCHEMAS: Record<string, JsonSchema> = Object.fromEntries([
  ...all(ANSWERS, 'output'),
  ...all(QUESTIONS, 'input'),
])

export const ref = (name: SchemaName): JsonSchema => ({ $ref: `#/components/schemas/${name}` })
