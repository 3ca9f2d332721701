import Link from 'next/link'
import { LightStrips } from '@/components/charts/light-strips'
import { formatNumber } from '@/lib/format/number'
import { eyeOf } from '@/lib/method/reserve'
import { DEFAULT_ANSWERS, SPOTS } from '@/lib/method/spots'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { deviceInLight, type InLight, PRINT_LIGHTNESS, paperInLight } from '@/lib/quiz/in-light'

const SHOWN_SPOTS = DEFAULT_ANSWERS.spots.map((spot) => ({
  ...spot,
  name: SPOTS.find(({ lux, frontLight }) => lux === spot.lux && frontLight === spot.frontLight)?.name ?? 'Your light',
}))

/** Contrast reserve of each page in the light the quiz assumes, with the control paper among them. */
export function InYourLight({ edition, devices }: { edition: Edition; devices: readonly EditionDevice[] }) {
  const eye = eyeOf(DEFAULT_ANSWERS.lightNeed, DEFAULT_ANSWERS.text)
  const seen = devices.map((device) => SHOWN_SPOTS.map((spot) => deviceInLight(device, spot, eye)))
  const unstated = devices.filter(({ frontLight }) => frontLight === null)
  return (
    <section aria-labelledby="light" className="mt-14 min-w-0">
      <h2 id="light">In the light one reads by</h2>
      <div className="card mt-4 p-4 sm:p-5">
        <LightStrips
          spots={SHOWN_SPOTS}
          rows={devices.map(({ slug, name, page }, i) => ({ slug, name, page, reserves: seen[i]!.map(shown) }))}
          paper={SHOWN_SPOTS.map((spot) => shown(paperInLight(edition.control.paper, spot, eye)))}
          named={devices.slice(0, 2).map(({ slug }) => slug)}
        />
      </div>
      <p className="mt-3 max-w-[70ch] text-note text-soft">
        How many times more contrast each page gives than the eye needs, for usual eyes and normal type, in the two
        places the quiz assumes. The paper is our control paper, printed in an ink of L* {formatNumber(PRINT_LIGHTNESS)}{' '}
        (house), without a light of its own.
        {seen.flat().some(({ frontLightOn }) => frontLightOn) &&
          ' Where a front light is on, the page’s tint mixes with the colour of that lamp, which our instrument does not see.'}
        {unstated.length > 0 &&
          ` A front light that is not stated (${unstated.map(({ name }) => name).join(', ')}) counts as none.`}{' '}
        <Link href="/quiz" prefetch={false}>
          Take your own light into account
        </Link>
        .
      </p>
    </section>
  )
}

/** Below three times the need nothing can be read, and the strips put it there. */
function shown({ reserve, readable }: InLight): number {
  return readable ? reserve : 0
}
