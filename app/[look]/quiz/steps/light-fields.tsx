import { Button } from '@/components/ui/button'
import { NumberField } from '@/components/ui/field'
import { RadioGroup } from '@/components/ui/radio-group'
import type { FieldName } from '@/lib/quiz/fields'
import { GO } from '@/lib/quiz/moves'
import type { StepProps } from './step-body'

/** The light of a spot: lux, whether a front light may be used there, and a way to estimate. */
export function LightFields({
  base,
  where,
  lux,
  frontLight,
  error,
}: {
  base: string
  where: string
  lux: string
  frontLight: 'on' | 'off'
  error: StepProps['error']
}) {
  const luxField = `${base}.lux` as FieldName
  const lightField = `${base}.light` as FieldName
  return (
    <div className="grid gap-4">
      <div className="flex flex-wrap items-end gap-3">
        <NumberField name={luxField} label="Light on the page" unit="lux" defaultValue={lux} error={error(luxField)} />
        <Button type="submit" look="quiet" name="go" value={`${GO.estimate}${base}`}>
          Estimate the light<span className="sr-only"> for {where}</span>
        </Button>
      </div>
      <RadioGroup
        name={lightField}
        legend="May the device’s own front light be on here?"
        error={error(lightField)}
        layout="row"
        options={[
          { value: 'on', label: 'Yes, if it has one' },
          { value: 'off', label: 'No' },
        ]}
        defaultValue={frontLight}
      />
    </div>
  )
}
