import type { Look, Theme, Units } from '@/lib/look'
import { WayBack } from './way-back'

const THEMES: readonly { value: Theme | 'automatic'; name: string }[] = [
  { value: 'day', name: 'Day' },
  { value: 'night', name: 'Night' },
  { value: 'paper', name: 'Paper' },
  { value: 'automatic', name: 'Automatic' },
]
const UNITS: readonly { value: Units; name: string }[] = [
  { value: 'metric', name: 'mm and g' },
  { value: 'inch', name: 'in and oz' },
]

/** Buttons of one form, which posts without JavaScript and comes back to the page it was sent from. */
export function LookChoice({ look }: { look: Look }) {
  return (
    <form action="/look" method="post" aria-labelledby="look-choice">
      <h2 id="look-choice" className="font-text text-body font-semibold">
        How it looks
      </h2>
      <WayBack />
      <Choices name="theme" label="Theme" choices={THEMES} chosen={look.theme ?? 'automatic'} />
      <Choices name="units" label="Units" choices={UNITS} chosen={look.units} />
      <p className="mt-2 max-w-80 text-note text-soft">
        Paper is for the browsers of reading devices. Automatic follows your system. A cookie keeps the choice.
      </p>
    </form>
  )
}

function Choices({
  name,
  label,
  choices,
  chosen,
}: {
  name: string
  label: string
  choices: readonly { value: string; name: string }[]
  chosen: string
}) {
  return (
    <fieldset className="mt-2">
      <legend className="sr-only">{label}</legend>
      <div className="flex flex-wrap gap-2">
        {choices.map((choice) => (
          <button
            key={choice.value}
            type="submit"
            name={name}
            value={choice.value}
            aria-pressed={chosen === choice.value}
            className="min-h-11 cursor-pointer rounded-card border border-edge bg-transparent px-3.5 text-small text-ink hover:bg-tint aria-pressed:border-shade aria-pressed:bg-shade aria-pressed:font-semibold aria-pressed:text-on-shade"
          >
            {choice.name}
          </button>
        ))}
      </div>
    </fieldset>
  )
}
