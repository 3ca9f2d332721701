import Link from 'next/link'
import type { ComponentProps } from 'react'
import { variants } from './variants'

/**
 * Primary: the one thing to do in a view. Quiet: anything beside it. Lamp: the primary on a dark band.
 * Step: a square with a sign in it, beside a figure. In a dark band `quiet` and `step` take its colours by themselves.
 */
const button = variants(
  'inline-flex min-h-11 items-center justify-center gap-2 rounded-card border text-body leading-tight font-semibold no-underline cursor-pointer select-none print:hidden ' +
    'disabled:cursor-not-allowed disabled:border-edge disabled:bg-tint disabled:text-soft paper:disabled:border-dashed aria-disabled:border-edge aria-disabled:bg-tint aria-disabled:text-soft',
  {
    primary:
      'border-shade bg-shade px-4.5 py-2.5 text-on-shade not-disabled:hover:border-shade-firm not-disabled:hover:bg-shade-firm',
    quiet:
      'border-shade bg-transparent px-4.5 py-2.5 text-shade not-disabled:hover:bg-tint paper:not-disabled:hover:underline',
    lamp: 'border-brass-lit bg-brass-lit px-5 py-2.5 text-on-brass not-disabled:hover:border-brass-firm not-disabled:hover:bg-brass-firm',
    step: 'size-11 shrink-0 border-edge bg-transparent text-h3 text-shade not-disabled:hover:border-shade not-disabled:hover:bg-tint',
  },
)

type Look = Parameters<typeof button>[0]

export function Button({
  look = 'primary',
  type = 'button',
  className,
  ...rest
}: ComponentProps<'button'> & { look?: Look }) {
  return <button {...rest} type={type} className={button(look, className)} />
}

/** A link that looks like a button: for going somewhere, never for doing something. */
export function ButtonLink({ look = 'primary', className, ...rest }: ComponentProps<typeof Link> & { look?: Look }) {
  return <Link {...rest} className={button(look, className)} />
}
