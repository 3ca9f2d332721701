'use client'

import { type FormEvent, type ReactNode, useCallback, useEffect, useRef, useState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { formatNumber } from '@/lib/format/number'
import type { Bench, Workings } from '@/lib/workings/workings'
import { ExampleFields } from './example-fields'
import { hasExample, type Problem, queryOf, type Texts, textsFrom } from './fields'

type Live = typeof import('./live')
const loadLive = (): Promise<Live> => import('./live')

const SETTLE_MS = 300
const TRY = '/method/try'

/**
 * The worked example's form. With JavaScript it answers while one types and keeps what is typed in the address; without
 * it the form is sent to a page that shows the same.
 * @param short @param workings what the opening texts give, made by the server
 * @param ownAddress whether the server has already read the address: then it is not read again
 */
export function LiveExample({
  opening,
  problems: openingProblems,
  bench,
  short,
  workings,
  ownAddress,
}: {
  opening: Texts
  problems: readonly Problem[]
  bench: Bench | null
  short: ReactNode
  workings: ReactNode
  ownAddress: boolean
}) {
  const form = useRef<HTMLFormElement>(null)
  const heading = useRef<HTMLHeadingElement>(null)
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)
  const latest = useRef(0)
  const [filled, setFilled] = useState({ texts: opening, version: 0 })
  const [query, setQuery] = useState(() => queryOf(opening))
  const [problems, setProblems] = useState(openingProblems)
  const [summary, setSummary] = useState(openingProblems)
  const [answer, setAnswer] = useState<{ worked: Workings; live: Live } | null>(null)
  const [said, setSaid] = useState('')

  const follow = useCallback(
    async (texts: Texts, sent: boolean) => {
      latest.current += 1
      const turn = latest.current
      const live = await loadLive()
      // What was typed since is worked out by a later turn.
      if (turn !== latest.current) return
      const { example, problems: found } = live.parseExample(texts)
      setProblems(found)
      if (sent || found.length === 0) setSummary(found)
      if (!example) {
        setSaid('Something is not understood. The figures are still those from before.')
        return
      }
      const worked = live.workOut(example, bench)
      setAnswer({ worked, live })
      setSaid(wordsOf(worked))
      const now = queryOf(texts)
      setQuery(now)
      window.history.replaceState(null, '', `?${now}${window.location.hash}`)
      if (sent) heading.current?.focus()
    },
    [bench],
  )

  useEffect(() => {
    const search = new URLSearchParams(window.location.search)
    if (ownAddress || !hasExample(search)) return
    const texts = textsFrom(search, opening)
    setFilled(({ version }) => ({ texts, version: version + 1 }))
    follow(texts, false).catch(() => setSaid('Press the button to work it out.'))
  }, [ownAddress, opening, follow])
  useEffect(() => () => clearTimeout(timer.current), [])

  function typed() {
    clearTimeout(timer.current)
    timer.current = setTimeout(() => {
      follow(textsIn(form.current, opening), false).catch(() => setSaid('Press the button to work it out.'))
    }, SETTLE_MS)
  }
  function send(event: FormEvent) {
    event.preventDefault()
    clearTimeout(timer.current)
    // Where the script does not come, the server works it out.
    follow(textsIn(form.current, opening), true).catch(() => form.current?.submit())
  }

  const Short = answer?.live.ShortView
  const Steps = answer?.live.WorkingsView
  return (
    <>
      <div className="mt-6 grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,1fr)_21rem]">
        <form
          ref={form}
          action={TRY}
          autoComplete="off"
          noValidate
          aria-label="Worked example"
          onInput={typed}
          onSubmit={send}
          className="group/example grid content-start gap-6"
        >
          <ErrorSummary errors={summary} />
          <div key={filled.version} className="contents">
            <ExampleFields texts={filled.texts} problems={problems} />
          </div>
          <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
            <Button type="submit">Work it out</Button>
            <a href={`${TRY}?${query}`} className="inline-flex min-h-11 items-center">
              Address of this example
            </a>
          </div>
        </form>
        <section aria-labelledby="example-short" className="content-start lg:sticky lg:top-6 lg:self-start">
          <h3 ref={heading} id="example-short" tabIndex={-1} className="mb-3 border-t-2 border-ink pt-3">
            In short
          </h3>
          {answer && Short ? <Short workings={answer.worked} /> : short}
          <p role="status" className="mt-3 text-note text-soft noscript:hidden">
            {said}
          </p>
        </section>
      </div>
      <div className="mt-10">{answer && Steps ? <Steps workings={answer.worked} /> : workings}</div>
    </>
  )
}

function textsIn(form: HTMLFormElement | null, opening: Texts): Texts {
  if (!form) return opening
  const data = new FormData(form)
  const search = {
    get: (name: string) => {
      const value = data.get(name)
      return typeof value === 'string' ? value : null
    },
  }
  return textsFrom(search, opening)
}

/** What a screen reader is told after a change. */
function wordsOf({ page, figures, seen }: Workings): string {
  return `Worked out: L* ${formatNumber(page.L, 1)}, whiteness ${formatNumber(figures.whiteness, 1)}, tint ${formatNumber(figures.tint, 1)}, contrast ${formatNumber(figures.contrast, 1)} to 1, reserve ${formatNumber(seen.reserve, 1)} times.`
}
