/** A rectangle in px, y downwards. */
export type Box = { x: number; y: number; width: number; height: number }

/** Whether two rectangles share any area, or come nearer to each other than `gap`. */
export function overlaps(one: Box, other: Box, gap = 0): boolean {
  return (
    one.x < other.x + other.width + gap &&
    other.x < one.x + one.width + gap &&
    one.y < other.y + other.height + gap &&
    other.y < one.y + one.height + gap
  )
}

/** Whether the first lies wholly in the second. */
export function within(inner: Box, outer: Box): boolean {
  return (
    inner.x >= outer.x &&
    inner.y >= outer.y &&
    inner.x + inner.width <= outer.x + outer.width &&
    inner.y + inner.height <= outer.y + outer.height
  )
}

/** A length as a share of the drawing's, so that what was laid out for its least width stretches with it. */
export function percent(part: number, whole: number): string {
  return `${Math.round((10_000 * part) / whole) / 100}%`
}
