import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { Notice } from '@/components/ui/notice'
import { chooseDevices, compareHref, inFindableOrder, readCompared } from '@/lib/compare/address'
import { formatList } from '@/lib/format/list'
import { latestEdition } from '@/lib/server/editions'
import { type LookParams, requireLook } from '@/lib/server/look'
import { Comparison } from './comparison'
import { DevicesForm } from './devices-form'
import { ChoiceNotices } from './notices'

type Props = { params: Promise<LookParams>; searchParams: Promise<Record<string, string | string[] | undefined>> }

const DESCRIPTION =
  'Two to four pages of electronic-paper reading devices side by side: how far their colours differ, in words and with the doubt, their contrast in your light, and what else sets the devices apart.'

export async function generateMetadata({ searchParams }: Pick<Props, 'searchParams'>): Promise<Metadata> {
  const given = (await searchParams).with
  const edition = await latestEdition()
  const { chosen } = chooseDevices(edition?.devices ?? [], readCompared(given))
  if (chosen.length < 2) {
    const bare = given === undefined
    return {
      title: 'Compare devices',
      description: DESCRIPTION,
      alternates: { canonical: '/compare' },
      robots: { index: bare, follow: true },
    }
  }
  const slugs = inFindableOrder(chosen.map(({ slug }) => slug))
  return {
    title: `${formatList(chosen.map(({ name }) => name))} compared`,
    description: DESCRIPTION,
    alternates: { canonical: compareHref(slugs) },
    // The same devices in another order, or with names nobody knows, are the same comparison.
    robots: { index: given === slugs.join(','), follow: true },
  }
}

export default async function ComparePage({ params, searchParams }: Props) {
  const look = await requireLook(params)
  const given = (await searchParams).with
  const named = readCompared(given)
  // A form names each device by itself, and its blanks too; the address one shares is the short one.
  if (Array.isArray(given) || given === '') redirect(compareHref(named))

  const edition = await latestEdition()
  const choice = chooseDevices(edition?.devices ?? [], named)
  const { chosen } = choice
  return (
    <main className="measure py-12">
      <h1>{chosen.length < 2 ? 'Compare devices' : formatList(chosen.map(({ name }) => name))}</h1>
      {edition ? (
        <>
          <ChoiceNotices choice={choice} edition={edition.number} />
          {chosen.length >= 2 && <Comparison edition={edition} devices={chosen} units={look.units} />}
          <DevicesForm devices={edition.devices} chosen={chosen} />
        </>
      ) : (
        <Notice className="mt-6 max-w-[60ch]">
          No edition has been released yet, so there are no pages to compare.
        </Notice>
      )}
    </main>
  )
}
