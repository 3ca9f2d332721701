import { pairsOf } from '@/lib/compare/address'
import { differencesOf } from '@/lib/compare/differences'
import type { Units } from '@/lib/look'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { CompareBooth } from './compare-booth'
import { Differences } from './differences'
import { Figures } from './figures'
import { InYourLight } from './in-your-light'
import { Share } from './share'
import { Specs } from './specs'

/** Two to four devices: their pages touching, how these differ, their light, their facts, and the link to it all. */
export function Comparison({
  edition,
  devices,
  units,
}: {
  edition: Edition
  devices: readonly EditionDevice[]
  units: Units
}) {
  const pairs = pairsOf(devices).map(([one, other]) => differencesOf(edition, one, other))
  return (
    <>
      <CompareBooth devices={devices} paper={edition.control.paper} />
      <Differences pairs={pairs} />
      <Figures edition={edition} devices={devices} />
      <InYourLight edition={edition} devices={devices} />
      <Specs devices={devices} units={units} />
      <Share edition={edition} devices={devices} />
    </>
  )
}
