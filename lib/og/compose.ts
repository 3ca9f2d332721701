import { publishedFigures } from '@/lib/findings/published'
import { formatDay } from '@/lib/format/date'
import { formatDoubt, formatLux, formatNumber, formatRange } from '@/lib/format/number'
import type { Edition } from '@/lib/method/types'
import { questionOf } from '@/lib/readers/reader'
import { findReader } from '@/lib/readers/readers'
import type { Subject } from './address'
import type { Picture } from './picture'

/** What the picture of a subject says in one edition; null: the edition has no such device, or there is no such reader. */
export function compose(edition: Edition, subject: Subject): Picture | null {
  const shared = {
    paper: edition.control.paper,
    foot: `Edition ${edition.number}, ${formatDay(edition.publishedAt)}`,
    sheets: lightestToDarkest(edition),
  }
  switch (subject.kind) {
    case 'device':
      return ofDevice(edition, subject.slug, shared)
    case 'reader':
      return ofReader(subject.slug, shared)
    case 'edition':
      return {
        ...shared,
        title: `Edition ${edition.number}`,
        line: 'Every figure with its doubt.',
        figure: measured(edition),
      }
    case 'method':
      return {
        ...shared,
        title: 'How a page is measured',
        line: 'Every page stands beside the same control paper.',
        figure: { value: formatNumber(shared.paper.L, 1), doubt: '', label: 'lightness L* of the control paper' },
      }
    case 'home':
      return {
        ...shared,
        title: 'Find the page that suits your light',
        line: 'Measured pages, and a quiz.',
        figure: lightnesses(edition),
      }
  }
}

type Shared = Pick<Picture, 'paper' | 'foot' | 'sheets'>

function ofDevice(edition: Edition, slug: string, shared: Shared): Picture | null {
  const device = edition.devices.find((one) => one.slug === slug)
  if (!device) return null
  const { lightness } = publishedFigures(edition, device)
  const units = device.units === 1 ? 'One unit, provisional' : `${formatNumber(device.units)} units measured`
  return {
    ...shared,
    title: device.name,
    line: device.provisional ? units : `${units}.`,
    figure: {
      value: formatNumber(lightness.value, 1),
      doubt: formatDoubt(lightness.doubt, 1),
      label: 'lightness L* of the page, at about 95 %',
    },
    sheets: [device],
  }
}

function ofReader(slug: string, shared: Shared): Picture | null {
  const reader = findReader(slug)
  if (!reader) return null
  const [main] = questionOf(reader).answers.spots.toSorted((one, other) => other.hours - one.hours)
  return {
    ...shared,
    title: reader.name,
    line: reader.line,
    figure: { value: formatLux(main?.lux ?? 0), doubt: 'lux', label: 'where most of the reading is done' },
  }
}

const measured = ({ devices }: Edition) => ({
  value: formatNumber(devices.length),
  doubt: '',
  label: devices.length === 1 ? 'device measured' : 'devices measured',
})

function lightnesses({ devices }: Edition) {
  const all = devices.map(({ page }) => page.L)
  return {
    value: formatRange(Math.min(...all), Math.max(...all)),
    doubt: 'L*',
    label: `lightness of ${formatNumber(devices.length)} pages`,
  }
}

/** The lightest, the middle and the darkest page: the spread, without a winner. */
function lightestToDarkest({ devices }: Edition) {
  const ordered = devices.toSorted((one, other) => other.page.L - one.page.L)
  const places = new Set([0, Math.floor((ordered.length - 1) / 2), ordered.length - 1])
  return [...places].flatMap((place) => ordered[place] ?? [])
}
