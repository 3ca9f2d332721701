import type { Metadata } from 'next'
import { type LookParams, requireLook } from '@/lib/server/look'
import { requireLaterPage } from '@/lib/server/path-page'
import { ChangedDevices, changedApartFromCorrected, changedHref } from '../../changed-devices'
import { requireChangelog } from '../../changelog'
import { LaterHeading } from '../../later-heading'

type Props = { params: Promise<LookParams & { number: string; page: string }> }

export const dynamic = 'force-static'
export const revalidate = 60

async function requirePage(params: Props['params']) {
  const { number, page } = await params
  const changelog = await requireChangelog(number)
  return { changelog, page: requireLaterPage(page, changedApartFromCorrected(changelog).length) }
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { changelog, page } = await requirePage(params)
  const { number } = changelog.edition
  return {
    title: `Edition ${number}, changed devices, page ${page}`,
    description: `Devices of which a figure or a fact changed in edition ${number}, page ${page}.`,
    alternates: { canonical: changedHref(number, page) },
  }
}

export default async function LaterChangesPage({ params }: Props) {
  const { changelog, page } = await requirePage(params)
  const { units } = await requireLook(params)
  return (
    <main className="measure py-12">
      <LaterHeading changelog={changelog} />
      <ChangedDevices changelog={changelog} units={units} page={page} />
    </main>
  )
}
