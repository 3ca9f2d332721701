import type { ReactNode } from 'react'
import { FieldError } from '@/components/ui/field'

export type Choice = { value: string; label: ReactNode; spoken?: string }

/**
 * A short choice with its question to the left where there is room: native radios in a fieldset, side by side in equal
 * columns. The first carries the field's name as its id, so that an error summary reaches it.
 */
export function ChoiceRow({
  name,
  legend,
  hint,
  error,
  choices,
  defaultValue,
}: {
  name: string
  legend: ReactNode
  hint?: ReactNode
  error?: string
  choices: readonly Choice[]
  defaultValue: string | undefined
}) {
  const described = [hint && `${name}-hint`, error && `${name}-error`].filter(Boolean).join(' ') || undefined
  return (
    <fieldset
      aria-describedby={described}
      aria-invalid={error ? true : undefined}
      className={`grid min-w-0 items-center gap-x-6 border-b border-rule py-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1.25fr)] ${error ? 'border-l-4 border-l-stop pl-3' : ''}`}
    >
      <legend className="contents">
        <span className="block pb-1.5 sm:pb-0">
          <span className="block font-semibold">{legend}</span>
          {hint && (
            <span id={`${name}-hint`} className="block text-note text-soft">
              {hint}
            </span>
          )}
          {error && <FieldError id={name}>{error}</FieldError>}
        </span>
      </legend>
      <div className="grid auto-cols-auto grid-flow-col gap-1.5">
        {choices.map(({ value, label, spoken }, i) => (
          <label
            key={value}
            className="flex min-h-11 cursor-pointer flex-col items-center justify-center gap-1 rounded-card border border-edge px-1 py-1.5 text-center text-note leading-tight hover:border-shade has-checked:border-shade has-checked:bg-tint sm:flex-row sm:gap-2 paper:has-checked:outline-2 paper:has-checked:outline-ink"
          >
            <input
              type="radio"
              id={i === 0 ? name : `${name}-${value}`}
              name={name}
              value={value}
              defaultChecked={
                value === (defaultValue ?? (choices.some((choice) => choice.value === '') ? '' : undefined))
              }
              className="size-5 shrink-0"
            />
            <span>
              {label}
              {spoken && <span className="sr-only">{spoken}</span>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  )
}
