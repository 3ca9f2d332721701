import { Field, NumberField, SelectField } from '@/components/ui/field'
import { RadioGroup } from '@/components/ui/radio-group'
import { type FieldName, LABELS, type Problem, type Texts } from './fields'

type Shown = { texts: Texts; problems: readonly Problem[] }

/** The form's fields. Of the two ways to give colours the one not chosen is out of sight, without any script. */
export function ExampleFields(shown: Shown) {
  const { texts, problems } = shown
  const error = (name: FieldName) => problems.find(({ id }) => id === name)?.message
  return (
    <>
      <RadioGroup
        name="from"
        legend={LABELS.from}
        layout="row"
        error={error('from')}
        defaultValue={texts.from}
        options={[
          { value: 'readings', label: 'Lists of readings' },
          { value: 'numbers', label: 'Three numbers each' },
        ]}
      />
      <div className="grid gap-4 group-has-[[value=readings]:checked]/example:hidden sm:grid-cols-3">
        {(['pageL', 'pageA', 'pageB', 'inkL', 'inkA', 'inkB'] as const).map((name) => (
          <NumberIn key={name} name={name} {...shown} />
        ))}
      </div>
      <div className="grid gap-4 group-has-[[value=numbers]:checked]/example:hidden sm:grid-cols-2">
        <Readings name="pageReadings" {...shown} />
        <Readings name="inkReadings" {...shown} />
      </div>
      <div className="grid items-end gap-4 sm:grid-cols-2">
        <NumberIn name="units" {...shown} hint="k of the formula" />
        <NumberIn name="positions" {...shown} hint="m of the formula" />
        <NumberIn name="lux" unit="lux" {...shown} />
        <NumberIn name="frontLight" unit="cd/m²" {...shown} hint="0 where there is none" />
        <NumberIn name="age" unit="years" {...shown} hint="Of the model’s eye; the quiz never asks yours" />
        <SelectField
          name="text"
          label={LABELS.text}
          error={error('text')}
          defaultValue={texts.text}
          options={[
            { value: 'small', label: 'Small' },
            { value: 'normal', label: 'Normal' },
            { value: 'large', label: 'Large' },
          ]}
        />
      </div>
    </>
  )
}

function NumberIn({ name, texts, problems, unit, hint }: Shown & { name: FieldName; unit?: string; hint?: string }) {
  return (
    <NumberField
      name={name}
      label={LABELS[name]}
      hint={hint}
      unit={unit}
      unitName={unit === 'cd/m²' ? 'candela per square metre' : unit}
      defaultValue={texts[name]}
      error={problems.find(({ id }) => id === name)?.message}
    />
  )
}

function Readings({ name, texts, problems }: Shown & { name: 'pageReadings' | 'inkReadings' }) {
  return (
    <Field
      name={name}
      label={LABELS[name]}
      hint="One on a line: L*, a*, b*"
      error={problems.find(({ id }) => id === name)?.message}
    >
      {(control) => (
        <textarea
          {...control}
          rows={8}
          spellCheck={false}
          defaultValue={texts[name]}
          className="w-full rounded-card border border-edge bg-sheet px-3 py-2 text-body text-ink tabular-nums aria-invalid:border-stop aria-invalid:outline aria-invalid:outline-stop"
        />
      )}
    </Field>
  )
}
