'use client'

import { type KeyboardEvent, useRef } from 'react'
import { Button } from '@/components/ui/button'
import { METHOD } from '@/lib/method/constants'
import { plainNumber } from '@/lib/quiz/values'
import { useFormChanged } from '../form-changed'

const MOST = METHOD.light.mostHours.value
/** Four hours a day; more can be typed. */
const SLIDER_MOST = 28
const STEP = 0.5

/**
 * Hours a week: a number field, a slider beside it where there is room, and − and + on a phone. The number field alone
 * belongs to the form; the others write into it.
 */
export function HoursControl({
  name,
  where,
  defaultValue,
  error,
}: {
  name: string
  where: string
  defaultValue: string | undefined
  error: string | undefined
}) {
  const field = useRef<HTMLInputElement>(null)
  const slider = useRef<HTMLInputElement>(null)
  const changed = useFormChanged()
  const opening = defaultValue ?? '0'

  function show(hours: number) {
    const held = Math.min(MOST, Math.max(0, hours))
    if (field.current) field.current.value = String(held)
    if (slider.current) slider.current.value = String(held)
  }
  function move(by: number) {
    show((plainNumber(field.current?.value ?? '') ?? 0) + by)
    changed()
  }
  function onKeyDown(event: KeyboardEvent) {
    const by = event.key === 'ArrowUp' ? STEP : event.key === 'ArrowDown' ? -STEP : 0
    if (by === 0) return
    event.preventDefault()
    move(by)
  }

  return (
    <div className="flex items-center justify-end gap-2 sm:gap-4">
      <Button
        look="step"
        className="sm:hidden noscript:hidden"
        aria-label={`One hour less: ${where}`}
        onClick={() => move(-1)}
      >
        −
      </Button>
      {/* A convenience for the pointer: the field takes the arrow keys, so the slider is no stop of the Tab key. */}
      <input
        ref={slider}
        type="range"
        tabIndex={-1}
        aria-label={`Hours a week by slider: ${where}`}
        min={0}
        max={SLIDER_MOST}
        step={STEP}
        defaultValue={plainNumber(opening) ?? 0}
        onChange={(event) => show(Number(event.target.value))}
        className="hidden h-11 w-38 cursor-pointer sm:block noscript:hidden"
      />
      <label htmlFor={name} className="sr-only">
        Hours a week: {where}
      </label>
      <span className="flex items-center gap-1.5">
        <input
          ref={field}
          id={name}
          name={name}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          defaultValue={opening}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? `${name}-error` : undefined}
          onChange={(event) => {
            if (slider.current) slider.current.value = String(plainNumber(event.target.value) ?? 0)
          }}
          onFocus={(event) => event.target.select()}
          onKeyDown={onKeyDown}
          className="min-h-11 w-12 rounded-card border border-edge bg-sheet px-1 text-center tabular-nums aria-invalid:border-stop aria-invalid:outline aria-invalid:outline-stop"
        />
        <span aria-hidden="true" className="text-soft">
          h
        </span>
      </span>
      <Button
        look="step"
        className="sm:hidden noscript:hidden"
        aria-label={`One hour more: ${where}`}
        onClick={() => move(1)}
      >
        +
      </Button>
    </div>
  )
}
