/**
 * Holds back what a handler writes until its kind is known.
 * @param {import('node:http').ServerResponse} response
 * @param {(status: number, headers: object) => 'hold' | 'pass'} decide asked once, when the handler begins to write:
 *   hold the whole answer back, or let it go through as it comes
 * @param {(answer: { status: number, headers: object, body: Buffer }) => void} whenHeld given a held answer at its end;
 *   it writes to the response, whose headers are still unsent
 */
export function capture(response, decide, whenHeld) {
  const original = {
    write: response.write,
    end: response.end,
    writeHead: response.writeHead,
    flushHeaders: response.flushHeaders,
  }
  const chunks = []
  let mode = null
  const passes = () => {
    mode ??= decide(response.statusCode, response.getHeaders())
    return mode === 'pass'
  }
  const add = (chunk, encoding) => {
    if (chunk !== undefined && chunk !== null && typeof chunk !== 'function')
      chunks.push(Buffer.isBuffer(chunk) ? chunk : Buffer.from(chunk, typeof encoding === 'string' ? encoding : 'utf8'))
  }

  response.writeHead = (status, ...rest) => {
    if (mode === 'pass') return original.writeHead.call(response, status, ...rest)
    response.statusCode = status
    const headers = rest.find((one) => one && typeof one === 'object')
    for (const [name, value] of Object.entries(headers ?? {})) response.setHeader(name, value)
    return passes() ? original.writeHead.call(response, status) : response
  }
  response.flushHeaders = () => {
    if (passes()) original.flushHeaders.call(response)
  }
  response.write = (chunk, encoding, then) => {
    if (passes()) return original.write.call(response, chunk, encoding, then)
    add(chunk, encoding)
    const callback = typeof encoding === 'function' ? encoding : then
    if (callback) queueMicrotask(callback)
    return true
  }
  response.end = (chunk, encoding, then) => {
    if (passes()) return original.end.call(response, chunk, encoding, then)
    add(chunk, encoding)
    const callback = [chunk, encoding, then].find((one) => typeof one === 'function')
    if (callback) response.once('finish', callback)
    Object.assign(response, original)
    whenHeld({ status: response.statusCode, headers: { ...response.getHeaders() }, body: Buffer.concat(chunks) })
    return response
  }
}
