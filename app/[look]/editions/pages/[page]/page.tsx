import type { Metadata } from 'next'
import { cache } from 'react'
import { countEditions } from '@/db/queries/editions'
import { read } from '@/lib/server/db'
import { requireLaterPage } from '@/lib/server/path-page'
import { Editions, editionsMetadata, pathOf } from '../../editions'

type Props = { params: Promise<{ page: string }> }

const requirePage = cache(async (params: Props['params']) => {
  const [{ page }, total] = await Promise.all([params, read(countEditions)])
  return { page: requireLaterPage(page, total), total }
})

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { page } = await requirePage(params)
  return { ...editionsMetadata, title: `Editions, page ${page}`, alternates: { canonical: pathOf(page) } }
}

export default async function LaterEditionsPage({ params }: Props) {
  return <Editions {...(await requirePage(params))} />
}
