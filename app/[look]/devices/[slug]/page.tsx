import type { Metadata } from 'next'
import { Booth } from '@/components/booth'
import { WhiteMap } from '@/components/charts/white-map'
import { JsonLd } from '@/components/json-ld'
import { listTileReadings, listWhiteCalibrations } from '@/db/queries/session-state'
import type { Work } from '@/lib/cite/work'
import { lightnessToY } from '@/lib/colour/lab'
import { CREATOR, LICENCE } from '@/lib/dataset/about'
import { DECIMALS } from '@/lib/findings/decimals'
import { publishedFigures } from '@/lib/findings/published'
import { standingBy } from '@/lib/findings/standing'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import { read } from '@/lib/server/db'
import { requireLook } from '@/lib/server/look'
import { openGraphFor } from '@/lib/server/page-metadata'
import { siteUrl } from '@/lib/server/site-url'
import { deviceStructuredData, plainSentence } from '@/lib/structured/device'
import { AllFigures } from './all-figures'
import { BigFigures } from './big-figures'
import { Cite } from './cite'
import { Contents } from './contents'
import { Corrections } from './corrections'
import { countedSets, priceSeen } from './dossier'
import { Facts } from './facts'
import { Breadcrumb, Heading, inOneLine } from './heading'
import { History } from './history'
import { HowWeKnow } from './how-we-know'
import { InYourLight } from './in-your-light'
import { PrintFoot } from './print-foot'
import { type DeviceParams, requireDevice } from './require-device'
import { Revisions } from './revisions'
import { Sessions } from './sessions'
import { SetsSummary } from './sets-summary'
import { Spread } from './spread'
import { Unreleased } from './unreleased'
import './print.css'

type Props = { params: Promise<DeviceParams> }

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const [{ units }, { slug }] = await Promise.all([requireLook(params), params])
  const { record, released } = await requireDevice(slug)
  const alternates = { canonical: `/devices/${record.slug}` }
  if (!released) {
    return {
      title: record.name,
      description: `${record.name} is on our bench; no figures are released yet.`,
      alternates,
    }
  }
  const { edition, device } = released
  const { lightness } = publishedFigures(edition, device)
  return {
    title: record.name,
    description: `${inOneLine(device, units)} Its page as measured: L* ${formatNumber(lightness.value, DECIMALS.lightness)} ${formatDoubt(lightness.doubt, DECIMALS.lightness)}, edition ${edition.number}, with every reading it rests on.`,
    alternates,
    openGraph: openGraphFor(`/devices/${record.slug}`, edition),
  }
}

export default async function DevicePage({ params }: Props) {
  const [{ units }, { slug }] = await Promise.all([requireLook(params), params])
  const { record, entries, latest, released } = await requireDevice(slug)
  if (!released) return <Unreleased record={record} />
  const { entry, edition, device } = released
  const [tiles, calibrations] = await Promise.all([read(listTileReadings), read(listWhiteCalibrations)])
  const figures = publishedFigures(edition, device)
  const sets = countedSets(record, entry)
  const { paper } = edition.control
  const address = siteUrl(`/devices/${slug}`)
  const publishedOn = edition.publishedAt.slice(0, 10)
  const seen = priceSeen(record, entry)
  const work: Work = {
    title: `${device.name}: figures of its page`,
    edition: edition.number,
    publishedOn,
    url: address,
    authors: [CREATOR],
    licence: LICENCE.id,
  }
  const hasRevisions = record.revisions.length > 1
  return (
    <main className="measure py-10">
      <JsonLd
        data={deviceStructuredData(
          {
            device,
            figures,
            edition: { number: edition.number, publishedOn },
            note: record.note,
            price: device.price && seen ? { ...device.price, seenOn: seen.seenOn, seller: seen.seller } : null,
          },
          siteUrl,
        )}
      />
      <Breadcrumb maker={record.maker} />
      <div className="device-top mt-4 grid gap-x-12 gap-y-8 lg:grid-cols-[23.75rem_minmax(0,1fr)]">
        <Booth
          className="order-2 lg:order-none lg:[&_[data-sample]]:aspect-9/20"
          sheets={[
            { name: 'Its page', page: device.page, ink: device.ink },
            { name: 'Its ink, full black', page: device.ink, ink: device.page },
          ]}
          paper={paper}
        />
        <div className="grid content-start gap-8 print:gap-4">
          <Heading
            device={device}
            pricedOn={seen?.seenOn ?? null}
            edition={edition}
            latest={latest?.number ?? edition.number}
            units={units}
          />
          <BigFigures figures={figures} standing={standingBy(edition, device, ({ page }) => page.L)} />
          <p className="max-w-[68ch] text-lead">{record.note ?? plainSentence(device, figures, edition.number)}</p>
          <AllFigures edition={edition} device={device} figures={figures} />
        </div>
      </div>
      <PrintFoot record={record} entry={entry} timesTheLight={figures.timesTheLight} units={units} address={address} />
      <Contents parts={hasRevisions ? PARTS : PARTS.filter(({ id }) => id !== 'revisions')} />
      <div className="later mt-10 grid gap-x-10 gap-y-10 lg:grid-cols-[minmax(0,1.8fr)_minmax(0,1fr)] print:hidden">
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
        <HowWeKnow record={record} entry={entry} edition={edition} />
      </div>
      <InYourLight device={device} figures={figures} yPaper={lightnessToY(paper.L)} />
      {hasRevisions && <Revisions record={record} entries={entries} />}
      <Spread sets={sets} />
      <Sessions sets={record.sets} tiles={tiles} calibrations={calibrations} />
      <SetsSummary record={record} entry={entry} />
      <History entries={entries} corrections={record.corrections} />
      <Facts record={record} entry={entry} lengths={units} />
      <Corrections corrections={record.corrections} />
      <Cite work={work} slug={slug} />
    </main>
  )
}

const PARTS = [
  { id: 'map', name: 'Among the whites' },
  { id: 'how', name: 'How we know' },
  { id: 'light', name: 'In your light' },
  { id: 'revisions', name: 'Revisions' },
  { id: 'spread', name: 'Between units and positions' },
  { id: 'control', name: 'The control on those days' },
  { id: 'readings', name: 'Readings' },
  { id: 'history', name: 'History across editions' },
  { id: 'facts', name: 'What is stated' },
  { id: 'corrections', name: 'Corrections and replies' },
  { id: 'cite', name: 'How to cite' },
]
