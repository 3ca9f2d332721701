import useSWR from 'swr'
import type { Edition } from '@/lib/method/types'

async function fetchEdition(address: string): Promise<Edition> {
  const answer = await fetch(address)
  if (!answer.ok) throw new Error(`${address} answered ${answer.status}`)
  return answer.json()
}

/** The newest edition, fetched once: a released edition never changes. */
export function useEdition(): { edition: Edition | undefined; failed: boolean } {
  const { data, error } = useSWR('/api/v1/editions/latest', fetchEdition, {
    revalidateIfStale: false,
    revalidateOnFocus: false,
    revalidateOnReconnect: false,
    errorRetryCount: 3,
  })
  return { edition: data, failed: error !== undefined && data === undefined }
}
