/** The part of OpenAPI 3.1 this API is written in. */
export type JsonSchema = { [key: string]: unknown }

export type Parameter = {
  name: string
  in: 'path' | 'query'
  required: boolean
  description: string
  schema: JsonSchema
  /** A value that works. */
  example: string
}

export type Answer = {
  description: string
  headers?: Record<string, { description: string; schema: JsonSchema }>
  content?: Record<string, { schema: JsonSchema }>
}

export type Operation = {
  operationId: string
  summary: string
  description: string
  parameters?: Parameter[]
  requestBody?: {
    required: true
    content: Record<string, { schema: JsonSchema; examples: Record<string, { summary: string; value: unknown }> }>
  }
  responses: Record<string, Answer>
}

export type Path = { get?: Operation; post?: Operation }

export type OpenApi = {
  openapi: '3.1.1'
  info: {
    title: string
    version: string
    summary: string
    description: string
    license: { name: string; identifier: string }
  }
  servers: { url: string; description: string }[]
  security: never[]
  paths: Record<string, Path>
  components: { schemas: Record<string, JsonSchema> }
}
