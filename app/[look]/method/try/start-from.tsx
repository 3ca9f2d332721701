import { Button } from '@/components/ui/button'
import { SelectField } from '@/components/ui/field'
import type { ExampleData } from '../data'

/** A device of the newest edition whose first set fills the form. */
export function StartFrom({ devices, start: { from } }: Pick<ExampleData, 'devices' | 'start'>) {
  if (!from) {
    return (
      <p className="mt-4 max-w-[68ch] text-soft">
        No edition has been released yet, so the form starts from the method’s bright reference page.
      </p>
    )
  }
  return (
    <>
      <p className="mt-4 max-w-[68ch]">
        It starts from a real set: {from.name}, unit {from.unit}, {from.position}, session {from.session}. One set alone
        is less sure than the figure we publish, which rests on all of them.
      </p>
      <form action="/method/try" aria-label="Start from a device" className="mt-4 flex flex-wrap items-end gap-3">
        <SelectField
          name="start"
          label="Start from"
          defaultValue={from.slug}
          options={devices.map(({ slug, name }) => ({ value: slug, label: name }))}
        />
        <Button type="submit" look="quiet">
          Fill in its readings
        </Button>
      </form>
    </>
  )
}
