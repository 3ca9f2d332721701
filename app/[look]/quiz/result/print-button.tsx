'use client'

import { Button } from '@/components/ui/button'

export function PrintButton() {
  return (
    <Button look="quiet" onClick={() => window.print()} className="noscript:hidden">
      Print on one page
    </Button>
  )
}
