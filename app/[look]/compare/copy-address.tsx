'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'

/** Copies an address that stands in a field beside it, from where it can also be copied by hand. */
export function CopyAddress({ address }: { address: string }) {
  const [outcome, setOutcome] = useState<'copied' | 'refused' | null>(null)

  async function copy() {
    try {
      await navigator.clipboard.writeText(address)
      setOutcome('copied')
    } catch {
      setOutcome('refused')
    }
  }

  return (
    <div className="noscript:hidden">
      <Button look="quiet" onClick={copy}>
        Copy link
      </Button>
      <p role="status" className="text-note text-soft">
        {outcome === 'copied' && 'Copied.'}
        {outcome === 'refused' && 'Your browser would not copy it; it can be copied from the field.'}
      </p>
    </div>
  )
}
