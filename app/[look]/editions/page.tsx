import type { Metadata } from 'next'
import { countEditions } from '@/db/queries/editions'
import { read } from '@/lib/server/db'
import { Editions, editionsMetadata } from './editions'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = { ...editionsMetadata, alternates: { canonical: '/editions' } }

export default async function EditionsPage() {
  return <Editions page={1} total={await read(countEditions)} />
}
