import { SECURITY_HEADERS } from '../page-policy.mjs'

/**
 * Answers in the site's place, with nothing of what the site may have begun to say; not to be stored by anybody.
 * @param {import('node:http').ServerResponse} response
 * @param {number} status
 * @param {string} text
 * @param {Record<string, string>} headers Content-Type among them
 */
export function answerOurselves(response, status, text, headers) {
  for (const name of response.getHeaderNames()) response.removeHeader(name)
  for (const { key, value } of SECURITY_HEADERS) response.setHeader(key, value)
  const body = Buffer.from(text)
  response.writeHead(status, { 'Cache-Control': 'no-store', 'Content-Length': body.length, ...headers })
  response.end(response.req?.method === 'HEAD' ? undefined : body)
}
