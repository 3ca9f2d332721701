import { NearMisses } from '@/components/result/changes'
import { ButtonLink } from '@/components/ui/button'
import { formatList } from '@/lib/format/list'
import { formatMoney } from '@/lib/format/money'
import { formatNumber } from '@/lib/format/number'
import { toll } from '@/lib/quiz/limit-words'
import { quizHref } from '@/lib/quiz/moves'
import { deviceOf, type Result } from '@/lib/quiz/result'
import { FinePrint } from './fine-print'

/** No device meets all of the limits: which limit took how many, what would help, and who came nearest. */
export function NothingLeft({ result }: { result: Result }) {
  const { match, answers, edition, address } = result
  const { budget } = match.wouldChange
  const { currency } = answers.limits
  return (
    <main className="measure grid gap-10 py-12">
      <div>
        <h1>No device meets all of your limits</h1>
        <p className="mt-4 max-w-[60ch] text-lead">
          So many of the {formatNumber(edition.devices.length)} devices fail each limit:{' '}
          {formatList(toll(match.excluded))}. A device may fail several.
        </p>
        {budget && currency && (
          <p className="mt-3 max-w-[60ch]">
            With {formatMoney({ amount: budget.amount, currency })} to spend, {deviceOf(result, budget.first).name}{' '}
            would be left.
          </p>
        )}
        <ButtonLink href={quizHref(5, address)} prefetch={false} className="mt-6">
          Change my limits
        </ButtonLink>
      </div>
      <NearMisses result={result} level={2} />
      <FinePrint result={result} />
    </main>
  )
}
