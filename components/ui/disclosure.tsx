import type { ComponentProps, ReactNode } from 'react'

/** Something one may open: native, so it works without JavaScript and the browser's search finds what is inside. */
export function Disclosure({
  summary,
  className = '',
  children,
  ...rest
}: Omit<ComponentProps<'details'>, 'summary'> & { summary: ReactNode }) {
  return (
    <details {...rest} className={`group/disclosure ${className}`}>
      <summary className="inline-flex min-h-11 cursor-pointer list-none items-center gap-2 text-link underline decoration-1 underline-offset-3 hover:decoration-2 [&::-webkit-details-marker]:hidden">
        <svg
          aria-hidden="true"
          viewBox="0 0 8 12"
          className="h-3 w-2 shrink-0 fill-none stroke-current stroke-2 group-open/disclosure:rotate-90"
        >
          <path d="M1.5 1l5 5-5 5" />
        </svg>
        {summary}
      </summary>
      {children}
    </details>
  )
}
