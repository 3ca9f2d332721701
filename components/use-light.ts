import { useSearchParams } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'
import { lightFrom } from '@/lib/lamp/levels'

const ADDRESS_DELAY_MS = 400

/**
 * The lamp's light, kept in the address a moment after it rests, so that it can be shared; and taken from there when
 * the address changes by a link or the back button.
 * @param hrefFor the address of the same page in another light
 * @param leaving true while another address is being fetched: nothing is written then, which would call that off
 */
export function useLight(
  opening: number,
  hrefFor: (lux: number) => string,
  leaving = false,
): [number, (lux: number) => void] {
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
    if (leaving || lux === inAddress) return
    const write = () => {
      stop()
      written.current = lux
      window.history.replaceState(null, '', hrefFor(lux))
    }
    const later = setTimeout(write, ADDRESS_DELAY_MS)
    // A link or a form leaves by an address of its own: what waits is written before, so that Back finds it.
    const writeFirst = ({ target }: Event) => {
      if (target instanceof Element && target.closest('a, form')) write()
    }
    const stop = () => {
      clearTimeout(later)
      document.removeEventListener('click', writeFirst, true)
      document.removeEventListener('submit', writeFirst, true)
    }
    document.addEventListener('click', writeFirst, true)
    document.addEventListener('submit', writeFirst, true)
    return stop
  }, [lux, inAddress, hrefFor, leaving])

  return [lux, setLux]
}

/** The one value of a parameter, as the server takes it: given twice it is not understood. */
function only(values: string[]): string | undefined {
  return values.length === 1 ? values[0] : undefined
}
