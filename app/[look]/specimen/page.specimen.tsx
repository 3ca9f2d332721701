import type { Metadata } from 'next'
import type { ReactNode } from 'react'
import { Booth } from '@/components/booth'
import { Ladder } from '@/components/charts/ladder'
import { LightStrips } from '@/components/charts/light-strips'
import { WhiteMap } from '@/components/charts/white-map'
import { PointsTable } from '@/components/points-table'
import { Sheet } from '@/components/sheet'
import { Shortlist } from '@/components/shortlist'
import { groupTies } from '@/lib/method/groups'
import { match } from '@/lib/method/ranking'
import { Controls } from './controls'
import { ANSWERS, curveOf, DEVICES, EDITION, PAPER, stripsFor } from './sample'
import { ShortlistInMotion } from './shortlist-in-motion'

export const metadata: Metadata = { title: 'Specimen', robots: { index: false } }

const SPOTS = [
  { name: 'In bed, small lamp at arm’s length', lux: 80, hours: 7, frontLight: true },
  { name: 'Train, bus, café by day', lux: 200, hours: 4, frontLight: false },
  { name: 'Outdoors, shade or overcast', lux: 8000, hours: 1, frontLight: false },
]
const DARK_SPOTS = [
  { name: 'In bed, lights off', lux: 0.1, hours: 3, frontLight: true },
  { name: 'In bed, lights off, no front light', lux: 0.1, hours: 3, frontLight: false },
  { name: 'In bed, one dim lamp far away', lux: 5, hours: 2.5, frontLight: false },
]
const BANDS = [
  { label: 'Bedside', hint: 'small lamp', lo: 50, hi: 200, tone: 'lamp' },
  { label: 'Desk', hint: 'office light', lo: 320, hi: 500, tone: 'room' },
  { label: 'Shade', hint: 'outdoors', lo: 5000, hi: 12_000, tone: 'daylight' },
] as const
const DOUBTS = Object.fromEntries(
  DEVICES.map(({ slug }, i) => [slug, { L: 0.8, whiteness: 3, chroma: 0.4 + (i % 2) * 0.1 }]),
)
const BY_SLUG = Object.fromEntries(DEVICES.map((device) => [device.slug, device]))

/** Every primitive and chart in every state, in whichever theme is chosen at the foot of the page. */
export default function SpecimenPage() {
  const answer = match(EDITION, ANSWERS, { draws: 1000 })
  const groups = groupTies(answer.ranked)
  const [first, second] = answer.ranked
  const last = answer.ranked.at(-1)
  const named = [first?.slug ?? '', last?.slug ?? '']
  const one = DEVICES.slice(0, 1)
  return (
    <main className="measure flex flex-col gap-14 py-10">
      <h1 className="text-display">Specimen</h1>
      <Controls />
      <Part title="Sheets">
        <div className="flex flex-wrap items-end gap-5 bg-booth p-6">
          {(['thumb', 'small', 'stand'] as const).map((size) =>
            DEVICES.slice(0, 4).map((d) => <Sheet key={size + d.slug} page={d.page} ink={d.ink} size={size} />),
          )}
        </div>
        <div className="grid gap-8 md:grid-cols-[320px_1fr]">
          <Booth sheets={DEVICES.slice(1, 2)} paper={PAPER} />
          <Booth sheets={DEVICES.slice(2, 5)} paper={PAPER} />
        </div>
        <Booth sheets={DEVICES.slice(3, 4)} paper={null} className="max-w-72" />
      </Part>

      <Part title="Points table">
        <PointsTable groups={groups} devices={BY_SLUG} weights={answer.weights} doubts={DOUBTS} />
        <h3>One of several pages</h3>
        <PointsTable
          groups={groups}
          devices={BY_SLUG}
          weights={answer.weights}
          paging={{ page: 2, perPage: 4, hrefFor: (page) => `/specimen?page=${page}` }}
        />
        <h3>One device</h3>
        <PointsTable groups={groupTies(answer.ranked.slice(0, 1))} devices={BY_SLUG} weights={answer.weights} />
      </Part>

      <Part title="Light strips">
        <div className="card max-w-180 p-4">
          <LightStrips {...stripsFor(SPOTS, DEVICES)} named={named} />
        </div>
        <h3>Long names, two that are close</h3>
        <div className="card max-w-180 p-4">
          <LightStrips
            {...stripsFor(SPOTS, DEVICES)}
            named={['pellow-broadsheet-13-colour', 'corrin-duodecimo-6-colour']}
          />
        </div>
        <h3>What cannot be read</h3>
        <div className="card max-w-180 p-4">
          <LightStrips {...stripsFor(DARK_SPOTS, DEVICES)} named={[first?.slug ?? '', 'quayle-margin-10']} />
        </div>
        <h3>One device, no paper</h3>
        <div className="card max-w-180 p-4">
          <LightStrips {...stripsFor(SPOTS.slice(0, 1), one)} paper={null} named={[one[0]?.slug ?? '']} />
        </div>
        <LightStrips spots={SPOTS} rows={[]} paper={null} named={[]} />
      </Part>

      <Part title="White map">
        <div className="grid gap-8 lg:grid-cols-[1.5fr_1fr]">
          <div className="card p-4">
            <WhiteMap rows={mapRows()} paper={PAPER} highlight="ostler-plain-7" />
          </div>
          <div className="card p-4">
            <WhiteMap rows={mapRows()} paper={PAPER} highlight="ostler-plain-7" />
          </div>
          <div className="card p-4">
            <WhiteMap rows={mapRows().slice(0, 1)} paper={{ L: 95, a: 1.5, b: -9 }} />
          </div>
          <WhiteMap rows={[]} paper={null} />
        </div>
      </Part>

      <Part title="Ladder">
        <div className="card max-w-190 p-4">
          <Ladder
            bands={BANDS}
            curves={DEVICES.map((device) =>
              curveOf(
                device,
                device.slug === 'quayle-margin-10'
                  ? 'first'
                  : device.slug === 'tamber-reed-7-colour'
                    ? 'second'
                    : 'quiet',
              ),
            )}
          />
        </div>
        <h3>Three long names, no bands</h3>
        <div className="card max-w-190 p-4">
          <Ladder
            bands={[]}
            curves={[
              ...DEVICES.filter((d) => d.slug.startsWith('pellow-broadsheet')).map((d) => curveOf(d, 'first')),
              ...DEVICES.filter((d) => d.slug.startsWith('corrin-duodecimo')).map((d) => curveOf(d, 'second')),
              ...DEVICES.filter((d) => d.slug.startsWith('haldon-copybook-10-')).map((d) => curveOf(d, 'third')),
            ]}
          />
        </div>
        <Ladder bands={[]} curves={[]} />
      </Part>

      <Part title="Shortlist">
        <div className="grid gap-6 lg:grid-cols-2">
          <div className="band p-8">
            <h3 className="mb-5">Your shortlist so far</h3>
            <Shortlist
              rows={answer.ranked.map((row) => ({
                slug: row.slug,
                name: BY_SLUG[row.slug]?.name ?? row.slug,
                fit: row.fit,
                sd: row.sd,
                tied: row.slug === first?.slug || (first?.tiedWith.includes(row.slug) ?? false),
              }))}
              excluded={[
                { slug: 'x', name: 'Pellow Broadsheet 13 Colour', why: 'over your budget' },
                { slug: 'y', name: 'Quayle Margin 13', why: 'heavier than you want' },
              ]}
            />
          </div>
          <div className="band p-8">
            <ShortlistInMotion />
          </div>
          <div className="band p-8">
            <Shortlist rows={[]} />
          </div>
          <div className="band p-8">
            <Shortlist
              rows={second ? [{ slug: second.slug, name: 'One alone', fit: second.fit, sd: null, tied: false }] : []}
            />
          </div>
        </div>
      </Part>
    </main>
  )
}

function mapRows() {
  return DEVICES.map(({ slug, name, page }) => ({ slug, name, page, u: page.u }))
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="flex flex-col gap-5">
      <h2>{title}</h2>
      {children}
    </section>
  )
}
