import type * as z from 'zod/mini'
import { fieldErrors, problem } from '@/lib/contract/problem'
import { clip } from '@/lib/contract/shown'

/** The parameters of an address as a schema reads them, or the problem to answer with. Each may be given once. */
export function readQuery<T extends z.ZodMiniType>(
  request: Request,
  schema: T,
): { query: z.output<T>; asked: URLSearchParams } | { refusal: Response } {
  const { searchParams: asked } = new URL(request.url)
  const twice = [...new Set(asked.keys())].filter((name) => asked.getAll(name).length > 1).slice(0, 50)
  const errors = twice.map((name) => ({ field: clip(name), message: `${clip(name)} is given twice; give it once.` }))
  const parsed = schema.safeParse(Object.fromEntries(asked))
  if (!parsed.success) errors.push(...fieldErrors(parsed.error))
  return parsed.success && errors.length === 0
    ? { query: parsed.data, asked }
    : { refusal: problem(400, 'The question is not understood', errors) }
}
