import { problem } from '@/lib/contract/problem'
import { findRepeatedName } from '@/lib/contract/repeated-name'
import { DeadlineExceeded, withDeadline } from '@/lib/server/deadline'

/** House: a full question takes about 2 kB. */
export const MAX_BODY_BYTES = 64 * 1024
const BODY_DEADLINE_MS = 10_000
const JSON_TYPE = /^application\/json\s*(;\s*charset="?utf-8"?\s*)?$/i

/** The JSON a request carries, or the problem to answer with. Reads no more than 64 kB, whatever the headers claim. */
export async function readJson(request: Request): Promise<{ value: unknown } | { refusal: Response }> {
  if (!JSON_TYPE.test(request.headers.get('content-type')?.trim() ?? ''))
    return refuse(415, 'The content type must be application/json', { 'accept-post': 'application/json' })

  const bytes = await readBody(request)
  if (bytes === 'too large') return refuse(413, `The body must not be longer than ${MAX_BODY_BYTES} bytes`)
  if (bytes === 'too slow') return refuse(408, 'The body did not arrive within 10 seconds', { connection: 'close' })

  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes)
    const value: unknown = JSON.parse(text)
    const twice = findRepeatedName(text)
    if (twice === null) return { value }
    const message = `${twice} stands twice; give it once.`
    return { refusal: problem(400, 'The question is not understood', [{ field: twice, message }]) }
  } catch (error) {
    // Broken UTF-8 and broken JSON are the sender's; anything else is ours.
    if (error instanceof SyntaxError || error instanceof TypeError)
      return refuse(
        400,
        `The body is not JSON in UTF-8${error instanceof SyntaxError ? `: ${plain(error.message)}` : ''}`,
      )
    throw error
  }
}

const refuse = (status: number, title: string, headers: HeadersInit = {}) => ({
  refusal: problem(status, title, [{ field: '', message: `${title}.` }], headers),
})

/** The parser's words about where it stopped, without the reader's own text in them. */
function plain(message: string): string {
  const place = /position \d+/.exec(message)
  return place ? `it breaks off at ${place[0]}` : 'it ends too early or is not JSON at all'
}

async function readBody(request: Request): Promise<Uint8Array | 'too large' | 'too slow'> {
  if (Number(request.headers.get('content-length')) > MAX_BODY_BYTES) return 'too large'
  if (!request.body) return new Uint8Array()
  const reader = request.body.getReader()
  try {
    return await withDeadline(collect(reader), BODY_DEADLINE_MS, 'The body did not arrive')
  } catch (error) {
    if (error instanceof DeadlineExceeded) return 'too slow'
    throw error
  } finally {
    reader.cancel().catch(() => {})
  }
}

async function collect(reader: ReadableStreamDefaultReader<Uint8Array>): Promise<Uint8Array | 'too large'> {
  const chunks: Uint8Array[] = []
  let length = 0
  for (;;) {
    const { done, value } = await reader.read()
    if (done) return joined(chunks, length)
    length += value.byteLength
    if (length > MAX_BODY_BYTES) return 'too large'
    chunks.push(value)
  }
}

function joined(chunks: Uint8Array[], length: number): Uint8Array {
  const whole = new Uint8Array(length)
  let at = 0
  for (const chunk of chunks) {
    whole.set(chunk, at)
    at += chunk.byteLength
  }
  return whole
}
