'use client'

import Link from 'next/link'
import { type FormEvent, memo, useCallback, useEffect, useRef, useState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Notice } from '@/components/ui/notice'
import { type Address, readAddress } from '@/lib/quiz/address'
import { STEPS, type Step } from '@/lib/quiz/answers'
import { assumedOnSkipping } from '@/lib/quiz/assumptions'
import { stepOf } from '@/lib/quiz/fields'
import { GO, hrefAfter, problemsIn, quizHref } from '@/lib/quiz/moves'
import type { ShortlistView } from '@/lib/quiz/shortlist'
import { STEP_WORDS, stepTitle } from '@/lib/quiz/steps'
import { canonicalTexts } from '@/lib/quiz/write-address'
import { FormChanged } from './form-changed'
import { HiddenFields } from './hidden-fields'
import { LimitsLeft } from './limits-left'
import { Progress } from './progress'
import { StepBody } from './steps/step-body'

const Body = memo(StepBody)

/**
 * One step: its questions, and Back, Next, Not sure. The form is native and uncontrolled; it is read as a whole on every
 * change, and sent to the page where there is no JavaScript.
 */
export function StepForm({
  step,
  address,
  formats,
  view,
  arrival,
  onChange,
  onLeave,
  onMove,
}: {
  step: Step
  address: Address
  formats: readonly string[]
  view: ShortlistView
  /** How one came here: by opening the page, by a step, or by asking for the same step again. */
  arrival: 'opened' | 'moved' | 'again'
  onChange: (address: Address) => void
  /** The focus leaves a field. */
  onLeave: () => void
  onMove: (href: string, now: Address) => void
}) {
  const form = useRef<HTMLFormElement>(null)
  const heading = useRef<HTMLHeadingElement>(null)
  // As this visit found it: what is typed since lives in the form.
  const [found] = useState(address)
  const [texts] = useState(() => canonicalTexts(address))
  const [problems, setProblems] = useState(() => problemsIn(step, address))
  const [arrived] = useState(arrival)

  useEffect(() => {
    if (arrived === 'opened') return
    document.title = `${stepTitle(step)} · Lampleaf`
    if (arrived === 'again') return focusNewest(form.current)
    window.scrollTo(0, 0)
    heading.current?.focus({ preventScroll: true })
  }, [arrived, step])

  const read = useCallback(() => {
    if (!form.current) return null
    return readAddress(Array.from(new FormData(form.current), ([name, value]) => [name, String(value)] as const))
  }, [])
  const changed = useCallback(() => {
    const now = read()
    if (now) onChange(now)
  }, [read, onChange])

  function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const now = read()
    if (!now) return
    const button = (event.nativeEvent as SubmitEvent).submitter as HTMLButtonElement | null
    const href = hrefAfter(button?.value ?? GO.next, step, now)
    onChange(now)
    if (href === null) setProblems(problemsIn(step, now))
    else onMove(href, now)
  }

  const whole = found.problems.filter(({ field }) => field === null)
  const elsewhere = STEPS.filter((other) => other !== step && problemsIn(other, found).length > 0)
  return (
    <form
      ref={form}
      id="quiz"
      action="/quiz"
      noValidate
      autoComplete="off"
      onChange={changed}
      onBlur={onLeave}
      onSubmit={submit}
      className="grid gap-7 pb-8"
    >
      <Progress step={step} />
      {/* Enter in a field goes on, whatever button stands first. */}
      <button type="submit" name="go" value={GO.next} tabIndex={-1} aria-hidden="true" className="sr-only">
        Next
      </button>
      <input type="hidden" name="step" value={step} />
      <HiddenFields texts={[...texts].filter(([name]) => stepOf(name) !== step)} />

      <div>
        <p className="text-small text-soft">
          Step {step} of {STEPS.length}
        </p>
        <h1 ref={heading} tabIndex={-1} className="mt-1">
          {STEP_WORDS[step].heading}
        </h1>
        <p className="mt-3 max-w-[58ch] text-soft">{STEP_WORDS[step].intro}</p>
      </div>

      <ErrorSummary errors={problems.map(({ field, message }) => ({ id: field ?? 'quiz', message }))} />
      {whole.map(({ message }) => (
        <Notice key={message} look="error">
          {message}
        </Notice>
      ))}

      {elsewhere.length > 0 && (
        <Notice look="warning">
          There is an answer we could not understand in{' '}
          {elsewhere.map((other, i) => (
            <span key={other}>
              {i > 0 && ', '}
              <Link href={quizHref(other, found)} prefetch={false} className="text-brass-deep">
                step {other}
              </Link>
            </span>
          ))}
          . Until it is put right it counts as not answered.
        </Notice>
      )}

      <FormChanged value={changed}>
        <Body step={step} texts={texts} problems={problems} formats={formats} />
      </FormChanged>
      {step === 5 && <LimitsLeft view={view} />}

      <div className="grid gap-4">
        <div className="flex flex-wrap items-center gap-3">
          {step > 1 && (
            <Button type="submit" look="quiet" name="go" value={GO.back}>
              Back
            </Button>
          )}
          <Button type="submit" name="go" value={GO.next}>
            {step < 5 ? `Next: ${STEP_WORDS[(step + 1) as Step].about}` : 'Show my result'}
          </Button>
          <Button type="submit" look="quiet" name="go" value={GO.skip}>
            Not sure, skip
          </Button>
        </div>
        <p className="max-w-[58ch] text-note text-soft">
          If you skip this step we assume {assumedOnSkipping(step)}.{' '}
          <span className="noscript:hidden">Your answers stay in this browser until you ask for the result.</span>
        </p>
      </div>
    </form>
  )
}

/** To the spot just added, the last of the reader's own. */
function focusNewest(form: HTMLFormElement | null) {
  const own = Array.from(form?.querySelectorAll('[data-own]') ?? []).at(-1)
  own?.querySelector('input')?.focus()
}
