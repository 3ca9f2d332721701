import type { Prepared } from './fit'
import { fillNormals } from './random'
import type { Edition, EditionDevice } from './types'

/**
 * What is added in each draw to the page's L*, a*, b* and to the ink's L*. The ink's own a* and b* do not enter a fit,
 * so they are not drawn.
 */
export type Errors = { L: Float64Array; a: Float64Array; b: Float64Array; ink: Float64Array }

/** Per draw: one for each of L*, a*, b*; a device's own part has a fourth, the ink's L*. */
const SHARED = 3
const OWN = 4

/**
 * The measurement errors of Method 1, section 6: one common, one a session (times the device's share of it), both on
 * page and ink alike; and one a device, channel and state. Streams are named by edition, method and question, so the
 * same question always has the same errors, and no device's depend on which others are there.
 * @returns the errors of any device of the edition; its arrays are written over by the next call
 */
export function errorSource(
  edition: Edition,
  prepared: Pick<Prepared, 'question'>,
  draws: number,
): (device: Pick<EditionDevice, 'slug' | 'page' | 'ink' | 'sessions'>) => Errors {
  const stream = (name: string) => `${edition.number}|${edition.method}|${prepared.question}|${name}`
  const { common, session } = edition.uncertainty
  const commonNormals = fillNormals(stream('common'), new Float64Array(SHARED * draws))
  const sessions = new Map<string, Float64Array>()
  const own = new Float64Array(OWN * draws)
  const errors: Errors = {
    L: new Float64Array(draws),
    a: new Float64Array(draws),
    b: new Float64Array(draws),
    ink: new Float64Array(draws),
  }

  function sessionNormals(id: string): Float64Array {
    let normals = sessions.get(id)
    if (!normals) {
      normals = fillNormals(stream(`session ${id}`), new Float64Array(SHARED * draws))
      sessions.set(id, normals)
    }
    return normals
  }

  return (device) => {
    const { L, a, b, ink } = errors
    fill(errors, commonNormals, common.L, common.a, common.b)
    // In the order of names, so that the order an edition lists sessions in does not move the last bit.
    for (const id of Object.keys(device.sessions).sort()) {
      const share = device.sessions[id]!
      add(errors, sessionNormals(id), share * session.L, share * session.a, share * session.b)
    }
    fillNormals(stream(`device ${device.slug}`), own)
    const { page } = device
    const uInk = device.ink.u.L
    for (let k = 0, i = 0; k < draws; k++, i += OWN) {
      const shared = L[k]!
      L[k] = shared + page.u.L * own[i]!
      a[k] = a[k]! + page.u.a * own[i + 1]!
      b[k] = b[k]! + page.u.b * own[i + 2]!
      ink[k] = shared + uInk * own[i + 3]!
    }
    return errors
  }
}

function fill({ L, a, b }: Errors, normals: Float64Array, sL: number, sa: number, sb: number): void {
  for (let k = 0, i = 0; k < L.length; k++, i += SHARED) {
    L[k] = sL * normals[i]!
    a[k] = sa * normals[i + 1]!
    b[k] = sb * normals[i + 2]!
  }
}

function add({ L, a, b }: Errors, normals: Float64Array, sL: number, sa: number, sb: number): void {
  for (let k = 0, i = 0; k < L.length; k++, i += SHARED) {
    L[k] = L[k]! + sL * normals[i]!
    a[k] = a[k]! + sa * normals[i + 1]!
    b[k] = b[k]! + sb * normals[i + 2]!
  }
}

/** Standard deviation of a page's L* over the draws: own, session and common parts together. */
export function lightnessSpread(edition: Edition, device: Pick<EditionDevice, 'page' | 'sessions'>): number {
  const { common, session } = edition.uncertainty
  const shares = Object.values(device.sessions)
  return Math.hypot(device.page.u.L, common.L, session.L * Math.hypot(...shares))
}
