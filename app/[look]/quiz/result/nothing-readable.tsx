import { ButtonLink } from '@/components/ui/button'
import { formatList } from '@/lib/format/list'
import { formatLux, formatNumber, THIN_SPACE } from '@/lib/format/number'
import { quizHref } from '@/lib/quiz/moves'
import { type Result, spotsOf } from '@/lib/quiz/result'
import { FinePrint } from './fine-print'

/** In the reader's light no page can be read, so nothing is ranked: zeros have no order. */
export function NothingReadable({ result }: { result: Result }) {
  const { match, address } = result
  const spots = spotsOf(result)
  const barred = spots.some(({ frontLight }) => !frontLight)
  const devices = match.ranked.length
  return (
    <main className="measure grid gap-10 py-12">
      <div>
        <h1>Nothing can be read in that light</h1>
        <p className="mt-4 max-w-[60ch] text-lead">
          {devices > 1
            ? `None of the ${formatNumber(devices)} pages gives`
            : 'The one page your limits leave does not give'}{' '}
          three times the contrast your eyes need, the least for reading, in{' '}
          {formatList(spots.map(({ name, lux }) => `“${name}” (about ${formatLux(lux)}${THIN_SPACE}lux)`))}. So there is
          no ranking: every fit would be 0.
        </p>
        <p className="mt-3 max-w-[60ch]">
          {barred
            ? 'Allow the device’s own front light there, or add a place with more light.'
            : 'The devices your limits leave have no front light that would help. Loosen a limit, or add a place with more light.'}
        </p>
        <div className="mt-6 flex flex-wrap gap-3">
          <ButtonLink href={quizHref(2, address)} prefetch={false}>
            Change where I read
          </ButtonLink>
          <ButtonLink href={quizHref(5, address)} look="quiet" prefetch={false}>
            Change my limits
          </ButtonLink>
        </div>
      </div>
      <FinePrint result={result} />
    </main>
  )
}
