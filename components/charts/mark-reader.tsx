'use client'

import { type KeyboardEvent, type ReactNode, useEffect, useRef, useState } from 'react'

/**
 * Around a chart's marks (`data-mark`, each with its value as `aria-label`): says the value of the one pointed at or
 * focused in a line below, and lets the arrow keys walk from one to the next, so that a chart is one stop of the Tab
 * key. Without JavaScript every mark is a stop and has its value as a tooltip.
 */
export function MarkReader({ hint, children }: { hint: string; children: ReactNode }) {
  const root = useRef<HTMLDivElement>(null)
  const [reading, setReading] = useState('')

  useEffect(() => {
    for (const drawing of root.current?.querySelectorAll('[data-drawing]') ?? []) {
      marksIn(drawing).forEach((mark, i) => {
        mark.setAttribute('tabindex', i === 0 ? '0' : '-1')
      })
    }
    setReading(hint)
  }, [hint])

  function read(target: EventTarget) {
    const label = (target as Element).closest('[data-mark]')?.getAttribute('aria-label')
    if (label) setReading(label)
  }

  function walk(event: KeyboardEvent) {
    const mark = (event.target as Element).closest<SVGElement>('[data-mark]')
    const drawing = mark?.closest('[data-drawing]')
    if (!mark || !drawing) return
    const marks = marksIn(drawing)
    const to = destination(event.key, marks.indexOf(mark), marks.length)
    const next = to === null ? undefined : marks[to]
    if (!next) return
    event.preventDefault()
    mark.setAttribute('tabindex', '-1')
    next.setAttribute('tabindex', '0')
    next.focus()
  }

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the marks inside are what has the focus and the pointer
    <div
      ref={root}
      onFocus={(event) => read(event.target)}
      onMouseOver={(event) => read(event.target)}
      onKeyDown={walk}
    >
      {children}
      <p aria-hidden="true" className="mt-2 min-h-5 text-note text-soft print:hidden">
        {reading}
      </p>
    </div>
  )
}

function marksIn(drawing: Element): SVGElement[] {
  return [...drawing.querySelectorAll<SVGElement>('[data-mark]')]
}

/** Where a key leads among so many marks; null for keys that lead nowhere. */
function destination(key: string, from: number, count: number): number | null {
  if (key === 'ArrowRight' || key === 'ArrowDown') return Math.min(count - 1, from + 1)
  if (key === 'ArrowLeft' || key === 'ArrowUp') return Math.max(0, from - 1)
  if (key === 'Home') return 0
  if (key === 'End') return count - 1
  return null
}
