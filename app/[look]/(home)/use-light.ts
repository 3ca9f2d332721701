import { useSearchParams } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'
import { lightFrom } from '@/lib/lamp/levels'

const ADDRESS_DELAY_MS = 400

/**
 * The lamp's light, kept in the address a moment after it rests, so that it can be shared; and taken from there when
 * the address changes by a link or the back button.
 */
export function useLight(opening: number): [number, (lux: number) => void] {
  const params = useSearchParams()
  const inAddress = lightFrom({ lux: only(params.getAll('lux')), step: only(params.getAll('step')) })
  const [lux, setLux] = useState(opening)
  const written = useRef(opening)

  useEffect(() => {
    // What we wrote ourselves comes back late, and must not undo a movement made since.
    if (inAddress !== written.current) setLux(inAddress)
    written.current = inAddress
  }, [inAddress])

  useEffect(() => {
    if (lux === inAddress) return
    const later = setTimeout(() => {
      written.current = lux
      window.history.replaceState(null, '', `?lux=${lux}`)
    }, ADDRESS_DELAY_MS)
    return () => clearTimeout(later)
  }, [lux, inAddress])

  return [lux, setLux]
}

/** The one value of a parameter, as the server takes it: given twice it is not understood. */
function only(values: string[]): string | undefined {
  return values.length === 1 ? values[0] : undefined
}
