import type { Answers, Edition, EditionDevice } from '@/lib/method/types'
import type { Address } from '@/lib/quiz/address'
import { type NamedSpot, namedSpots } from '@/lib/quiz/request'
import type { RankedAnswer } from '@/lib/server/match'

/** One reader's question and its answer, as the sections of the page need it. */
export type Result = {
  address: Address
  answers: Answers
  /** Fields the method filled in. */
  assumed: string[]
  edition: Edition
  match: RankedAnswer
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
