import { Catalogue, type CatalogueSearch, catalogueMetadata } from '../catalogue'

export const metadata = catalogueMetadata

/** The catalogue where the address sorts, filters or searches it; next.config.ts sends such addresses here. */
export default async function FoundPage({ searchParams }: { searchParams: Promise<CatalogueSearch> }) {
  return <Catalogue search={await searchParams} />
}
