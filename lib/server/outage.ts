import { DeadlineExceeded } from './deadline'

// What Node and the driver say when the server cannot be reached or the connection broke.
const CONNECTION =
  /^(ECONNREFUSED|ECONNRESET|ENOTFOUND|EAI_AGAIN|EHOSTUNREACH|ENETUNREACH|EPIPE|ETIMEDOUT|CONNECT_TIMEOUT|CONNECTION_(CLOSED|ENDED|DESTROYED))$/
// PostgreSQL's own classes: 08 connection, 53 out of resources, 57P0x shutting down or starting, 57014 took too long,
// 55P03 a lock was not to be had (PostgreSQL 15 manual, appendix A).
const SERVER = /^(08...|53...|57P0.|57014|55P03)$/

/** Whether an error, or what caused it, is the machine's doing and likely to pass: the database away, slow or full. */
export function isOutage(error: unknown): boolean {
  for (let at = error, depth = 0; at instanceof Error && depth < 8; at = at.cause, depth += 1) {
    if (at instanceof DeadlineExceeded) return true
    if (at instanceof AggregateError && at.errors.some(isOutage)) return true
    const code = (at as { code?: unknown }).code
    if (typeof code === 'string' && (CONNECTION.test(code) || SERVER.test(code))) return true
  }
  return false
}
