import { constants } from 'node:zlib'
import compression from 'compression'

/** House: quick enough to squeeze what is made for one reader while they wait. */
const BROTLI_QUALITY = 4

const middleware = compression({
  brotli: { params: { [constants.BROTLI_PARAM_QUALITY]: BROTLI_QUALITY } },
  // A part of a file is a part of its bytes as they are (RFC 9110, 14).
  filter: (request, response) => response.statusCode !== 206 && compression.filter(request, response),
})

/** Squeezes answers as they are written, in the encoding the reader prefers; small and packed ones stay as they are. */
export function squeezed(handler) {
  return (request, response) => middleware(request, response, () => handler(request, response))
}
