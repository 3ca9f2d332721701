import type { ComponentProps, ReactNode } from 'react'

/** What ties a control to its words: pass it on to the native element. */
export type ControlProps = { id: string; name: string; 'aria-describedby'?: string; 'aria-invalid'?: true }

type Words = {
  name: string
  label: ReactNode
  /** Unless given, the name: an error summary links to it. */
  id?: string
  hint?: ReactNode
  /** The first is shown; an empty list is no error. */
  error?: string | readonly string[]
}

/** The first of a field's errors. */
export function firstError(error: Words['error']): string | undefined {
  return typeof error === 'string' ? error || undefined : error?.[0]
}

/** The hint's and the error's id, for `aria-describedby`; undefined where there is neither. */
export function describedBy(id: string, { hint, error, also }: { hint: unknown; error: unknown; also?: string }) {
  return [also, hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ') || undefined
}

export function Hint({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={`${id}-hint`} className="text-note text-soft">
      {children}
    </p>
  )
}

export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={`${id}-error`} className="text-small font-semibold text-stop">
      <span className="sr-only">Error: </span>
      {children}
    </p>
  )
}

/** A control with its label above it, its hint, and its error tied to it by `aria-describedby`. */
export function Field({
  name,
  label,
  id = name,
  hint,
  error,
  className = '',
  describedByAlso,
  children,
}: Words & { className?: string; describedByAlso?: string; children: (control: ControlProps) => ReactNode }) {
  const message = firstError(error)
  return (
    <div className={`grid content-start gap-1 ${message ? 'border-l-4 border-stop pl-3' : ''} ${className}`}>
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint && <Hint id={id}>{hint}</Hint>}
      {message && <FieldError id={id}>{message}</FieldError>}
      {children({
        id,
        name,
        'aria-describedby': describedBy(id, { hint, error: message, also: describedByAlso }),
        'aria-invalid': message ? true : undefined,
      })}
    </div>
  )
}

const box =
  'min-h-11 w-full rounded-card border border-edge bg-sheet px-3 py-2 text-body text-ink placeholder:text-faint aria-invalid:border-stop aria-invalid:outline aria-invalid:outline-stop disabled:bg-tint disabled:text-soft disabled:cursor-not-allowed'

type Native<Element extends 'input' | 'select'> = Omit<ComponentProps<Element>, 'name' | 'id'>

export function TextField({ name, label, id, hint, error, className, ...rest }: Words & Native<'input'>) {
  return (
    <Field {...{ name, label, id, hint, error, className }}>
      {(control) => <input type="text" {...rest} {...control} className={box} />}
    </Field>
  )
}

/**
 * A number with its unit behind it, or before it as currencies stand. A text box with a numeric keyboard: a native number box swallows what it does not
 * understand, and turns when the wheel passes over it. `type="number"` may be asked for.
 * @param unit as shown, "lux"; `unitName` as read out where the unit is a sign, "pounds"
 */
export function NumberField({
  name,
  label,
  id,
  hint,
  error,
  className,
  unit,
  unitName = unit,
  unitFirst = false,
  ...rest
}: Words & Native<'input'> & { unit?: string; unitName?: string; unitFirst?: boolean }) {
  return (
    <Field
      {...{ name, id, hint, error, className }}
      label={
        <>
          {label}
          {unitName && <span className="sr-only">, {unitName}</span>}
        </>
      }
    >
      {(control) => (
        <span className={`flex items-center gap-2 ${unitFirst ? '' : 'flex-row-reverse justify-end'}`}>
          {unit && (
            <span aria-hidden="true" className="text-soft">
              {unit}
            </span>
          )}
          <input
            type="text"
            inputMode="decimal"
            autoComplete="off"
            {...rest}
            {...control}
            className={`${box} max-w-32 tabular-nums`}
          />
        </span>
      )}
    </Field>
  )
}

export function SelectField({
  name,
  label,
  id,
  hint,
  error,
  className,
  options,
  ...rest
}: Words &
  Omit<Native<'select'>, 'children'> & { options: readonly { value: string; label: string; disabled?: boolean }[] }) {
  return (
    <Field {...{ name, label, id, hint, error, className }}>
      {(control) => (
        <span className="relative block">
          <select {...rest} {...control} className={`${box} appearance-none pr-10`}>
            {options.map((option) => (
              <option key={option.value} {...option} />
            ))}
          </select>
          <svg
            aria-hidden="true"
            viewBox="0 0 12 8"
            className="pointer-events-none absolute top-1/2 right-3.5 h-2 w-3 -translate-y-1/2 fill-none stroke-ink stroke-2"
          >
            <path d="M1 1l5 5 5-5" />
          </svg>
        </span>
      )}
    </Field>
  )
}

/** One box to tick, with its words to the right; the whole line is the target. */
export function CheckboxField({
  name,
  label,
  id = name,
  hint,
  error,
  className = '',
  ...rest
}: Words & Native<'input'>) {
  const message = firstError(error)
  return (
    <div className={`grid ${message ? 'border-l-4 border-stop pl-3' : ''} ${className}`}>
      {message && <FieldError id={id}>{message}</FieldError>}
      <label className="flex min-h-11 cursor-pointer items-center gap-3 py-2 has-disabled:cursor-not-allowed has-disabled:text-soft">
        <input
          type="checkbox"
          {...rest}
          id={id}
          name={name}
          aria-describedby={describedBy(id, { hint, error: message })}
          aria-invalid={message ? true : undefined}
          className="size-6 shrink-0"
        />
        <span>{label}</span>
      </label>
      {hint && (
        <div className="-mt-1.5 pb-1 pl-9">
          <Hint id={id}>{hint}</Hint>
        </div>
      )}
    </div>
  )
}
