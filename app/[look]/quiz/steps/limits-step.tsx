import { CheckboxField, NumberField, SelectField } from '@/components/ui/field'
import { SWITCHES, type Switch } from '@/lib/quiz/answers'
import type { FieldName } from '@/lib/quiz/fields'
import { WATER_CODES } from '@/lib/quiz/limit-words'
import { SWITCH_NAMES } from '@/lib/quiz/words'
import { ChoiceRow } from './choice-row'
import type { StepProps } from './step-body'

const SWITCH_FIELDS: Record<Switch, FieldName> = {
  pen: 'pen',
  colour: 'colour',
  frontLight: 'front-light',
  pageButtons: 'page-buttons',
  onSale: 'on-sale',
  lending: 'lending',
  speech: 'speech',
}
const MUST_CHOICES = [
  { value: '', label: 'Does not matter' },
  { value: 'must', label: 'Must' },
  { value: 'must-not', label: 'Must not' },
]

/** Step 5: limits, each of which takes devices away. */
export function LimitsStep({ text, error, formats }: StepProps & { formats: readonly string[] }) {
  const number = (name: FieldName) => ({ id: name, name, error: error(name), defaultValue: text(name) })
  const chosen = (text('formats') ?? '').toUpperCase().split(',')
  const water = text('water')
  return (
    <div className="grid gap-9">
      <div className="grid grid-cols-2 gap-x-6 gap-y-5 sm:grid-cols-4">
        <NumberField {...number('budget')} label="Most to pay" unit="£" unitName="pounds" />
        <NumberField {...number('max-weight')} label="Weight up to" unit="g" unitName="grams" />
        <NumberField {...number('min-size')} label="Size from" unit="in" unitName="inches" />
        <NumberField {...number('max-size')} label="Size up to" unit="in" unitName="inches" />
      </div>

      <div className="border-t border-rule">
        {SWITCHES.map((field) => (
          <ChoiceRow
            key={field}
            name={SWITCH_FIELDS[field]}
            legend={SWITCH_NAMES[field]}
            error={error(SWITCH_FIELDS[field])}
            choices={MUST_CHOICES}
            defaultValue={text(SWITCH_FIELDS[field])}
          />
        ))}
      </div>

      <SelectField
        name="water"
        label="Safe in water"
        hint="Codes describe new devices in fresh water; they promise nothing about soap, salt, chlorine or age."
        error={error('water')}
        defaultValue={water ?? ''}
        className="max-w-96"
        options={[
          { value: '', label: 'Does not matter' },
          ...WATER_CODES.map(({ digit, words }) => ({ value: String(digit), label: words })),
          ...(water && !WATER_CODES.some(({ digit }) => String(digit) === water)
            ? [{ value: water, label: `IPX${water} or better` }]
            : []),
        ]}
      />

      {formats.length > 0 && (
        <fieldset id="formats" tabIndex={-1}>
          <legend className="font-semibold">Files it must open</legend>
          <p className="text-note text-soft">For books you already have. Every one you tick must be readable.</p>
          {error('formats') && <p className="text-small font-semibold text-stop">{error('formats')}</p>}
          <div className="mt-1 grid grid-cols-2 gap-x-6 sm:grid-cols-4">
            {formats.map((format) => (
              <CheckboxField
                key={format}
                id={`formats-${format}`}
                name="formats"
                value={format}
                label={format}
                defaultChecked={chosen.includes(format)}
              />
            ))}
          </div>
        </fieldset>
      )}
    </div>
  )
}
