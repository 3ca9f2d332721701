import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { formatList } from '@/lib/format/list'
import { formatNumber, formatShare } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { limitWarnings } from '@/lib/method/limits'
import { eyeOf } from '@/lib/method/reserve'
import { darkSpots } from '@/lib/quiz/in-light'
import { deviceOf, type Result, spotsOf } from '@/lib/quiz/result'

/** Sums of shares differ in their last bits. */
const ROUNDING = 1e-9

/** What a reader must know before the ranking: places where nothing can be read, and limits that leave little. */
export function Notices({ result }: { result: Result }) {
  const { answers, match } = result
  const left = match.ranked.map(({ slug }) => deviceOf(result, slug))
  const dark = darkSpots(spotsOf(result), left, eyeOf(answers.lightNeed, answers.text))
  const unreadable = match.ranked.filter((row) => row.unreadable === 1).map(({ slug }) => deviceOf(result, slug).name)
  const partly = match.ranked
    .filter((row) => row.unreadable > 0 && row.unreadable < 1)
    .map((row) => ({ name: deviceOf(result, row.slug).name, share: row.unreadable }))
    .filter(({ share }) => share > shareOf(dark, spotsOf(result)) + ROUNDING)
  const warnings = limitWarnings(answers.limits, left.length)
  if (dark.length + unreadable.length + partly.length + warnings.length === 0) return null
  return (
    <div className="-mb-4 grid gap-3 print:mb-0 print:gap-1 print:*:border-0 print:*:p-0">
      {dark.map(({ name, frontLight }) => (
        <Notice key={name} look="warning">
          “{name}”: none of these pages can be read there{frontLight ? ', not even with a front light' : ''}. Those
          hours cut every fit by the same share; as dim light they still bear on{' '}
          <Link href="/method#weights">how much each aim counts</Link>.
          {frontLight ? '' : ' With a front light allowed there, the order may change.'}
        </Notice>
      ))}
      {unreadable.length > 0 && (
        <Notice>
          Not ranked, since {unreadable.length > 1 ? 'they cannot' : 'it cannot'} be read in any of your spots:{' '}
          {formatList(unreadable)}.
        </Notice>
      )}
      {partly.length > 0 && (
        <Notice>
          Part of your reading happens where these cannot be read, and their fit is cut by as much:{' '}
          {formatList(partly.map(({ name, share }) => `${name} (${formatShare(share)} of your hours)`))}.
        </Notice>
      )}
      {warnings.includes('many-limits') && (
        <Notice look="warning">
          You set more than {METHOD.changes.manyLimits.value} limits. Each takes devices away whatever their page is
          like.
        </Notice>
      )}
      {warnings.includes('few-devices') && (
        <Notice look="warning">
          Your limits leave {formatNumber(left.length)} of {formatNumber(result.edition.devices.length)} devices.
        </Notice>
      )}
    </div>
  )
}

/** Which share of the hours falls to some of the spots. */
function shareOf(some: readonly { hours: number }[], all: readonly { hours: number }[]): number {
  const sum = (spots: readonly { hours: number }[]) => spots.reduce((hours, spot) => hours + spot.hours, 0)
  return sum(some) / sum(all)
}
