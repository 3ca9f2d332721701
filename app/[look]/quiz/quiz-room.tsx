'use client'

import { useSearchParams } from 'next/navigation'
import { useMemo, useState } from 'react'
import * as z from 'zod/mini'
import { type Address, readAddress } from '@/lib/quiz/address'
import { quizHref, stepIn, targetIn } from '@/lib/quiz/moves'
import { type ShortlistView, shortlistOf } from '@/lib/quiz/shortlist'
import { EstimateView } from './estimate-view'
import { ShortlistPanel } from './shortlist-panel'
import { SoFarBar } from './so-far-bar'
import { StepForm } from './step-form'
import { useDraws } from './use-draws'
import { useEdition } from './use-edition'
import { useOwnAddress } from './use-own-address'
import { useSilentReferrer } from './use-silent-referrer'

// A content policy without eval would report zod's probe for it.
z.config({ jitless: true })

/**
 * The quiz: a step's form and the shortlist beside it. The answers are in the address and nowhere else; a form is read
 * as a whole when it changes, by the code that reads the address. Without JavaScript the same form is sent to the page.
 * @param initial the shortlist for this address, worked out by the server
 * @param formats file formats that devices of the edition open
 */
export function QuizRoom({ initial, formats }: { initial: ShortlistView; formats: readonly string[] }) {
  useSilentReferrer()
  const search = useSearchParams()
  const step = stepIn(search.get('step'))
  const estimate = targetIn(search.get('estimate'))
  const { visit, go, keep, flush, again } = useOwnAddress(search.toString())

  const inAddress = useMemo(() => readAddress(search), [search])
  const [live, setLive] = useState<{ visit: number; address: Address } | null>(null)
  const address = live?.visit === visit ? live.address : inAddress
  const { edition, failed } = useEdition()
  const view = useMemo(() => (edition ? shortlistOf(edition, address.answers) : initial), [edition, address, initial])
  const draws = useDraws(edition, address.answers, view.rows.length > 1)

  return (
    <main className="flex flex-col lg:grid lg:grid-cols-[minmax(0,1fr)_calc(24.5rem+max(0px,(100vw-80rem)/2))]">
      <div className="min-w-0 bg-sheet px-[clamp(1rem,4vw,1.75rem)] pt-8 lg:pt-10 lg:pr-12 lg:pl-[max(1.75rem,calc((100vw-73.75rem)/2+1.75rem))]">
        {estimate ? (
          <EstimateView key={visit} target={estimate} address={inAddress} search={search} go={go} />
        ) : (
          <StepForm
            key={visit}
            step={step}
            address={address}
            formats={formats}
            view={view}
            arrival={visit === 0 ? 'opened' : live?.visit === visit ? 'again' : 'moved'}
            onChange={(changed) => {
              setLive({ visit, address: changed })
              keep(step, changed)
            }}
            onLeave={flush}
            onMove={(href, now) => {
              if (href !== quizHref(step, now)) return go(href)
              setLive({ visit: visit + 1, address: now })
              again()
            }}
          />
        )}
      </div>
      <SoFarBar view={view} draws={draws} />
      <ShortlistPanel view={view} draws={draws} address={address} stale={failed} />
    </main>
  )
}
