import { type LookParams, requireLook } from '@/lib/server/look'
import { Catalogue, catalogueMetadata } from './catalogue'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata = catalogueMetadata

export default async function DevicesPage({ params }: { params: Promise<LookParams> }) {
  return <Catalogue look={await requireLook(params)} pairs={[]} />
}
