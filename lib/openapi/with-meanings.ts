import { MEANINGS } from './meanings'
import type { JsonSchema } from './types'

/** The schema with the meaning of every field written into it. @param within what the fields stand in */
export function withMeanings(schema: JsonSchema, within: string): JsonSchema {
  return Object.fromEntries(
    Object.entries(schema).map(([key, value]) => [
      key,
      key === 'properties' ? described(value as Record<string, JsonSchema>, within) : inside(value, within),
    ]),
  )
}

function inside(value: unknown, within: string): unknown {
  if (Array.isArray(value)) return value.map((one) => inside(one, within))
  return typeof value === 'object' && value !== null ? withMeanings(value as JsonSchema, within) : value
}

function described(properties: Record<string, JsonSchema>, within: string): Record<string, JsonSchema> {
  return Object.fromEntries(
    Object.entries(properties).map(([name, schema]) => {
      const description = MEANINGS[`${within}.${name}`] ?? MEANINGS[name]
      return [name, { ...(description && { description }), ...withMeanings(schema, name) }]
    }),
  )
}
