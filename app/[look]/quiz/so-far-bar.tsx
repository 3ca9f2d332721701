'use client'

import { type MouseEvent, useEffect, useState } from 'react'
import { MARGIN_WORDS, marginOf } from '@/lib/quiz/lead'
import type { ShortlistView } from '@/lib/quiz/shortlist'
import type { DrawsAnswer } from './draws.worker'

/** Long enough that a screen reader is told of an outcome and not of every step of a slider. */
const ANNOUNCE_DELAY_MS = 900

/** Who leads, in a few words: a bar at the foot of a phone, and a status message everywhere. */
export function SoFarBar({ view, draws }: { view: ShortlistView; draws: DrawsAnswer | null }) {
  const words = leadWords(view, draws)
  const spoken = useSettled(`${words}. ${view.left} of ${view.of} devices are left.`)

  function show(event: MouseEvent) {
    const shortlist = document.getElementById('shortlist')
    if (!shortlist) return
    event.preventDefault()
    shortlist.scrollIntoView()
    shortlist.focus({ preventScroll: true })
  }

  return (
    <>
      <p role="status" className="sr-only">
        {spoken}
      </p>
      <div className="band so-far sticky bottom-0 z-10 flex min-h-18 items-center justify-between gap-3 border-t px-4 py-3 text-small lg:hidden print:hidden">
        <span>So far: {words}</span>
        {/* biome-ignore lint/a11y/useValidAnchor: it leads to the shortlist, without JavaScript too */}
        <a
          href="#shortlist"
          onClick={show}
          className="inline-flex min-h-11 shrink-0 items-center rounded-card border border-edge px-4.5 font-semibold no-underline"
        >
          Show
        </a>
      </div>
    </>
  )
}

function leadWords({ rows, unreadable, left }: ShortlistView, draws: DrawsAnswer | null): string {
  const [first] = rows
  if (left === 0) return 'no device meets all of your limits'
  if (!first) return unreadable.length > 0 ? 'nothing can be read in this light' : ''
  if (rows.length === 1) return `${first.name} is the only one left`
  const margin = draws ? MARGIN_WORDS[marginOf(draws)] : ''
  return `${first.name} leads${margin && ` ${margin}`}`
}

/** The words once they have not changed for a while; nothing before they change for the first time. */
function useSettled(words: string): string {
  const [opening] = useState(words)
  const [settled, setSettled] = useState('')
  useEffect(() => {
    if (words === opening && settled === '') return
    const timer = setTimeout(() => setSettled(words), ANNOUNCE_DELAY_MS)
    return () => clearTimeout(timer)
  }, [words, opening, settled])
  return settled
}
