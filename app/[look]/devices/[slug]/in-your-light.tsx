import Link from 'next/link'
import { Ladder } from '@/components/charts/ladder'
import { READING_BANDS } from '@/components/reading-bands'
import { lightnessToY } from '@/lib/colour/lab'
import { DECIMALS } from '@/lib/findings/decimals'
import { ladderPoints } from '@/lib/findings/ladder'
import type { PublishedFigures } from '@/lib/findings/published'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'
import { PRINT_LIGHTNESS } from '@/lib/quiz/in-light'

const Y_PRINT = lightnessToY(PRINT_LIGHTNESS)

/** The page against the control paper, over the light that falls on both. */
export function InYourLight({
  device,
  figures,
  yPaper,
}: {
  device: EditionDevice
  figures: PublishedFigures
  yPaper: number
}) {
  const { timesTheLight, fromPaper, yPage, yInk } = figures
  return (
    <section aria-labelledby="light" className="mt-14 print:hidden grid gap-x-12 gap-y-6 lg:grid-cols-[1fr_1.6fr]">
      <div>
        <h2 id="light">In your light</h2>
        <p className="mt-3">
          This page needs{' '}
          <strong>
            {formatNumber(timesTheLight.value, DECIMALS.times)} {formatDoubt(timesTheLight.doubt, DECIMALS.times)} times
          </strong>{' '}
          the light of our control paper to look as light. Its colour differs from that paper by ΔE<sub>00</sub>{' '}
          {formatNumber(fromPaper.value, DECIMALS.difference)} {formatDoubt(fromPaper.doubt, DECIMALS.difference)}.
        </p>
        <p className="mt-3 text-small text-soft">
          The chart shows how many times more contrast the page gives than the eye needs, with its front light off,
          beside the control paper printed in an ink of L* {formatNumber(PRINT_LIGHTNESS)} (house); normal text and
          usual eyes.{' '}
          <Link href="/method#reserve" prefetch={false}>
            How it is worked out
          </Link>
          .
        </p>
        <p className="mt-3 text-small text-soft">{frontLightInWords(device)}</p>
      </div>
      <div className="card min-w-0 p-4">
        <Ladder
          curves={[
            { name: device.name, style: 'first', points: ladderPoints({ yPage: yPage.value, yInk: yInk.value }) },
            {
              name: 'Control paper',
              style: 'second',
              points: ladderPoints({ yPage: yPaper, yInk: Y_PRINT }),
            },
          ]}
          bands={READING_BANDS}
        />
      </div>
    </section>
  )
}

function frontLightInWords({ frontLight }: EditionDevice): string {
  if (frontLight === null) return 'Whether it has a front light is not stated; we count none.'
  if (frontLight === false || frontLight.max === 0) return 'It has no front light: in the dark it cannot be read.'
  const most = `Its front light makes a white page as bright as ${formatNumber(frontLight.max)} cd/m² at most`
  return frontLight.min === null
    ? `${most}; how far down it goes is not stated.`
    : `${most} and ${formatNumber(frontLight.min, 1)} cd/m² at least.`
}
