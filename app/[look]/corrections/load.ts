import 'server-only'
import type { CorrectionRecord } from '@/db/queries/corrections'
import { type DeviceChange, deviceChange } from '@/lib/edition/changes'
import type { Edition } from '@/lib/method/types'
import { editionByNumber } from '@/lib/server/editions'

/** A correction with what it changed: the device in the edition that was wrong and in the one that put it right. */
export type ShownCorrection = CorrectionRecord & { change: DeviceChange | null }

/** The change is null while no edition puts it right, or where one of the two does not hold the device. */
export function withChanges(corrections: readonly CorrectionRecord[]): Promise<ShownCorrection[]> {
  return Promise.all(
    corrections.map(async (correction) => {
      const { wrongIn, rightIn, slug } = correction
      if (wrongIn === null || rightIn === null) return { ...correction, change: null }
      const [wrong, right] = await Promise.all([editionByNumber(wrongIn), editionByNumber(rightIn)])
      const [before, after] = [placed(wrong, slug), placed(right, slug)]
      return { ...correction, change: before && after ? deviceChange(before, after) : null }
    }),
  )
}

function placed(edition: Edition | null, slug: string) {
  const device = edition?.devices.find((one) => one.slug === slug)
  return edition && device ? { ...edition, device } : null
}
