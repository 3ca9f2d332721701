import { type ReactNode, useId } from 'react'

/** Not one picture but a group of them: its marks can be reached one by one. */
const GROUP = { role: 'group' } as const

/**
 * The `<svg>` of a chart, as wide as its container: x are shares of the width, so its words keep their size.
 * @param height px; or, where the drawing keeps its shape, `ratio` of width to height, and y are shares too
 */
export function Drawing({
  title,
  desc,
  height,
  ratio,
  className,
  children,
}: {
  title: string
  desc: string
  height?: number
  ratio?: number
  className?: string
  children: ReactNode
}) {
  const id = useId()
  return (
    <svg
      {...GROUP}
      data-drawing
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-desc`}
      width="100%"
      className={className}
      height={height}
      style={ratio ? { aspectRatio: ratio } : undefined}
    >
      <title id={`${id}-title`}>{title}</title>
      <desc id={`${id}-desc`}>{desc}</desc>
      {children}
    </svg>
  )
}
