import type { ComponentProps, ReactNode } from 'react'
import { describedBy, FieldError, firstError, Hint } from './field'

export type RadioOption = { value: string; label: ReactNode; hint?: ReactNode; disabled?: boolean }

/**
 * One choice among a few, all of them in view: native radios in a fieldset. Controlled by `value` with `onChange`, or
 * left to the form with `defaultValue`. The first radio carries the name as its id, so that an error summary reaches it.
 * @param layout `row` puts short choices side by side where there is room
 */
export function RadioGroup({
  name,
  id = name,
  legend,
  hint,
  error,
  options,
  value,
  defaultValue,
  layout = 'stack',
  className = '',
  legendClassName = 'font-semibold',
  ...rest
}: {
  name: string
  id?: string
  legend: ReactNode
  hint?: ReactNode
  error?: string | readonly string[]
  options: readonly RadioOption[]
  value?: string | null
  defaultValue?: string
  layout?: 'stack' | 'row'
  className?: string
  legendClassName?: string
} & Omit<ComponentProps<'input'>, 'name' | 'id' | 'value' | 'defaultValue' | 'type' | 'className' | 'checked'>) {
  const message = firstError(error)
  const checked = (option: string) =>
    value === undefined ? { defaultChecked: option === defaultValue } : { checked: option === value }
  return (
    <fieldset
      aria-describedby={describedBy(id, { hint, error: message })}
      aria-invalid={message ? true : undefined}
      className={`min-w-0 ${message ? 'border-l-4 border-stop pl-3' : ''} ${className}`}
    >
      <legend className={legendClassName}>{legend}</legend>
      {hint && <Hint id={id}>{hint}</Hint>}
      {message && <FieldError id={id}>{message}</FieldError>}
      <div className={layout === 'row' ? 'mt-2 flex flex-wrap gap-2' : 'mt-2 grid gap-2'}>
        {options.map((option, i) => (
          <label
            key={option.value}
            className="flex min-h-11 cursor-pointer items-center gap-3 rounded-card border border-edge bg-sheet px-3.5 py-2 hover:border-shade has-checked:border-shade has-checked:bg-tint has-disabled:cursor-not-allowed has-disabled:text-soft paper:has-checked:outline-2 paper:has-checked:outline-ink"
          >
            <input
              {...rest}
              {...checked(option.value)}
              type="radio"
              id={i === 0 ? id : `${id}-${option.value}`}
              name={name}
              value={option.value}
              disabled={option.disabled || rest.disabled}
              aria-describedby={option.hint ? `${id}-${option.value}-hint` : undefined}
              className="size-5 shrink-0"
            />
            <span>
              {option.label}
              {option.hint && <Hint id={`${id}-${option.value}`}>{option.hint}</Hint>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  )
}
