import Link from 'next/link'
import { Ladder, type LadderCurve } from '@/components/charts/ladder'
import { READING_BANDS } from '@/components/reading-bands'
import { ladderPoints } from '@/lib/findings/ladder'
import { surfaceOf } from '@/lib/method/fit'
import type { Edition, EditionDevice } from '@/lib/method/types'

/** How much light a page needs: the lightest and the darkest page of the edition over all lights, the others quiet. */
export function SamePage({ edition }: { edition: Edition }) {
  const byLightness = [...edition.devices].sort((one, other) => other.page.L - one.page.L)
  const [lightest, darkest] = [byLightness[0], byLightness.at(-1)]
  if (!lightest || !darkest || lightest === darkest) return null
  return (
    <section aria-labelledby="same-page" className="later measure mt-14 grid gap-x-12 gap-y-6 lg:grid-cols-[1fr_1.6fr]">
      <div>
        <h2 id="same-page">Same page, different light</h2>
        <p className="mt-3">
          A page only gives back the light that falls on it. This chart shows how many times more contrast each page
          gives than your eye needs, from a dim room to full sun, with the front light off. Where the curves sit low, a
          lighter page matters most.
        </p>
        <p className="mt-3 text-small text-soft">
          The lightest and the darkest page of the edition, the others between them; normal text and usual eyes. The
          marks for spot, fluent and easiest reading are from memory.{' '}
          <Link href="/method#reserve">How it is worked out</Link>.
        </p>
      </div>
      <div className="card min-w-0 p-4">
        <Ladder
          curves={byLightness.map((device) =>
            curveOf(device, device === lightest ? 'first' : device === darkest ? 'second' : 'quiet'),
          )}
          bands={READING_BANDS}
        />
      </div>
    </section>
  )
}

function curveOf(device: EditionDevice, style: LadderCurve['style']): LadderCurve {
  return { name: device.name, points: ladderPoints(surfaceOf(device)), style }
}
