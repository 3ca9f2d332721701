import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { catalogueHref, isWrittenAs, pairsFrom, readCatalogue } from '@/lib/catalogue/address'
import { type LookParams, requireLook } from '@/lib/server/look'
import { Catalogue, catalogueMetadata } from '../catalogue'

// One list in so many orders and cuts: the whole one is the page to find.
export const metadata: Metadata = { ...catalogueMetadata, robots: { index: false, follow: true } }

type Props = { params: Promise<LookParams>; searchParams: Promise<Record<string, string | string[] | undefined>> }

/** The catalogue where the address sorts, filters or searches it; next.config.ts sends such addresses here. */
export default async function FoundPage({ params, searchParams }: Props) {
  const look = await requireLook(params)
  const pairs = pairsFrom(await searchParams)
  const { query, problems, unknown } = readCatalogue(pairs)
  const canonical = catalogueHref(query)
  // A form sends its blank fields along; the address one shares is the short one.
  if (problems.length === 0 && unknown.length === 0 && !isWrittenAs(canonical, pairs)) redirect(canonical)
  return <Catalogue look={look} pairs={pairs} />
}
