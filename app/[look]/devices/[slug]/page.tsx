import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { cache } from 'react'
import { Booth } from '@/components/booth'
import { WhiteMap } from '@/components/charts/white-map'
import { Notice } from '@/components/ui/notice'
import { type DeviceRecord, findDeviceBySlug } from '@/db/queries/devices'
import { lightnessToY } from '@/lib/colour/lab'
import { publishedFigures } from '@/lib/findings/published'
import { standingBy } from '@/lib/findings/standing'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'
import { read } from '@/lib/server/db'
import { latestEdition } from '@/lib/server/editions'
import { DECIMALS } from '../figure'
import { BigFigures } from './big-figures'
import { Corrections } from './corrections'
import { Facts } from './facts'
import { Breadcrumb, Heading, inOneLine } from './heading'
import { HowWeKnow } from './how-we-know'
import { InYourLight } from './in-your-light'
import { Readings } from './readings'

type Props = { params: Promise<{ slug: string }> }

const SLUG = /^[a-z0-9]+(-[a-z0-9]+)*$/
const LONGEST_SLUG = 100

/** What is kept of the device and its place in the newest edition; leaves with 404 where there is no such device. */
const requireDevice = cache(async (params: Props['params']) => {
  const { slug } = await params
  // An address may hold what the database cannot: it is asked for nothing but slugs.
  if (slug.length > LONGEST_SLUG || !SLUG.test(slug)) notFound()
  const [record, edition] = await Promise.all([read((db) => findDeviceBySlug(db, slug)), latestEdition()])
  if (!record) notFound()
  return { record, edition, device: edition?.devices.find((one) => one.slug === slug) ?? null }
})

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { record, edition, device } = await requireDevice(params)
  if (!edition || !device) return { title: record.name }
  const { lightness } = publishedFigures(edition, device)
  return {
    title: record.name,
    description: `${inOneLine(device)} Its page as measured: L* ${formatNumber(lightness.value, DECIMALS.lightness)} ${formatDoubt(lightness.doubt, DECIMALS.lightness)}, edition ${edition.number}, with every reading it rests on.`,
  }
}

export default async function DevicePage({ params }: Props) {
  const { record, edition, device } = await requireDevice(params)
  if (!edition || !device) {
    return (
      <main className="measure py-10">
        <Breadcrumb maker={record.maker} />
        <h1 className="mt-4">{record.name}</h1>
        <Notice className="mt-6 max-w-[60ch]">
          No figures of this device have been released yet. They will be here with the next edition.
        </Notice>
      </main>
    )
  }
  const figures = publishedFigures(edition, device)
  const { paper } = edition.control
  return (
    <main className="measure py-10">
      <Breadcrumb maker={record.maker} />
      <div className="mt-4 grid gap-x-12 gap-y-8 lg:grid-cols-[23.75rem_minmax(0,1fr)]">
        <Booth
          className="order-2 lg:order-none"
          sheets={[{ name: device.name, page: device.page, ink: device.ink }]}
          paper={paper}
        />
        <div className="grid content-start gap-8">
          <Heading device={device} pricedOn={pricedOn(record, device)} />
          <BigFigures figures={figures} standing={standingBy(edition, device, ({ page }) => page.L)} />
          {record.note && <p className="max-w-[68ch] text-lead">{record.note}</p>}
        </div>
      </div>
      <div className="mt-14 grid gap-x-10 gap-y-10 lg:grid-cols-[minmax(0,1.8fr)_minmax(0,1fr)]">
        <section aria-labelledby="map" className="card min-w-0 p-5">
          <h2 id="map" className="text-h3">
            Where its page sits among the whites
          </h2>
          <div className="mt-3">
            <WhiteMap
              rows={edition.devices.map(({ slug, name, page }) => ({ slug, name, page, u: page.u }))}
              paper={paper}
              highlight={device.slug}
            />
          </div>
        </section>
        <HowWeKnow record={record} device={device} edition={edition} />
      </div>
      <InYourLight device={device} figures={figures} yPaper={lightnessToY(paper.L)} />
      <Facts record={record} device={device} />
      <Corrections corrections={record.corrections} />
      <Readings record={record} device={device} />
    </main>
  )
}

/** The day the edition's price was seen; a newer one may stand in the table of prices. */
function pricedOn({ prices }: DeviceRecord, { price }: EditionDevice): string | null {
  const seen = prices.find(({ amountMinor, currency }) => amountMinor === price?.amount && currency === price?.currency)
  return seen?.seenOn ?? null
}
