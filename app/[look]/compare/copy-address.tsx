'use client'

import { Button } from '@/components/ui/button'
import { useCopying } from '@/components/use-copying'

/** Copies an address that stands in a field beside it, from where it can also be copied by hand. */
export function CopyAddress({ address }: { address: string }) {
  const [outcome, copy] = useCopying()
  return (
    <div className="noscript:hidden">
      <Button look="quiet" onClick={() => copy(address)}>
        Copy link
      </Button>
      <p role="status" className="text-note text-soft">
        {outcome === 'copied' && 'Copied.'}
        {outcome === 'refused' && 'Your browser would not copy it; it can be copied from the field.'}
      </p>
    </div>
  )
}
