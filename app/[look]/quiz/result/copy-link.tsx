'use client'

import { Button } from '@/components/ui/button'
import { useCopying } from '@/components/use-copying'

/** Copies the address, which holds every answer. Where the browser refuses, the address is shown to be copied by hand. */
export function CopyLink() {
  const [outcome, copy] = useCopying()
  return (
    <div className="noscript:hidden">
      <Button look="lamp" onClick={() => copy(window.location.href)} className="w-full">
        Copy link
      </Button>
      <p role="status" className="mt-1 text-note text-soft">
        {outcome === 'copied' && 'Copied. Whoever opens it sees this result.'}
        {outcome === 'refused' && 'Your browser would not copy it; here it is to copy by hand:'}
      </p>
      {outcome === 'refused' && (
        <input
          readOnly
          aria-label="Address of this result"
          value={window.location.href}
          onFocus={(event) => event.target.select()}
          className="min-h-11 w-full rounded-card border border-edge bg-sheet px-2 text-small text-ink"
        />
      )}
    </div>
  )
}
