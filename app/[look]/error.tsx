'use client'

import { useEffect } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'

/** What a reader sees when a page could not be made: what happened, and what to do. */
export default function PageError({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  useEffect(() => {
    console.error(error)
  }, [error])
  return (
    <main className="measure py-16">
      <h1>This page could not be made just now</h1>
      <p className="mt-4 max-w-prose text-lead text-soft">
        Something on our side did not answer in time. It is most likely over in a minute, and your answers are still in
        the address of this page.
      </p>
      <div className="mt-8 flex flex-wrap gap-3">
        <Button onClick={retry}>Try again</Button>
        <ButtonLink href="/" look="quiet">
          Go to the start
        </ButtonLink>
      </div>
      <noscript>
        <p className="mt-6">Reload this page to try again.</p>
      </noscript>
      {error.digest && <p className="mt-8 text-note text-soft">If you write to us about it: {error.digest}</p>}
    </main>
  )
}
