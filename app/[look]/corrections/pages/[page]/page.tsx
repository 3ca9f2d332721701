import type { Metadata } from 'next'
import { cache } from 'react'
import { countCorrections } from '@/db/queries/corrections'
import { read } from '@/lib/server/db'
import { requireLaterPage } from '@/lib/server/path-page'
import { Corrections, correctionsMetadata, pathOf } from '../../corrections'

type Props = { params: Promise<{ page: string }> }

const requirePage = cache(async (params: Props['params']) => {
  const [{ page }, total] = await Promise.all([params, read(countCorrections)])
  return { page: requireLaterPage(page, total), total }
})

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { page } = await requirePage(params)
  return {
    ...correctionsMetadata,
    title: `Corrections, page ${page}`,
    alternates: { canonical: pathOf(page) },
  }
}

export default async function LaterCorrectionsPage({ params }: Props) {
  return <Corrections {...(await requirePage(params))} />
}
