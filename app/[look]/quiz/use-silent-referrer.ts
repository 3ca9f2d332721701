'use client'

import { useEffect } from 'react'

/**
 * While a reader answers, requests for scripts, icons and figures name this site and not the page they come from: the
 * address holds the answers, and nobody is sent those before the reader asks. Without JavaScript each step is sent
 * anyway, so the policy is set by script.
 */
export function useSilentReferrer(): void {
  useEffect(() => {
    const policy = document.createElement('meta')
    policy.name = 'referrer'
    policy.content = 'strict-origin'
    document.head.append(policy)
    return () => policy.remove()
  }, [])
}
