import { useRouter } from 'next/navigation'
import { useCallback, useEffect, useRef, useState } from 'react'
import type { Address } from '@/lib/quiz/address'
import type { Step } from '@/lib/quiz/answers'
import { quizHref, RESULT } from '@/lib/quiz/moves'

/** Between two changes of the address: browsers refuse more than about a hundred in ten seconds. */
const PAUSE_MS = 200

/**
 * The address as the place where the answers live. What is answered is kept in it at once, without a new entry of the
 * history; a step is a new entry. Nothing is sent for either; only the result is asked for.
 * @param query of the address now
 * @returns `visit` counts up whenever the address was changed by anything but `keep`: a step, Back, a link
 */
export function useOwnAddress(query: string) {
  const router = useRouter()
  const kept = useRef<string | null>(query)
  const pause = useRef<ReturnType<typeof setTimeout>>(undefined)
  const waiting = useRef<string | null>(null)
  const [seen, setSeen] = useState({ query, visit: 0 })
  let { visit } = seen
  if (query !== seen.query) {
    if (query !== kept.current) visit += 1
    setSeen({ query, visit })
  }

  /** Writes what waits, and lets the next change wait a little. */
  const flush = useCallback(() => {
    clearTimeout(pause.current)
    pause.current = undefined
    const href = waiting.current
    if (href === null) return
    waiting.current = null
    kept.current = new URLSearchParams(href.split('?')[1] ?? '').toString()
    window.history.replaceState(null, '', href)
    pause.current = setTimeout(flush, PAUSE_MS)
  }, [])

  const keep = useCallback(
    (step: Step, address: Address) => {
      waiting.current = quizHref(step, address)
      if (pause.current === undefined) flush()
    },
    [flush],
  )

  /** To another page of the quiz, or its result. What was answered so far is kept first, so that Back finds it. */
  const go = useCallback(
    (href: string) => {
      flush()
      kept.current = null
      if (href.startsWith(RESULT)) router.push(href)
      else window.history.pushState(null, '', href)
    },
    [flush, router],
  )

  useEffect(() => {
    // What waits belongs to the page one has left.
    const forget = () => {
      clearTimeout(pause.current)
      pause.current = undefined
      waiting.current = null
      kept.current = null
    }
    window.addEventListener('popstate', forget)
    return () => {
      window.removeEventListener('popstate', forget)
      forget()
    }
  }, [])

  /** The same page as if one came to it anew. */
  const again = useCallback(() => setSeen(({ query, visit }) => ({ query, visit: visit + 1 })), [])

  return { visit, go, keep, flush, again }
}
