import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { formatMonth } from '@/lib/format/date'
import { formatMoney } from '@/lib/format/money'
import { formatExact } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'

/** Where we are, the device's name, what it is in one line, and what a reader must know before any figure. */
export function Heading({ device, pricedOn }: { device: EditionDevice; pricedOn: string | null }) {
  return (
    <header>
      <h1 className="text-display">{device.name}</h1>
      <p className="mt-3 text-lead text-soft">
        {inOneLine(device)} {device.price && pricedOn && `${formatMoney(device.price)} in ${formatMonth(pricedOn)}.`}
      </p>
      {device.provisional && (
        <Notice look="warning" className="mt-4 max-w-[60ch]">
          Provisional: measured on a single unit, so another may differ by more than the doubts of most devices.
        </Notice>
      )}
      {device.onSale === false && (
        <Notice className="mt-4 max-w-[60ch]">Not on sale when this edition was released.</Notice>
      )}
    </header>
  )
}

export function Breadcrumb({ maker }: { maker: string }) {
  return (
    <nav aria-label="Breadcrumb" className="text-small text-soft">
      <ol className="flex gap-2">
        <li>
          <Link href="/devices">Devices</Link>
        </li>
        <li>
          <span aria-hidden="true">/ </span>
          {maker}
        </li>
      </ol>
    </nav>
  )
}

/** What the device is, from what is stated: "7 inch, 300 ppi, monochrome, front light." Unknowns are named. */
export function inOneLine({ diagonal, ppi, colour, frontLight, pen }: EditionDevice): string {
  const parts = [
    diagonal === null ? 'size not stated' : `${formatExact(diagonal)} inch`,
    ppi === null ? null : `${formatExact(ppi)} ppi`,
    colour === null ? 'colour not stated' : colour ? 'colour' : 'monochrome',
    frontLight === null ? 'front light not stated' : frontLight ? 'front light' : 'no front light',
    pen ? 'pen' : null,
  ]
  const [first = '', ...rest] = parts.filter((part) => part !== null)
  return `${first[0]?.toUpperCase()}${first.slice(1)}, ${rest.join(', ')}.`
}
