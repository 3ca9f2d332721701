import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { type DeviceParams, requireDevice } from '../../require-device'
import { PER_PAGE, pageNumber, readingsPath } from '../paging'
import { ReadingsView } from '../readings-view'

type Props = { params: Promise<DeviceParams & { page: string }> }

export const dynamic = 'force-static'
export const revalidate = 60

/** The device and the page asked for; leaves with 404 past the last one. */
async function requirePage(params: Props['params']) {
  const { slug, page: text } = await params
  const page = pageNumber(text)
  if (page === null) notFound()
  const dossier = await requireDevice(slug)
  const readings = dossier.record.sets.reduce((count, set) => count + set.readings.length, 0)
  if ((page - 1) * PER_PAGE >= readings) notFound()
  return { dossier, page }
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const {
    dossier: { record },
    page,
  } = await requirePage(params)
  return {
    title: `Readings of ${record.name}, page ${page}`,
    description: `Readings of the page and the ink of ${record.name}, page ${page}, with why any does not count.`,
    alternates: { canonical: readingsPath(record.slug, page) },
  }
}

export default async function ReadingsPage({ params }: Props) {
  return <ReadingsView {...(await requirePage(params))} />
}
