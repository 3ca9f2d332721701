'use client'

import { useEffect, useRef } from 'react'

/** What is wrong with a form, each with the id of its field. Takes the focus when it appears or changes. */
export function ErrorSummary({
  errors,
  title = 'Please look at this again',
}: {
  errors: readonly { id: string; message: string }[]
  title?: string
}) {
  const box = useRef<HTMLDivElement>(null)
  const words = errors.map(({ id, message }) => `${id} ${message}`).join('\n')
  useEffect(() => {
    if (words) box.current?.focus()
  }, [words])

  if (errors.length === 0) return null
  return (
    <div ref={box} role="alert" tabIndex={-1} className="rounded-card border-2 border-stop bg-sheet p-4">
      <h2 className="text-h3">{title}</h2>
      <ul className="mt-2 list-disc pl-5">
        {errors.map(({ id, message }) => (
          <li key={id}>
            <a href={`#${id}`} className="text-stop">
              {message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  )
}
