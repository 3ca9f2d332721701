import type { Answers, Edition, EditionDevice, MatchAnswer } from '@/lib/method/types'
import type { Address } from './address'
import { type NamedSpot, namedSpots } from './request'

/** One reader's question and its answer, as the sections of the page need it. */
export type Result = {
  address: Address
  answers: Answers
  /** Fields the method filled in. */
  assumed: string[]
  edition: Edition
  match: Omit<MatchAnswer, 'assumed'>
}

export function deviceOf({ edition }: Pick<Result, 'edition'>, slug: string): EditionDevice {
  const device = edition.devices.find((one) => one.slug === slug)
  if (!device) throw new Error(`Edition ${edition.number} ranks ${slug} but does not hold it`)
  return device
}

/** The spots by the names the reader knows them by, in the order of the question. */
export function spotsOf({ address }: Pick<Result, 'address'>): NamedSpot[] {
  return namedSpots(address.answers)
}
