import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { compareHref } from '@/lib/compare/address'
import { formatDay, formatMonth } from '@/lib/format/date'
import { formatDiagonal } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import { formatExact } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import type { Edition, EditionDevice } from '@/lib/method/types'

/** Where we are, the device's name, what it is in one line, and what a reader must know before any figure. */
export function Heading({
  device,
  pricedOn,
  edition,
  latest,
  units,
}: {
  device: EditionDevice
  /** The day the edition's price was seen; null where it names none. */
  pricedOn: string | null
  edition: Pick<Edition, 'number' | 'publishedAt'>
  /** Number of the newest edition. */
  latest: number
  units: Units
}) {
  return (
    <header>
      <h1 className="md:text-display">{device.name}</h1>
      <p className="mt-3 text-lead text-soft">
        {inOneLine(device, units)}{' '}
        {device.price && pricedOn && `${formatMoney(device.price)} in ${formatMonth(pricedOn)}.`}
      </p>
      <p className="mt-2 text-small text-soft">
        Figures of{' '}
        <Link href={`/editions/${edition.number}`} prefetch={false}>
          edition {edition.number}
        </Link>
        , released <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>.
      </p>
      <p className="mt-3 flex flex-wrap gap-3 no-print">
        <ButtonLink href={compareHref([device.slug])}>Compare this page</ButtonLink>
        <ButtonLink look="quiet" href={`/light?with=${device.slug}`}>
          See it in your light
        </ButtonLink>
      </p>
      {edition.number < latest && (
        <Notice className="mt-4 max-w-[60ch]">
          This device is not in edition {latest}, the newest. What follows is as edition {edition.number} has it.
        </Notice>
      )}
      {device.provisional && (
        <Notice look="warning" className="mt-4 max-w-[60ch]">
          Provisional: measured on a single unit, so another may differ by more than the doubts of most devices.
        </Notice>
      )}
      {device.onSale === false && (
        <Notice className="mt-4 max-w-[60ch]">
          Not on sale when this edition was released, so the edition gives no price; prices seen before stand below.
        </Notice>
      )}
    </header>
  )
}

/** @param device the page above, on the pages below a device's own */
export function Breadcrumb({ maker, device }: { maker: string; device?: { slug: string; name: string } }) {
  return (
    <nav aria-label="Breadcrumb" className="text-small text-soft">
      <ol className="flex flex-wrap gap-2">
        <li>
          <Link href="/devices" prefetch={false} className="inline-flex min-h-6 items-center">
            Devices
          </Link>
        </li>
        <li>
          <span aria-hidden="true">/ </span>
          {maker}
        </li>
        {device && (
          <li>
            <span aria-hidden="true">/ </span>
            <Link href={`/devices/${device.slug}`} prefetch={false} className="inline-flex min-h-6 items-center">
              {device.name}
            </Link>
          </li>
        )}
      </ol>
    </nav>
  )
}

/** What the device is, from what is stated: "7.0 in (17.8 cm), 300 ppi, monochrome, front light." Unknowns are named. */
export function inOneLine({ diagonal, ppi, colour, frontLight, pen }: EditionDevice, units: Units): string {
  const parts = [
    diagonal === null ? 'size not stated' : formatDiagonal(diagonal, units),
    ppi === null ? null : `${formatExact(ppi)} ppi`,
    colour === null ? 'colour not stated' : colour ? 'colour' : 'monochrome',
    frontLight === null ? 'front light not stated' : frontLight ? 'front light' : 'no front light',
    pen ? 'pen' : null,
  ]
  const [first = '', ...rest] = parts.filter((part) => part !== null)
  return `${first[0]?.toUpperCase()}${first.slice(1)}, ${rest.join(', ')}.`
}
