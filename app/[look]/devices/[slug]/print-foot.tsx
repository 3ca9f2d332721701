import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { DECIMALS } from '@/lib/findings/decimals'
import type { Figure } from '@/lib/findings/published'
import { formatDay } from '@/lib/format/date'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import { newestSpecs } from './dossier'
import { FACT_NAMES, stated } from './facts'

const KEY_FACTS = ['diagonal', 'ppi', 'weight', 'colour', 'frontLight', 'pen', 'water', 'onSale'] as const

/** What a printed page has in place of all that stays on the site: key facts, the cautions, where it came from. */
export function PrintFoot({
  record,
  entry,
  timesTheLight,
  units,
  address,
}: {
  record: DeviceRecord
  entry: DeviceEntry
  timesTheLight: Figure
  units: Units
  address: string
}) {
  const specs = newestSpecs(record, entry)
  return (
    <div className="device-print mt-6 hidden print:block">
      <p>
        Needs {formatNumber(timesTheLight.value, DECIMALS.times)} {formatDoubt(timesTheLight.doubt, DECIMALS.times)}{' '}
        times the light of our control paper to look as light. Revision {entry.revision}.
      </p>
      <dl className="mt-4 grid grid-cols-4 gap-x-6 gap-y-2">
        {KEY_FACTS.map((field) => (
          <div key={field}>
            <dt className="text-note">{FACT_NAMES[field]}</dt>
            <dd>
              {stated(
                specs.find((spec) => spec.field === field),
                units,
              )}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-5 text-note">
        Not medical advice; sudden changes in sight, pain or haloes belong to an eye-care professional. Comfort, “eye
        strain” and sleep are not rated. Light levels are bands, not measurements; printed colours say nothing of the
        page. Water-resistance codes describe new devices in fresh water; batteries and chargers are as their makers
        say. Local consumer law comes first.
      </p>
      <p className="mt-2 text-note wrap-anywhere">
        Lampleaf, edition {entry.edition}, released {formatDay(entry.publishedAt)}. {address}
      </p>
    </div>
  )
}
