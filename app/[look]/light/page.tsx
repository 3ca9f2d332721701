import type { Metadata } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { Notice } from '@/components/ui/notice'
import { readLight } from '@/lib/light/address'
import { type LightChoice, lightHref } from '@/lib/light/choice'
import { rankInLight } from '@/lib/light/ranking'
import type { Edition } from '@/lib/method/types'
import { pairsFrom } from '@/lib/quiz/address'
import { latestEdition } from '@/lib/server/editions'
import { type LookParams, requireLook } from '@/lib/server/look'
import { editionSpectra } from '@/lib/server/spectra'
import { ColoursUnderLamp } from './colours-under-lamp'
import { LightRoom } from './light-room'
import { litPage } from './lit-page'

export const metadata: Metadata = {
  title: 'In your light',
  description:
    'Every page we measured in the light you set: its colour under that lamp, its luminance and the contrast it keeps, each with its doubt.',
  alternates: { canonical: '/light' },
}

/** Rows of a numbered page in the paper theme: about one display of an electronic-paper device. */
const PER_PAGE = 8

type Search = Record<string, string | string[] | undefined>
type Props = { params: Promise<LookParams>; searchParams: Promise<Search> }

export default async function LightPage({ params, searchParams }: Props) {
  const [search, { theme }] = await Promise.all([searchParams, requireLook(params)])
  const edition = await latestEdition()
  if (!edition || edition.devices.length === 0) return <NothingYet />
  const { choice, notes } = readLight(
    search,
    edition.devices.map(({ slug }) => slug),
  )
  if (notes.length === 0 && !isWrittenAs(lightHref(choice), pairsFrom(search))) redirect(lightHref(choice))

  const spectra = await editionSpectra(edition.number)
  const devices = devicesIn(edition, choice)
  const { uncertainty, control } = edition
  return (
    <main>
      {notes.length > 0 && <NotUnderstood notes={notes} choice={choice} />}
      <LightRoom
        opening={choice}
        edition={{
          uncertainty,
          control,
          devices: devices.map((device) => litPage(device, edition, choice.lamp, spectra.get(device.slug))),
        }}
        everyDevice={edition.devices.map(({ slug, name }) => ({ slug, name })).sort(byName)}
        perPage={theme === 'paper' ? PER_PAGE : null}
      />
      <ColoursUnderLamp
        lamp={choice.lamp}
        devices={devices}
        shown={theme === 'paper' ? onPage(edition, devices, choice) : devices}
        edition={edition}
        spectra={spectra}
      />
    </main>
  )
}

function devicesIn({ devices }: Edition, { chosen }: LightChoice) {
  return chosen.length === 0 ? devices : devices.filter(({ slug }) => chosen.includes(slug))
}

/** The devices of one numbered page, in the order of this light. */
function onPage(edition: Edition, devices: Edition['devices'], choice: LightChoice) {
  const pages = Math.max(1, Math.ceil(devices.length / PER_PAGE))
  const at = Math.min(choice.page, pages)
  return rankInLight({ ...edition, devices }, choice)
    .map(({ device }) => device)
    .slice((at - 1) * PER_PAGE, at * PER_PAGE)
}

const byName = (one: { name: string }, other: { name: string }) => one.name.localeCompare(other.name, 'en-GB')

function isWrittenAs(href: string, pairs: [string, string][]): boolean {
  return JSON.stringify(pairs) === JSON.stringify([...new URLSearchParams(href.split('?')[1] ?? '')])
}

function NotUnderstood({ notes, choice }: { notes: readonly string[]; choice: LightChoice }) {
  return (
    <div className="measure py-4">
      <Notice look="warning">
        <p>Some of this address was not understood, and the rest is shown:</p>
        <ul className="list-disc pl-5">
          {notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
        <p>
          <Link prefetch={false} href={lightHref(choice)}>
            What is shown, as an address of its own
          </Link>
        </p>
      </Notice>
    </div>
  )
}

function NothingYet() {
  return (
    <main className="measure py-12">
      <h1>In your light</h1>
      <Notice className="mt-6 max-w-[60ch]">
        No edition has been released yet, so there are no pages to show. The bench is at work;{' '}
        <Link href="/method">how we will judge the pages</Link> is already there to read.
      </Notice>
    </main>
  )
}
