import Link from 'next/link'
import { FigureText } from '@/app/[look]/devices/figure'
import { Sheet } from '@/components/sheet'
import { publishedFigures } from '@/lib/findings/published'
import { formatNumber } from '@/lib/format/number'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { PER_PAGE } from '@/lib/server/path-page'
import type { Changelog } from './changelog'

/** The devices an edition has that the one before had not; all of them in the first. */
export function Added({ changelog }: { changelog: Changelog }) {
  const { edition, changes } = changelog
  const added = changes ? changes.added : [...edition.devices]
  return (
    <section aria-labelledby="added">
      <h2 id="added">Added</h2>
      {added.length === 0 ? (
        <p className="mt-3 text-soft">No device is new.</p>
      ) : (
        <>
          <p className="mt-3 text-soft">
            {added.length === 1 ? 'One device is new' : `${formatNumber(added.length)} devices are new`}
            {changes ? '' : ', as every device of a first edition is'}. ± is the doubt at about 95 %.
          </p>
          <Devices devices={added} edition={edition} />
        </>
      )}
    </section>
  )
}

/** The devices of the edition before that this one has no more. */
export function Withdrawn({ changelog }: { changelog: Changelog }) {
  const { changes, previous } = changelog
  if (!changes || !previous) return null
  return (
    <section aria-labelledby="withdrawn">
      <h2 id="withdrawn">Withdrawn</h2>
      {changes.withdrawn.length === 0 ? (
        <p className="mt-3 text-soft">No device was taken out.</p>
      ) : (
        <>
          <p className="mt-3 max-w-[68ch] text-soft">
            No longer in the edition, with the figures edition {previous.number} has of them. They stay there.
          </p>
          <Devices devices={changes.withdrawn} edition={previous} />
        </>
      )}
    </section>
  )
}

function Devices({ devices, edition }: { devices: readonly EditionDevice[]; edition: Edition }) {
  const shown = devices.slice(0, PER_PAGE)
  const more = devices.length - shown.length
  return (
    <>
      <ul className="mt-4 grid gap-x-10 border-t border-rule sm:grid-cols-2 lg:grid-cols-3">
        {shown.map((device) => (
          <li key={device.slug} className="flex items-center gap-4 border-b border-rule py-3">
            <Sheet page={device.page} ink={device.ink} size="thumb" />
            <span>
              <Link href={`/devices/${device.slug}`} prefetch={false} className="font-semibold">
                {device.name}
              </Link>
              <span className="block text-small">
                L* <FigureText figure={publishedFigures(edition, device).lightness} decimals={1} />
              </span>
              {device.provisional && <span className="block text-note text-soft">provisional, one unit</span>}
            </span>
          </li>
        ))}
      </ul>
      {more > 0 && (
        <p className="mt-3 text-soft">
          And {formatNumber(more)} more; all of them are in{' '}
          <a href={`/api/v1/editions/${edition.number}`}>the document of edition {edition.number}</a>.
        </p>
      )}
    </>
  )
}
