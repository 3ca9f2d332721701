import { Catalogue, catalogueMetadata } from './catalogue'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata = catalogueMetadata

export default function DevicesPage() {
  return <Catalogue search={{}} />
}
