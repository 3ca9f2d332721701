import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

export const metadata: Metadata = { title: 'Not found' }

export const dynamic = 'force-static'

/** Every address without a page is answered from here, so that one stored answer serves them all. */
export default function NotHere() {
  notFound()
}
