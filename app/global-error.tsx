'use client'

import { fontVariables } from './fonts'
import './globals.css'

/** The last resort, when even the frame around a page could not be made: it can count on nothing but the style sheet. */
export default function GlobalError({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <html lang="en-GB" className={fontVariables}>
      <head>
        <title>Something went wrong · Lampleaf</title>
      </head>
      <body>
        <main className="measure py-16">
          <h1>Lampleaf could not be shown just now</h1>
          <p className="mt-4 max-w-prose text-lead text-soft">
            Something on our side went wrong. Please try again in a minute; nothing you entered is lost.
          </p>
          <button
            type="button"
            onClick={retry}
            className="mt-8 min-h-11 cursor-pointer rounded-card bg-shade px-4.5 font-semibold text-on-shade"
          >
            Try again
          </button>
          {error.digest && <p className="mt-8 text-note text-soft">If you write to us about it: {error.digest}</p>}
        </main>
      </body>
    </html>
  )
}
