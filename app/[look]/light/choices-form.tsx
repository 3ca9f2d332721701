'use client'

import type { FormEvent } from 'react'
import { Kept } from '@/components/light-control'
import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { CheckboxField, SelectField } from '@/components/ui/field'
import { RadioGroup } from '@/components/ui/radio-group'
import { type LightChoice, lightHref, OPENING, pairsOf } from '@/lib/light/choice'
import { LAMPS, type LampName } from '@/lib/light/lamps'
import { METHOD } from '@/lib/method/constants'
import type { LightNeed, TextSize } from '@/lib/method/types'

/**
 * Lamp, front light, eyes and pages: a form that asks for the same page with other answers.
 * @param onShow goes there without leaving the page, where there is JavaScript
 */
export function ChoicesForm({
  choice,
  everyDevice,
  onShow,
}: {
  choice: LightChoice
  everyDevice: readonly { slug: string; name: string }[]
  onShow: (href: string) => void
}) {
  const { age } = METHOD.reserve

  function show(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    onShow(lightHref(choiceIn(new FormData(event.currentTarget), choice.lux, everyDevice.length)))
  }

  return (
    // Drawn anew when the address changes by a link or Back: what is ticked is the browser's own to keep.
    <form
      key={lightHref({ ...choice, lux: OPENING.lux })}
      action="/light"
      onSubmit={show}
      aria-label="Lamp, front light, eyes and pages"
      className="card grid gap-5 p-4 sm:p-5"
    >
      <Kept pairs={pairsOf({ ...OPENING, lux: choice.lux })} />
      <RadioGroup
        name="lamp"
        legend="Lamp"
        defaultValue={choice.lamp}
        options={LAMPS.map(({ name, title, cie }) => ({ value: name, label: title, hint: cie }))}
        layout="row"
      />
      <div className="grid items-end gap-x-6 gap-y-5 md:grid-cols-2 lg:grid-cols-[minmax(0,1.3fr)_minmax(0,1.2fr)_minmax(0,0.6fr)_auto]">
        <RadioGroup
          name="front"
          legend="Front light"
          hint={`On: where there is one it is turned up until the page gives ${METHOD.light.comfort.value} cd/m², or as far as it goes.`}
          defaultValue={choice.frontLight ? 'on' : 'off'}
          options={[
            { value: 'off', label: 'Off' },
            { value: 'on', label: 'On' },
          ]}
          layout="row"
        />
        <SelectField
          name="light-need"
          label="Do you often want more light than the people around you?"
          defaultValue={choice.lightNeed}
          options={[
            { value: 'usual', label: `No (worked as at ${age.value.usual} years)` },
            { value: 'more', label: `Yes, more (as at ${age.value.more})` },
            { value: 'much-more', label: `Yes, much more (as at ${age.value['much-more']})` },
          ]}
        />
        <SelectField
          name="type-size"
          label="Size of text"
          defaultValue={choice.text}
          options={[
            { value: 'small', label: 'Small' },
            { value: 'normal', label: 'Normal' },
            { value: 'large', label: 'Large' },
          ]}
        />
        <Button type="submit">Show it so</Button>
      </div>
      <Disclosure
        open={choice.chosen.length > 0}
        summary={choice.chosen.length > 0 ? `Pages: ${choice.chosen.length} chosen` : 'Pages: all; choose some'}
      >
        <fieldset>
          <legend className="text-note text-soft">Pages to show. With none ticked, all are shown.</legend>
          <div className="mt-2 grid gap-x-6 sm:grid-cols-2 lg:grid-cols-4">
            {everyDevice.map(({ slug, name }) => (
              <CheckboxField
                key={slug}
                id={`with-${slug}`}
                name="with"
                value={slug}
                label={name}
                defaultChecked={choice.chosen.includes(slug)}
              />
            ))}
          </div>
        </fieldset>
      </Disclosure>
    </form>
  )
}

/** The form's own values; whatever a browser was made to send besides, the server reads as any other address. */
function choiceIn(form: FormData, lux: number, devices: number): LightChoice {
  const chosen = form.getAll('with').map(String).sort()
  return {
    lux,
    lamp: form.get('lamp') as LampName,
    frontLight: form.get('front') === 'on',
    lightNeed: form.get('light-need') as LightNeed,
    text: form.get('type-size') as TextSize,
    chosen: chosen.length === devices ? [] : chosen,
    page: 1,
  }
}
