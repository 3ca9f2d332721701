import { problem } from '@/lib/contract/problem'
import type { Edition } from '@/lib/method/types'
import { storedJson } from '../../stored-json'

const written = new WeakMap<Edition, string>()

/** The document of one edition, written once per process. */
export function editionAnswer(request: Request, edition: Edition, cacheControl: string): Response {
  const body = written.get(edition) ?? JSON.stringify(edition)
  written.set(edition, body)
  return storedJson(request, body, edition.sha256, cacheControl)
}

export const noneReleased = () => problem(404, 'No edition has been released yet')
