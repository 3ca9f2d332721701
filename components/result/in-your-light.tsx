import { LightStrips } from '@/components/charts/light-strips'
import { formatNumber } from '@/lib/format/number'
import { eyeOf } from '@/lib/method/reserve'
import type { RankedDevice } from '@/lib/method/types'
import { deviceInLight, type InLight, PRINT_LIGHTNESS, paperInLight } from '@/lib/quiz/in-light'
import { deviceOf, type Result, spotsOf } from '@/lib/quiz/result'

/** Contrast reserve of every device left, in each of the reader's spots, with the control paper among them. */
export function InYourLight({ result, ranked }: { result: Result; ranked: readonly RankedDevice[] }) {
  const { answers, edition } = result
  const spots = spotsOf(result)
  const eye = eyeOf(answers.lightNeed, answers.text)
  const rows = ranked.map(({ slug }) => {
    const device = deviceOf(result, slug)
    const reserves = spots.map((spot) => shown(deviceInLight(device, spot, eye)))
    return { slug, name: device.name, page: device.page, reserves }
  })
  const lit = ranked.some(({ slug }) =>
    spots.some((spot) => deviceInLight(deviceOf(result, slug), spot, eye).frontLightOn),
  )
  return (
    <section aria-labelledby="light" className="min-w-0 print:hidden">
      <h2 id="light">In the light you read by</h2>
      <div className="card mt-4 p-4 sm:p-5">
        <LightStrips
          spots={spots}
          rows={rows}
          paper={spots.map((spot) => shown(paperInLight(edition.control.paper, spot, eye)))}
          named={ranked.slice(0, 2).map(({ slug }) => slug)}
        />
      </div>
      <p className="mt-3 max-w-[70ch] text-note text-soft">
        How many times more contrast each page gives than your eyes need for {answers.text} type. The paper is our
        control paper, printed in an ink of L* {formatNumber(PRINT_LIGHTNESS)} (house), without a light of its own.
        {lit &&
          ' Where a front light is on, the page’s tint mixes with the colour of that lamp, which our instrument does not see.'}
      </p>
    </section>
  )
}

/** Below three times the need nothing can be read, and the strips put it there. */
function shown({ reserve, readable }: InLight): number {
  return readable ? reserve : 0
}
