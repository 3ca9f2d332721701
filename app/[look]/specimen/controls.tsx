import { Button, ButtonLink } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { ErrorSummary } from '@/components/ui/error-summary'
import { CheckboxField, NumberField, SelectField, TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { RadioGroup } from '@/components/ui/radio-group'
import { Table } from '@/components/ui/table'
import { DEVICES } from './sample'

const CHOICES = [
  { value: 'usual', label: 'About as much light as others' },
  { value: 'more', label: 'More light than others', hint: 'You turn on a lamp where others do not.' },
  { value: 'much-more', label: 'Much more', disabled: true },
]

/** Text, buttons, notices, fields and tables in their states. */
export function Controls() {
  return (
    <>
      <section className="grid gap-3">
        <p className="text-lead">
          Lead: how light, how white and how tinted each page is, with <a href="#content">the content of this page</a>.
        </p>
        <p>
          Body: L* 73.4 ± 0.8, W<sub>10</sub> 41†, 8,000 lux, £189, 62 %, −1.7. Žluťoučký kůň, <i>in italics</i>,{' '}
          <b>in bold</b>.
        </p>
        <p className="text-small text-soft">Small and soft.</p>
        <p className="text-note text-faint">Note and faint.</p>
        <h1>Where do you read, and for how long?</h1>
        <h2>Where the points come from</h2>
        <h3>Nearly made it</h3>
      </section>
      <section className="flex flex-col gap-5">
        <h2>Buttons</h2>
        <div className="flex flex-wrap items-center gap-3">
          <Button>Next: your eyes</Button>
          <Button look="quiet">Back</Button>
          <Button look="step" aria-label="More">
            +
          </Button>
          <Button disabled>Not yet</Button>
          <Button look="quiet" disabled>
            Not yet
          </Button>
          <ButtonLink href="/specimen">A link</ButtonLink>
        </div>
        <div className="band flex flex-wrap items-center gap-3 p-6">
          <Button look="lamp">Take the quiz</Button>
          <Button look="quiet">Show</Button>
          <Button look="step" aria-label="Less">
            −
          </Button>
          <span>
            On a band, with <a href="#content">the content of this page</a> and{' '}
            <span className="text-soft">soft words</span>.
          </span>
        </div>
      </section>
      <section className="flex flex-col gap-5">
        <h2>Notices</h2>
        <Notice>Your answers stay in this browser until you save them.</Notice>
        <Notice look="warning">Only two devices are left. More than three limits rarely help.</Notice>
        <Notice look="error">
          The ranking could not be read. <a href="/specimen">Try again</a>.
        </Notice>
        <Disclosure summary="How we know">
          <p className="max-w-prose">Five readings at three positions on two units, specular included.</p>
        </Disclosure>
      </section>
      <section className="flex flex-col gap-5">
        <h2>Fields</h2>
        <ErrorSummary errors={[{ id: 'lux-wrong', message: 'Light must be from 0 to 200,000 lux' }]} />
        <div className="grid gap-6 md:grid-cols-2">
          <TextField name="own" label="Name of your spot" hint="For example: the kitchen table." />
          <TextField name="off" label="Switched off" defaultValue="Cannot be changed" disabled />
          <NumberField
            name="lux"
            label="Light on the page"
            unit="lux"
            defaultValue="350"
            hint="A phone’s meter will do."
          />
          <NumberField
            name="lux2"
            id="lux-wrong"
            label="Light on the page"
            unit="lux"
            defaultValue="lots"
            error={['Light must be from 0 to 200,000 lux']}
          />
          <SelectField
            name="white"
            label="White you prefer"
            options={[
              { value: 'neutral', label: 'Neutral' },
              { value: 'warm', label: 'Warm' },
            ]}
          />
          <NumberField name="budget" label="Budget" unit="£" unitName="pounds" unitFirst />
          <div>
            <CheckboxField name="pen" label="Must have a pen" hint="For notes and margins." defaultChecked />
            <CheckboxField name="terms" label="I have read this" error="Tick this to go on" />
            <CheckboxField name="none" label="Cannot be chosen" disabled />
          </div>
          <RadioGroup
            name="text"
            legend="Size of type"
            layout="row"
            defaultValue="normal"
            options={[
              { value: 'small', label: 'Small' },
              { value: 'normal', label: 'Normal' },
              { value: 'large', label: 'Large' },
            ]}
          />
          <RadioGroup
            name="need"
            legend="How much light do you want?"
            hint="Compared with people around you."
            options={CHOICES}
            defaultValue="more"
          />
          <RadioGroup name="need2" legend="How much light do you want?" error="Choose one" options={CHOICES} />
        </div>
      </section>
      <section className="flex flex-col gap-5">
        <h2>Table</h2>
        <Table
          caption="Lightness and weight"
          rows={DEVICES.slice(0, 5)}
          rowKey={(device) => device.slug}
          columns={[
            { key: 'name', head: 'Device', label: 'Device', heading: true, cell: (d) => d.name },
            { key: 'L', head: 'L*', label: 'Lightness L*', numeric: true, cell: (d) => d.page.L.toFixed(1) },
            { key: 'g', head: 'Weight', label: 'Weight', numeric: true, cell: (d) => `${d.weight ?? '–'} g` },
          ]}
        />
        <Table caption="Nothing" rows={[]} rowKey={() => ''} columns={[]} empty="No device meets these limits." />
      </section>
    </>
  )
}
