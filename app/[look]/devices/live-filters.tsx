'use client'

import { useRouter } from 'next/navigation'
import { useEffect } from 'react'

/** The control one was at when the list last changed: the form is made anew with it, and one stays where one was. */
let at: string | null = null

/** Shows the list as soon as a choice changes, without leaving the page; without it the form's button does the same. */
export function LiveFilters({ form }: { form: string }) {
  const router = useRouter()
  useEffect(() => {
    const element = document.getElementById(form)
    if (!(element instanceof HTMLFormElement)) return
    const before = at && document.getElementById(at)
    at = null
    if (before) {
      const closed = before.closest('details')
      if (closed) closed.open = true
      before.focus({ preventScroll: true })
    }

    function show(from: Element | null) {
      const asked = new URLSearchParams()
      for (const [name, value] of new FormData(element as HTMLFormElement)) {
        if (value !== '') asked.append(name, String(value))
      }
      at = from?.id || null
      router.push(asked.size > 0 ? `/devices?${asked}` : '/devices', { scroll: false })
    }
    function onChange({ target }: Event) {
      // A text is finished when it is sent, not when one leaves it.
      const chosen = target instanceof HTMLInputElement && target.type === 'checkbox'
      if (chosen || target instanceof HTMLSelectElement) show(target)
    }
    function onSubmit(event: SubmitEvent) {
      event.preventDefault()
      show(document.activeElement)
    }
    element.addEventListener('change', onChange)
    element.addEventListener('submit', onSubmit)
    return () => {
      element.removeEventListener('change', onChange)
      element.removeEventListener('submit', onSubmit)
    }
  }, [form, router])
  return null
}
