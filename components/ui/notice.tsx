import type { ComponentProps } from 'react'
import { variants } from './variants'

const notice = variants('border-l-4 px-4 py-3 paper:border-2 paper:border-l-8', {
  info: 'border-shade bg-tint text-ink',
  warning: 'border-brass-deep bg-brass-pale text-brass-deep',
  error: 'border-stop bg-stop-pale text-stop',
})

/** A few words set apart from the run of the page. Pass `role="status"` where it appears while one looks. */
export function Notice({
  look = 'info',
  className,
  ...rest
}: ComponentProps<'div'> & { look?: Parameters<typeof notice>[0] }) {
  return <div {...rest} className={notice(look, className)} />
}
