'use client'

import { useEffect, useRef } from 'react'

/**
 * Tells a form where the reader is when it is sent. Without JavaScript the field stays empty and the form's handler
 * goes by the Referer.
 */
export function WayBack() {
  const field = useRef<HTMLInputElement>(null)
  useEffect(() => {
    const form = field.current?.form
    const note = () => {
      if (field.current) field.current.value = window.location.pathname + window.location.search
    }
    form?.addEventListener('submit', note)
    return () => form?.removeEventListener('submit', note)
  }, [])
  return <input ref={field} type="hidden" name="back" defaultValue="" />
}
