import type { Theme } from '@/lib/theme'
import { WayBack } from './way-back'

const CHOICES: readonly { value: Theme | 'automatic'; name: string }[] = [
  { value: 'day', name: 'Day' },
  { value: 'night', name: 'Night' },
  { value: 'paper', name: 'Paper' },
  { value: 'automatic', name: 'Automatic' },
]

/** Four buttons of one form, which posts without JavaScript and comes back to the page it was sent from. */
export function ThemeChoice({ theme }: { theme: Theme | null }) {
  return (
    <form action="/theme" method="post" aria-labelledby="theme-choice">
      <h2 id="theme-choice" className="font-text text-body font-semibold">
        How it looks
      </h2>
      <WayBack />
      <div className="mt-2 flex flex-wrap gap-2">
        {CHOICES.map(({ value, name }) => (
          <button
            key={value}
            type="submit"
            name="theme"
            value={value}
            aria-pressed={(theme ?? 'automatic') === value}
            className="min-h-11 cursor-pointer rounded-card border border-edge bg-transparent px-3.5 text-small text-ink hover:bg-tint aria-pressed:border-shade aria-pressed:bg-shade aria-pressed:font-semibold aria-pressed:text-on-shade"
          >
            {name}
          </button>
        ))}
      </div>
      <p className="mt-2 max-w-80 text-note text-soft">
        Paper is for the browsers of reading devices. Automatic follows your system. A cookie keeps the choice.
      </p>
    </form>
  )
}
