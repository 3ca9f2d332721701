'use client'

import { type FormEvent, type ReactNode, useState } from 'react'
import { formatExact, formatLux, THIN_SPACE } from '@/lib/format/number'
import { LAST_STEP, LEVELS, luxAt, nearestLevel, parseLux, stepOf } from '@/lib/lamp/levels'
import styles from './light-control.module.css'
import { Button } from './ui/button'

/**
 * Sets the lamp's light three ways: a slider, a number of lux, and lights people know. Each works without JavaScript,
 * as a form or a link to the same page with `?lux=` or `?step=`.
 * @param action the page's path
 * @param kept what else its address holds, sent along by the forms
 * @param hrefFor the page in another light
 * @param children what the light means, in words, beside the number
 */
export function LightControl({
  action,
  kept = [],
  lux,
  hrefFor,
  onChange,
  children,
}: {
  action: string
  kept?: readonly (readonly [name: string, text: string])[]
  lux: number
  hrefFor: (lux: number) => string
  onChange: (lux: number) => void
  children: ReactNode
}) {
  const [typed, setTyped] = useState<string | null>(null)
  const [refused, setRefused] = useState(false)
  const { name } = nearestLevel(lux)

  function set(next: number) {
    setTyped(null)
    setRefused(false)
    onChange(next)
  }
  function setTypedLux(event: FormEvent) {
    event.preventDefault()
    const next = parseLux(typed ?? formatExact(lux))
    if (next === null) setRefused(true)
    else set(next)
  }

  const [darkest, ...between] = LEVELS
  const brightest = between.pop() ?? darkest
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        {children}
        <form action={action} onSubmit={setTypedLux} className="flex flex-wrap items-center gap-2 text-small">
          <Kept pairs={kept} />
          <label htmlFor="light-lux">Lux</label>
          <input
            id="light-lux"
            name="lux"
            type="text"
            inputMode="decimal"
            autoComplete="off"
            value={typed ?? formatExact(lux)}
            onChange={(event) => setTyped(event.target.value)}
            aria-invalid={refused || undefined}
            aria-describedby={refused ? 'light-lux-error' : undefined}
            className="min-h-11 w-22 rounded-card border border-edge bg-sheet px-3 tabular-nums"
          />
          <Button type="submit" look="quiet">
            Set
          </Button>
          {refused && (
            <span id="light-lux-error" role="alert">
              Give a number from 0.1 to 80,000{THIN_SPACE}lux.
            </span>
          )}
        </form>
      </div>
      <form
        action={action}
        className="flex flex-wrap items-center gap-x-4"
        onSubmit={(event) => event.preventDefault()}
        aria-label="Light on the page"
      >
        <Kept pairs={kept} />
        <LevelLink level={darkest} lux={lux} hrefFor={hrefFor} onSet={set} />
        <input
          name="step"
          type="range"
          min={0}
          max={LAST_STEP}
          value={stepOf(lux)}
          onChange={(event) => set(luxAt(Number(event.target.value)))}
          aria-label="Light on the page"
          aria-valuetext={`${name}, about ${formatLux(lux)} lux`}
          className={`${styles.slider} h-11 min-w-32 flex-1 cursor-pointer rounded-card paper:[--slider-track:#000]`}
        />
        <LevelLink level={brightest} lux={lux} hrefFor={hrefFor} onSet={set} />
        <noscript>
          <Button type="submit" look="quiet">
            Show this light
          </Button>
        </noscript>
      </form>

      <ul className="flex flex-wrap gap-x-5" aria-label="Lights people know">
        {between.map((level) => (
          <li key={level.lux}>
            <LevelLink level={level} lux={lux} hrefFor={hrefFor} onSet={set} />
          </li>
        ))}
      </ul>
    </div>
  )
}

/** A light people know, as a link to this page in that light; with JavaScript it turns the lamp where one is. */
function LevelLink({
  level,
  lux,
  hrefFor,
  onSet,
}: {
  level: (typeof LEVELS)[number]
  lux: number
  hrefFor: (lux: number) => string
  onSet: (lux: number) => void
}) {
  return (
    <a
      href={hrefFor(level.lux)}
      aria-current={level.lux === lux ? 'true' : undefined}
      onClick={(event) => {
        if (event.metaKey || event.ctrlKey || event.shiftKey) return
        event.preventDefault()
        onSet(level.lux)
      }}
      className="inline-flex min-h-11 items-center text-small aria-[current]:font-semibold aria-[current]:no-underline sm:min-h-8"
    >
      {level.name}
    </a>
  )
}

/** The rest of the address, for forms that would otherwise lose it. */
export function Kept({ pairs }: { pairs: readonly (readonly [name: string, text: string])[] }) {
  return pairs.map(([name, text]) => <input key={name} type="hidden" name={name} value={text} />)
}
