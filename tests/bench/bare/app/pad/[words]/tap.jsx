'use client'
import { useState } from 'react'

export function Tap() {
  const [taps, setTaps] = useState(0)
  return (
    <button type="button" onClick={() => setTaps(taps + 1)}>
      Tapped {taps} times
    </button>
  )
}
