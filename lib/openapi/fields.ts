import type { JsonSchema } from './types'

/** A field of an answer or a question as a page shows it. */
export type Field = { path: string; type: string; meaning: string; required: boolean }

type Node = JsonSchema & {
  type?: string | string[]
  properties?: Record<string, Node>
  required?: string[]
  items?: Node
  prefixItems?: Node[]
  anyOf?: Node[]
  additionalProperties?: Node | boolean
  enum?: unknown[]
  const?: unknown
  description?: string
}

/** Every field of a schema, those inside others by their path: `ranked[].scores.clarity`. */
export function fieldsOf(schema: JsonSchema, prefix = ''): Field[] {
  const { properties = {}, required = [] } = schema as Node
  return Object.entries(properties).flatMap(([name, node]) => {
    const path = `${prefix}${name}`
    const own = { path, type: typeOf(node), meaning: node.description ?? '', required: required.includes(name) }
    return [own, ...inner(node, path)]
  })
}

function inner(node: Node, path: string): Field[] {
  const objects = [node, ...(node.anyOf ?? [])]
  return objects.flatMap((one) => [
    ...(one.properties ? fieldsOf(one, `${path}.`) : []),
    ...(one.items ? inner(one.items, `${path}[]`) : []),
  ])
}

/** What a value may be, in words. */
function typeOf(node: Node): string {
  if (node.anyOf) return node.anyOf.map(typeOf).join(' or ')
  if (Array.isArray(node.type)) return node.type.map((type) => typeOf({ type })).join(' or ')
  if (node.const !== undefined) return JSON.stringify(node.const)
  if (node.enum) return node.enum.map((word) => JSON.stringify(word)).join(' or ')
  if (node.prefixItems) return `list of ${node.prefixItems.length}: ${node.prefixItems.map(typeOf).join(', ')}`
  if (node.type === 'array') return `list of ${plural(typeOf(node.items ?? {}))}`
  if (node.type === 'object') return typeof node.additionalProperties === 'object' ? 'object by name' : 'object'
  return (
    { integer: 'whole number', number: 'number', string: 'text', boolean: 'true or false', null: 'null' }[
      node.type ?? ''
    ] ?? 'any'
  )
}

const PLURALS: Record<string, string> = {
  object: 'objects',
  text: 'texts',
  number: 'numbers',
  'whole number': 'whole numbers',
}
const plural = (type: string) => PLURALS[type] ?? type
