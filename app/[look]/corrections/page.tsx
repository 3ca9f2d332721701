import type { Metadata } from 'next'
import { countCorrections } from '@/db/queries/corrections'
import { read } from '@/lib/server/db'
import { Corrections, correctionsMetadata } from './corrections'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = { ...correctionsMetadata, alternates: { canonical: '/corrections' } }

export default async function CorrectionsPage() {
  return <Corrections page={1} total={await read(countCorrections)} />
}
