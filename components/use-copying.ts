import { useState } from 'react'

/** Copies a text when asked to; says how it went, null while nobody has asked. */
export function useCopying(): [outcome: 'copied' | 'refused' | null, copy: (text: string) => Promise<void>] {
  const [outcome, setOutcome] = useState<'copied' | 'refused' | null>(null)
  async function copy(text: string) {
    try {
      await navigator.clipboard.writeText(text)
      setOutcome('copied')
    } catch {
      setOutcome('refused')
    }
  }
  return [outcome, copy]
}
