import { compareHref } from '@/lib/compare/address'
import { formatDay } from '@/lib/format/date'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { siteUrl } from '@/lib/server/site-url'
import { CopyAddress } from './copy-address'

/** The address of this comparison, to be passed on. */
export function Share({ edition, devices }: { edition: Edition; devices: readonly EditionDevice[] }) {
  const address = siteUrl(compareHref(devices.map(({ slug }) => slug)))
  return (
    <section aria-labelledby="share" className="mt-14">
      <h2 id="share">Share this comparison</h2>
      <div className="mt-4 grid max-w-[68ch] gap-1">
        <label htmlFor="address" className="font-semibold">
          Address of this comparison
        </label>
        <div className="flex flex-wrap gap-3">
          <input
            id="address"
            readOnly
            value={address}
            aria-describedby="address-hint"
            className="min-h-11 min-w-0 flex-1 basis-60 rounded-card border border-edge bg-sheet px-3 py-2 text-small text-ink"
          />
          <CopyAddress address={address} />
        </div>
        <p id="address-hint" className="text-note text-soft">
          It always shows the newest edition; now edition {edition.number} of {formatDay(edition.publishedAt)}.
        </p>
      </div>
    </section>
  )
}
