import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldError, TextField } from '@/components/ui/field'
import { LONGEST_NAME, type OWN_NUMBERS } from '@/lib/quiz/fields'
import { GO } from '@/lib/quiz/moves'
import { HoursControl } from './hours-control'
import { LightFields } from './light-fields'
import type { StepProps } from './step-body'

/** A spot of the reader's own: what they call it, its light, its hours. A blank one waits behind a disclosure. */
export function OwnSpotFields({
  n,
  text,
  error,
  blank = false,
}: StepProps & { n: (typeof OWN_NUMBERS)[number]; blank?: boolean }) {
  const base = `own${n}` as const
  const name = text(`${base}.name`)
  const where = name || `your own spot ${n}`
  const fields = (
    <div className="grid gap-4 py-3">
      <div className="grid items-end gap-4 sm:grid-cols-[minmax(0,1fr)_auto]">
        <TextField
          name={`${base}.name`}
          label="What you call it"
          maxLength={LONGEST_NAME}
          defaultValue={name}
          error={error(`${base}.name`)}
        />
        <HoursControl name={base} where={where} defaultValue={text(base)} error={error(base)} />
      </div>
      {error(base) && <FieldError id={base}>{error(base)}</FieldError>}
      <LightFields
        base={base}
        where={where}
        lux={text(`${base}.lux`) ?? ''}
        frontLight={text(`${base}.light`) === 'off' ? 'off' : 'on'}
        error={error}
      />
      {blank && (
        <Button type="submit" look="quiet" name="go" value={GO.here} className="justify-self-start">
          Add this spot
        </Button>
      )}
    </div>
  )
  if (blank) {
    return (
      <Disclosure summary="Add a spot of your own" className="mt-2">
        <fieldset>
          <legend className="sr-only">A spot of your own</legend>
          {fields}
        </fieldset>
      </Disclosure>
    )
  }
  return (
    <fieldset data-own className="border-b border-rule py-2.5">
      <legend className="pt-2 font-semibold">{name || `Your own spot ${n}`}</legend>
      {fields}
    </fieldset>
  )
}
