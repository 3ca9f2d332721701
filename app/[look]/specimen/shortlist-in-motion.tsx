'use client'

import { useState } from 'react'
import { Shortlist } from '@/components/shortlist'
import { Button } from '@/components/ui/button'

const ROWS = [
  { slug: 'a', name: 'Haldon Copybook 10', fit: 82, sd: 2.5, tied: true },
  { slug: 'b', name: 'Quayle Margin 10', fit: 80, sd: 2.5, tied: true },
  { slug: 'c', name: 'Ostler Plain 7', fit: 78, sd: null, tied: false },
]

/** The shortlist with a button that turns its order round. */
export function ShortlistInMotion() {
  const [turned, setTurned] = useState(false)
  return (
    <>
      <Shortlist rows={turned ? [...ROWS].reverse() : ROWS} />
      <Button look="quiet" className="mt-5" onClick={() => setTurned(!turned)}>
        Turn the order round
      </Button>
    </>
  )
}
