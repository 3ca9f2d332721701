import type { Metadata } from 'next'
import { requireLaterPage } from '@/lib/server/path-page'
import { requireChangelog } from '../../changelog'
import { LaterHeading } from '../../later-heading'
import { Moved, movedHref } from '../../moved'

type Props = { params: Promise<{ number: string; page: string }> }

export const dynamic = 'force-static'
export const revalidate = 60

async function requirePage(params: Props['params']) {
  const { number, page } = await params
  const changelog = await requireChangelog(number)
  return { changelog, page: requireLaterPage(page, changelog.moves.length) }
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { changelog, page } = await requirePage(params)
  const { number } = changelog.edition
  return {
    title: `Edition ${number}, who moved, page ${page}`,
    description: `Devices whose place in the default ranking changed in edition ${number}, and why, page ${page}.`,
    alternates: { canonical: movedHref(number, page) },
  }
}

export default async function LaterMovesPage({ params }: Props) {
  const { changelog, page } = await requirePage(params)
  return (
    <main className="measure py-12">
      <LaterHeading changelog={changelog} />
      <Moved changelog={changelog} page={page} />
    </main>
  )
}
