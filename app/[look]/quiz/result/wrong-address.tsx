import Link from 'next/link'
import { formatNumber } from '@/lib/format/number'
import type { Address } from '@/lib/quiz/address'
import { STEPS, type Step } from '@/lib/quiz/answers'
import { stepOf } from '@/lib/quiz/fields'
import { quizHref, resultHref } from '@/lib/quiz/moves'

import { FocusOnArrival } from './focus-on-arrival'

const MOST_SHOWN = 10

/** An address that does not make sense is told what is wrong, each with the way to the field that can put it right. */
export function WrongAddress({ address }: { address: Address }) {
  const shown = address.problems.slice(0, MOST_SHOWN)
  const more = address.problems.length - shown.length
  return (
    <main className="measure py-12">
      <FocusOnArrival className="rounded-card border-2 border-stop bg-sheet p-5">
        <h1 className="text-h2">Some of these answers do not make sense</h1>
        <ul className="mt-4 grid list-disc gap-2 pl-5">
          {shown.map(({ field, message }) => {
            const step = field === null ? null : stepOf(field)
            return (
              <li key={`${field} ${message}`}>
                {step ? (
                  <Link href={`${quizHref(step, address)}#${field}`} prefetch={false} className="text-stop">
                    {message}
                  </Link>
                ) : (
                  message
                )}
              </li>
            )
          })}
        </ul>
        {more > 0 && <p className="mt-2">And {formatNumber(more)} more.</p>}
      </FocusOnArrival>
      <p className="mt-6 flex flex-wrap gap-x-6">
        <Link href={resultHref({ ...address, problems: [] })} prefetch={false}>
          Leave these out and show the result
        </Link>
        <Link href={quizHref(firstStep(address), address)} prefetch={false}>
          Go through the quiz
        </Link>
      </p>
    </main>
  )
}

function firstStep({ problems }: Address): Step {
  const wrong = problems.map(({ field }) => field && stepOf(field))
  return STEPS.find((step) => wrong.includes(step)) ?? 1
}
