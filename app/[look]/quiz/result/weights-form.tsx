'use client'

import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { type FormEvent, useEffect, useRef, useState, useTransition } from 'react'
import * as z from 'zod/mini'
import { AIM_NAMES } from '@/components/aims'
import { Button } from '@/components/ui/button'
import { FieldError } from '@/components/ui/field'
import { formatExact, formatNumber } from '@/lib/format/number'
import { AIMS, type Aim } from '@/lib/method/types'
import { readAddress } from '@/lib/quiz/address'
import { weightField } from '@/lib/quiz/fields'
import { RESULT, resultHref } from '@/lib/quiz/moves'
import { plainNumber } from '@/lib/quiz/values'
import { queryOf } from '@/lib/quiz/write-address'
import { HiddenFields } from '../hidden-fields'

// A content policy without eval would report zod's probe for it.
z.config({ jitless: true })

const SETTLE_MS = 500

/**
 * The four weights as numbers with sliders. They are shares: only their proportions count. With JavaScript the page
 * follows the hand; without it the form is sent.
 * @param others the rest of the answers, as pairs of the address
 */
export function WeightsForm({
  weights,
  others,
  byHand,
}: {
  weights: Record<Aim, number>
  others: readonly (readonly [string, string])[]
  byHand: boolean
}) {
  const router = useRouter()
  const form = useRef<HTMLFormElement>(null)
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)
  const [pending, startTransition] = useTransition()
  const [moved, setMoved] = useState(false)
  const [problem, setProblem] = useState<string | null>(null)
  const [texts, setTexts] = useState(() => opening(weights, byHand))
  useEffect(() => () => clearTimeout(timer.current), [])

  const numbers = AIMS.map((aim) => plainNumber(texts[aim]) ?? 0)
  const sum = numbers.reduce((total, number) => total + number, 0)

  function follow(next: Record<Aim, string>) {
    const address = readAddress([...others, ...AIMS.map((aim) => [weightField(aim), next[aim]] as const)])
    const wrong = address.problems[0]?.message ?? null
    setProblem(wrong)
    if (wrong || !address.answers.weights) return
    setMoved(true)
    startTransition(() => router.replace(resultHref(address), { scroll: false }))
  }
  function set(aim: Aim, text: string) {
    const next = { ...texts, [aim]: text }
    setTexts(next)
    clearTimeout(timer.current)
    timer.current = setTimeout(() => follow(next), SETTLE_MS)
  }
  function submit(event: FormEvent) {
    event.preventDefault()
    clearTimeout(timer.current)
    follow(texts)
  }

  const query = queryOf(others)
  return (
    <form
      ref={form}
      action={RESULT}
      autoComplete="off"
      noValidate
      onSubmit={submit}
      className="mt-2 grid max-w-160 gap-4"
    >
      <HiddenFields texts={others} />
      <p className="max-w-[60ch] text-small text-soft">
        These are the final weights: set by hand, your light does not change them any more. Only their proportions
        count.
      </p>
      {problem && <FieldError id="weights">{problem}</FieldError>}
      <div className="border-t border-rule">
        {AIMS.map((aim, i) => (
          <div
            key={aim}
            className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 border-b border-rule py-2 sm:grid-cols-[minmax(0,1fr)_11rem_auto_6rem]"
          >
            <label htmlFor={weightField(aim)} className="font-semibold">
              {AIM_NAMES[aim]}
            </label>
            <input
              type="range"
              tabIndex={-1}
              aria-label={`Weight by slider: ${AIM_NAMES[aim]}`}
              min={0}
              max={100}
              step={1}
              value={Math.min(100, numbers[i] ?? 0)}
              onChange={(event) => set(aim, event.target.value)}
              className="h-11 w-full cursor-pointer max-sm:order-3 max-sm:col-span-2 noscript:hidden"
            />
            <input
              id={weightField(aim)}
              name={weightField(aim)}
              type="text"
              inputMode="decimal"
              value={texts[aim]}
              onChange={(event) => set(aim, event.target.value)}
              aria-describedby={problem ? 'weights-error' : undefined}
              aria-invalid={problem ? true : undefined}
              className="min-h-11 w-20 rounded-card border border-edge bg-sheet px-3 text-right tabular-nums aria-invalid:border-stop"
            />
            <span className="text-right text-note text-soft tabular-nums max-sm:order-4 max-sm:col-span-2 noscript:hidden">
              {sum > 0 ? `${formatNumber((100 * (numbers[i] ?? 0)) / sum)} of 100` : '–'}
            </span>
          </div>
        ))}
      </div>
      <p className="text-note text-soft noscript:hidden">Together {formatExact(Number(sum.toFixed(2)))}.</p>
      <p role="status" className="text-note text-soft noscript:hidden">
        {pending ? 'Working it out …' : moved && !problem ? 'The ranking above follows your weights.' : ''}
      </p>
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" look="quiet">
          Use these weights
        </Button>
        {(byHand || moved) && (
          <Link
            href={query ? `${RESULT}?${query}` : RESULT}
            scroll={false}
            onClick={() => setMoved(false)}
            className="inline-flex min-h-11 items-center"
          >
            Back to my order of aims and my light
          </Link>
        )}
      </div>
    </form>
  )
}

/** Weights set by hand as they were typed; others as whole numbers of 100. */
function opening(weights: Record<Aim, number>, byHand: boolean): Record<Aim, string> {
  const text = (aim: Aim) => (byHand ? String(weights[aim]) : String(Math.round(100 * weights[aim])))
  return { clarity: text('clarity'), whiteness: text('whiteness'), tint: text('tint'), handling: text('handling') }
}
