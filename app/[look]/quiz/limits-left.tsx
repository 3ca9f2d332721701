import { Notice } from '@/components/ui/notice'
import { METHOD } from '@/lib/method/constants'
import type { ShortlistView } from '@/lib/quiz/shortlist'

/** How many devices the limits leave, and a warning where they are many or leave few. */
export function LimitsLeft({ view: { left, of, warnings } }: { view: ShortlistView }) {
  return (
    <div className="grid gap-3">
      <p>
        {left === of
          ? `All ${of} devices are`
          : left === 0
            ? 'None of the devices is'
            : left === 1
              ? '1 device is'
              : `${left} of ${of} devices are`}{' '}
        left{left === of ? '' : ' with these limits'}.
      </p>
      {warnings.includes('many-limits') && (
        <Notice look="warning">
          These are more than {METHOD.changes.manyLimits.value} limits. Each takes devices away that may suit you better
          than those that stay; keep the ones you could not do without.
        </Notice>
      )}
      {warnings.includes('few-devices') && (
        <Notice look="warning">
          {left === 0
            ? 'No device meets all of this. The result will say which come nearest.'
            : 'That leaves very few to choose from. The result will also say which nearly made it.'}
        </Notice>
      )}
    </div>
  )
}
