import Link from 'next/link'
import { Disclosure } from '@/components/ui/disclosure'
import { Table } from '@/components/ui/table'
import { publishedFigures } from '@/lib/findings/published'
import { formatList } from '@/lib/format/list'
import { formatNumber } from '@/lib/format/number'
import { coloursUnder, type LampColour } from '@/lib/light/colours'
import { lampEffect } from '@/lib/light/effect'
import { type LampName, lampNamed } from '@/lib/light/lamps'
import type { DeviceSpectra } from '@/lib/light/spectra'
import type { Edition, EditionDevice, Lab } from '@/lib/method/types'

/** As many rows stand open at once; more are opened by the reader. */
const FEW = 8

type Coloured = { device: EditionDevice; colour: LampColour }

/**
 * What the lamp does to the pages' colours: in words, then as figures against the lamp's own white.
 * @param shown those whose figures stand in the table: all, or those of one numbered page
 */
export function ColoursUnderLamp({
  lamp,
  devices,
  shown,
  edition,
  spectra,
}: {
  lamp: LampName
  devices: readonly EditionDevice[]
  shown: readonly EditionDevice[]
  edition: Edition
  spectra: ReadonlyMap<string, DeviceSpectra>
}) {
  const { title, cie } = lampNamed(lamp)
  const known: Coloured[] = devices.flatMap((device) => {
    const { colour } = coloursUnder(lamp, device, spectra.get(device.slug))
    return colour ? [{ device, colour }] : []
  })
  const rows = known.filter(({ device }) => shown.includes(device))
  const unknown = devices.filter((device) => !spectra.has(device.slug)).map(({ name }) => name)
  const effect = lampEffect(
    lamp,
    known.map(({ device, colour }) => ({ name: device.name, colour })),
  )
  return (
    <section aria-labelledby="colours" className="measure mt-12 grid gap-4">
      <h2 id="colours">What the lamp does to the colours</h2>
      <div className="grid max-w-[70ch] gap-3">
        {effect.map((sentence) => (
          <p key={sentence}>{sentence}</p>
        ))}
        <Assumption lamp={lamp} unknown={unknown} />
      </div>
      {rows.length > 0 && (
        <Disclosure
          open={rows.length <= FEW}
          summary={`The colours in figures: ${formatNumber(rows.length)} ${rows.length === 1 ? 'page' : 'pages'}`}
        >
          <div className="card p-4 sm:p-5">
            <Table
              caption={`${title} (${cie}), 10° observer, from the mean spectrum of each page’s readings that hold one, 400–700 nm. L*, a* and b* are against the light’s own white; x and y hold the colour of the lamp as well. ${doubts(edition, rows)}`}
              columns={[
                DEVICE,
                ...(lamp === 'D65' ? [] : [labColumn('In daylight', ({ daylight }) => daylight.lab)]),
                labColumn('Under this lamp', (colour) => colour.lamp.lab),
                CHROMATICITY,
                ...(lamp === 'D65' ? [] : [CHANGE]),
                READINGS,
              ]}
              rows={rows}
              rowKey={({ device }) => device.slug}
            />
          </div>
        </Disclosure>
      )}
      <p className="max-w-[80ch] text-note text-soft">
        Each reflectance is weighed by the lamp and the CIE 1964 observer (ASTM E308), and carried to the display’s
        white by CAT16, eyes taken to be wholly used to the lamp (D = 1). Only some readings hold a spectrum, so the
        daylight colour here may differ a little from the published one. Under a front light a page’s tint mixes with
        the colour of that light, which our instrument does not see. Colours and the dark are approximate on your
        display. This is no medical advice.{' '}
        <Link prefetch={false} href="/method#light">
          How light on the page is worked out
        </Link>
        .
      </p>
    </section>
  )
}

/** What is taken for granted where no spectrum is known. */
function Assumption({ lamp, unknown }: { lamp: LampName; unknown: readonly string[] }) {
  const [whose, are] =
    unknown.length === 0
      ? ['the control paper', 'It is']
      : [`${formatList(unknown)}, nor of the control paper`, 'They are']
  return (
    <p>
      {unknown.length > 0 && lamp !== 'D65' && '* '}No reflectance spectrum is known of {whose}. {are} drawn in the
      colour published for D65
      {lamp !== 'D65' && ', which assumes that eyes used to the lamp see it unchanged (constant colour)'}.
    </p>
  )
}

const DEVICE = {
  key: 'device',
  head: 'Device',
  label: 'Device',
  heading: true,
  cell: ({ device }: Coloured) => device.name,
}

/** L*, a* and b* beside each other, each to one decimal so that they can be read down. */
function labColumn(where: string, lab: (colour: LampColour) => Lab) {
  return {
    key: where,
    head: (
      <>
        {where} <span className="block font-normal">L*, a*, b*</span>
      </>
    ),
    label: `${where}: L*, a*, b*`,
    numeric: true,
    cell: ({ colour }: Coloured) => {
      const { L, a, b } = lab(colour)
      return <span className="whitespace-nowrap">{[L, a, b].map((value) => formatNumber(value, 1)).join(', ')}</span>
    },
  }
}

const CHROMATICITY = {
  key: 'xy',
  head: 'x, y',
  label: 'x, y',
  numeric: true,
  cell: ({ colour: { lamp } }: Coloured) => (
    <span className="whitespace-nowrap">
      {formatNumber(lamp.x, 4)}, {formatNumber(lamp.y, 4)}
    </span>
  ),
}

const CHANGE = {
  key: 'change',
  head: 'Change, ΔE00',
  label: 'Change, ΔE00',
  numeric: true,
  cell: ({ colour }: Coloured) => formatNumber(colour.change, 1),
}
const READINGS = {
  key: 'readings',
  head: 'Readings',
  label: 'Readings with a spectrum',
  numeric: true,
  cell: ({ colour }: Coloured) => formatNumber(colour.readings),
}

/** The doubt of a colour under a lamp is taken to be that of the published one. */
function doubts(edition: Edition, known: readonly Coloured[]): string {
  const figures = known.map(({ device }) => publishedFigures(edition, device))
  const most = (name: 'lightness' | 'a' | 'b') => formatNumber(Math.max(...figures.map((all) => all[name].doubt)), 1)
  return `The doubts are taken to be those of the published figures: at most L* ± ${most('lightness')}, a* ± ${most('a')}, b* ± ${most('b')} at about 95 %.`
}
