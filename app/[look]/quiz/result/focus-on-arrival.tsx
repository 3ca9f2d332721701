'use client'

import { type ReactNode, useEffect, useRef } from 'react'

/** A message that takes the focus as the page opens, so that it is read out first. */
export function FocusOnArrival({ className, children }: { className: string; children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [])
  return (
    <div ref={box} role="alert" tabIndex={-1} className={className}>
      {children}
    </div>
  )
}
