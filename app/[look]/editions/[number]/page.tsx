import type { Metadata } from 'next'
import { type LookParams, requireLook } from '@/lib/server/look'
import { openGraphFor } from '@/lib/server/page-metadata'
import { Added, Withdrawn } from './added'
import { ChangedDevices } from './changed-devices'
import { requireChangelog } from './changelog'
import { Cite } from './cite'
import { Corrected } from './corrected'
import { EditionHeading } from './heading'
import { Moved } from './moved'
import { Seal } from './seal'
import { Shared } from './shared'

type Props = { params: Promise<LookParams & { number: string }> }

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { edition, note } = await requireChangelog((await params).number)
  return {
    title: `Edition ${edition.number}`,
    description: `${note} What was added, changed, corrected and withdrawn, who moved in the ranking and why, and how to verify and cite it.`,
    alternates: { canonical: `/editions/${edition.number}` },
    openGraph: openGraphFor(`/editions/${edition.number}`, edition),
  }
}

export default async function EditionPage({ params }: Props) {
  const changelog = await requireChangelog((await params).number)
  const { units } = await requireLook(params)
  return (
    <main className="measure py-12">
      <EditionHeading changelog={changelog} />
      <div className="mt-12 grid grid-cols-[minmax(0,1fr)] gap-14">
        {changelog.changes ? (
          <>
            <Added changelog={changelog} />
            <Corrected changelog={changelog} />
            <ChangedDevices changelog={changelog} units={units} page={1} />
            <Withdrawn changelog={changelog} />
            <Moved changelog={changelog} page={1} />
            <Shared changelog={changelog} />
          </>
        ) : (
          <Added changelog={changelog} />
        )}
        <Seal edition={changelog.edition} />
        <Cite edition={changelog.edition} />
      </div>
    </main>
  )
}
