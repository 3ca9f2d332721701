import type { Operation } from './types'

/** A request an operation's own examples make: its address and, for POST, its body. */
export type ExampleRequest = { method: 'GET' | 'POST'; path: string; body?: string }

/**
 * The request made of an operation's examples: path parameters filled in and, of the query, the parameters named.
 * @param asked names of query parameters to give
 */
export function exampleRequest(
  path: string,
  method: ExampleRequest['method'],
  { parameters = [], requestBody }: Operation,
  asked: readonly string[] = [],
): ExampleRequest {
  const filled = parameters
    .filter((one) => one.in === 'path')
    .reduce((address, { name, example }) => address.replace(`{${name}}`, encodeURIComponent(example)), path)
  const query = new URLSearchParams(
    parameters
      .filter((one) => one.in === 'query' && asked.includes(one.name))
      .map(({ name, example }) => [name, example]),
  ).toString()
  const examples = Object.values(requestBody?.content['application/json']?.examples ?? {})
  const value = examples.at(-1)?.value
  return {
    method,
    path: query ? `${filled}?${query}` : filled,
    ...(value !== undefined && { body: JSON.stringify(value) }),
  }
}

/** The request as a line for a shell. JSON of ours holds no apostrophe, so single quotes hold it. */
export function curlLine({ method, path, body }: ExampleRequest, origin: string): string {
  const address = `'${new URL(path, origin).href}'`
  if (method === 'GET') return `curl -s ${address}`
  return [`curl -s ${address}`, `  -H 'content-type: application/json'`, `  -d '${body}'`].join(' \\\n')
}
