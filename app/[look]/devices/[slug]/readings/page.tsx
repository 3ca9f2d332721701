import type { Metadata } from 'next'
import { type DeviceParams, requireDevice } from '../require-device'
import { readingsPath } from './paging'
import { ReadingsView } from './readings-view'

type Props = { params: Promise<DeviceParams> }

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { record } = await requireDevice((await params).slug)
  return {
    title: `Readings of ${record.name}`,
    description: `Every reading of the page and the ink of ${record.name}, with the session, the unit, the position, and why any does not count.`,
    alternates: { canonical: readingsPath(record.slug, 1) },
  }
}

export default async function ReadingsPage({ params }: Props) {
  return <ReadingsView dossier={await requireDevice((await params).slug)} page={1} />
}
