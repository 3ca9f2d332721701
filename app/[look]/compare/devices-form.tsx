import { Button } from '@/components/ui/button'
import { SelectField } from '@/components/ui/field'
import { compareHref, MOST_COMPARED } from '@/lib/compare/address'
import type { EditionDevice } from '@/lib/method/types'

const PLACES = ['First device', 'Second device', 'Third device', 'Fourth device'] as const

/** Chooses the devices: adds, replaces and removes in one form, which works without scripts. */
export function DevicesForm({
  devices,
  chosen,
}: {
  devices: readonly EditionDevice[]
  chosen: readonly EditionDevice[]
}) {
  const options = [...devices]
    .sort((one, other) => one.name.localeCompare(other.name, 'en-GB'))
    .map(({ slug, name }) => ({ value: slug, label: name }))
  return (
    <section aria-labelledby="choose" className="mt-14 print:hidden">
      <h2 id="choose">{chosen.length < 2 ? 'Choose devices' : 'Add, replace or remove a device'}</h2>
      <form key={compareHref(chosen.map(({ slug }) => slug))} action="/compare" className="card mt-4 p-4 sm:p-5">
        <div className="grid gap-x-6 gap-y-5 sm:grid-cols-2 lg:grid-cols-4">
          {PLACES.slice(0, MOST_COMPARED).map((label, i) => (
            <SelectField
              key={label}
              id={`device-${i + 1}`}
              name="with"
              label={label}
              defaultValue={chosen[i]?.slug ?? ''}
              options={[{ value: '', label: 'None' }, ...options]}
            />
          ))}
        </div>
        <Button type="submit" className="mt-5">
          Compare
        </Button>
      </form>
    </section>
  )
}
