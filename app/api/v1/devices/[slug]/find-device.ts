import { problem } from '@/lib/contract/problem'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { editionByNumber, latestEdition } from '@/lib/server/editions'
import { noneReleased } from '../../editions/edition-answer'

const SLUG = /^[a-z0-9]+(-[a-z0-9]+)*$/

/** A device in an edition, the newest where none is named, or the problem to answer with. */
export async function findDevice(
  slug: string,
  number: number | undefined,
): Promise<{ edition: Edition; device: EditionDevice } | { refusal: Response }> {
  const edition = await (number === undefined ? latestEdition() : editionByNumber(number))
  if (!edition) {
    const message = `edition is ${number}, which has not been released; leave it out or give a released number.`
    return {
      refusal:
        number === undefined
          ? noneReleased()
          : problem(404, 'There is no such edition', [{ field: 'edition', message }]),
    }
  }
  const device = SLUG.test(slug) ? edition.devices.find((one) => one.slug === slug) : undefined
  return device ? { edition, device } : { refusal: problem(404, `Edition ${edition.number} has no such device`) }
}
