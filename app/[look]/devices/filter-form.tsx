import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { CheckboxField, NumberField, SelectField, TextField } from '@/components/ui/field'
import { catalogueHref } from '@/lib/catalogue/address'
import { makerKey } from '@/lib/catalogue/maker'
import { type CatalogueQuery, LONGEST_SEARCH } from '@/lib/catalogue/schema'
import { sortFor, sortInAddress } from '@/lib/catalogue/sort'
import { LABELS, SIDES, type Side } from '@/lib/catalogue/words'
import { formatMass } from '@/lib/format/measures'
import type { Units } from '@/lib/look'
import { WATER_CODES } from '@/lib/quiz/limit-words'
import { LiveFilters } from './live-filters'

const FORM = 'filters'
/** Weights offered, grams (house). */
const WEIGHTS = [150, 175, 200, 225, 250, 300, 350, 400, 500]
const ANY = { value: '', label: 'Does not matter' }

/** What narrows the list. A plain form: it works without scripts, and says nothing of what is left blank. */
export function FilterForm({
  query,
  makers,
  units,
  filters,
}: {
  query: CatalogueQuery
  makers: readonly string[]
  units: Units
  filters: number
}) {
  const sort = sortInAddress(sortFor(query))
  return (
    <search aria-label="Devices" className="mt-8 block">
      <form key={catalogueHref(query)} id={FORM} action="/devices" className="card p-4 sm:p-5">
        <LiveFilters form={FORM} />
        {Object.entries(sort).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        <div className="flex items-end gap-3">
          <TextField
            name="q"
            type="search"
            label={LABELS.q}
            defaultValue={query.q}
            maxLength={LONGEST_SEARCH}
            autoComplete="off"
            className="min-w-0 flex-1 sm:max-w-96"
          />
          <Button type="submit">Search</Button>
        </div>
        <Disclosure
          className="catalogue-filters mt-2"
          summary={filters > 0 ? `Filters (${filters} in force)` : 'Filters'}
        >
          <div className="mt-3 grid gap-5">
            <div className="grid grid-cols-2 gap-x-6 gap-y-5 md:grid-cols-4">
              <NumberField
                name="min-size"
                label={LABELS['min-size']}
                unit="in"
                unitName="inches"
                defaultValue={query['min-size']}
              />
              <NumberField
                name="max-size"
                label={LABELS['max-size']}
                unit="in"
                unitName="inches"
                defaultValue={query['max-size']}
              />
              <NumberField
                name="max-price"
                label={LABELS['max-price']}
                unit="£"
                unitName="pounds"
                unitFirst
                defaultValue={query['max-price'] === undefined ? undefined : query['max-price'] / 100}
              />
              <SelectField
                name="max-weight"
                label={LABELS['max-weight']}
                defaultValue={query['max-weight'] ?? ''}
                options={[ANY, ...weights(query['max-weight'], units)]}
              />
            </div>
            <div className="grid gap-x-6 gap-y-5 min-[26rem]:grid-cols-2 md:grid-cols-3 lg:grid-cols-5">
              {(Object.keys(SIDES) as Side[]).map((name) => (
                <SelectField
                  key={name}
                  name={name}
                  label={LABELS[name]}
                  defaultValue={query[name] === undefined ? '' : query[name] ? 'yes' : 'no'}
                  options={[
                    ANY,
                    { value: 'yes', label: capital(SIDES[name][1]) },
                    { value: 'no', label: capital(SIDES[name][0]) },
                  ]}
                />
              ))}
              <SelectField
                name="water"
                label={LABELS.water}
                defaultValue={query.water ?? ''}
                options={[ANY, ...waters(query.water)]}
              />
            </div>
            {makers.length > 1 && (
              <fieldset className="min-w-0">
                <legend className="font-semibold">Makers</legend>
                <div className="flex flex-wrap gap-x-6">
                  {makers.map((maker) => (
                    <CheckboxField
                      key={maker}
                      id={`maker-${makerKey(maker)}`}
                      name="maker"
                      value={makerKey(maker)}
                      label={maker}
                      defaultChecked={query.maker?.includes(makerKey(maker))}
                    />
                  ))}
                </div>
              </fieldset>
            )}
            <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
              <Button type="submit" look="quiet">
                Show devices
              </Button>
              <p className="max-w-[60ch] text-note text-soft">
                A filter leaves out only devices known to fail it; those that do not say are listed apart. Prices in
                another currency are not converted.
              </p>
            </div>
          </div>
        </Disclosure>
      </form>
    </search>
  )
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1)

/** The weights offered, and the one in force where it is none of them. */
function weights(now: number | undefined, units: Units) {
  const all = now === undefined || WEIGHTS.includes(now) ? WEIGHTS : [...WEIGHTS, now].sort((a, b) => a - b)
  return all.map((grams) => ({ value: String(grams), label: formatMass(grams, units) }))
}

function waters(now: number | undefined) {
  const offered = WATER_CODES.map(({ digit, words }) => ({ value: String(digit), label: words }))
  const known = now === undefined || WATER_CODES.some(({ digit }) => digit === now)
  return known ? offered : [...offered, { value: String(now), label: `IPX${now} or better` }]
}
