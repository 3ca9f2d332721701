import { type Box, overlaps } from './boxes'
import { LINE_PX, textWidth } from './text-width'

/** Words above a mark: x their left edge, `at` the mark's middle, `line` counted upwards from the marks, y a baseline. */
export type PlacedLabel = { slug: string; text: string; at: number; x: number; line: number; y: number }

type Wanted = { slug: string; text: string; at: number }
type Candidate = { x: number; line: number; box: Box; cost: number }

const LINES = 4
/** px between the leader at the mark's middle and the words beside it. */
const BESIDE_PX = 5

/**
 * Places the words of a few marks above them so that none touches another, leaves the bounds, or is crossed by another's
 * leader if that can be helped, on as few lines as may be. Every combination is tried: the marks are three at most.
 * @returns `y` as 0: whoever knows the axis sets it
 */
export function placeLabels(wanted: readonly Wanted[], bounds: { left: number; right: number }): PlacedLabel[] {
  const choices = wanted.map((label) => candidatesFor(label, bounds))
  let best: { cost: number; chosen: Candidate[] } = { cost: Infinity, chosen: [] }

  function search(chosen: Candidate[], cost: number) {
    if (cost >= best.cost) return
    const next = choices[chosen.length]
    if (!next) {
      best = { cost, chosen }
      return
    }
    for (const candidate of next) {
      const more = chosen.reduce((sum, other, i) => sum + clash(candidate, wanted[chosen.length], other, wanted[i]), 0)
      search([...chosen, candidate], cost + candidate.cost + more)
    }
  }

  search([], 0)
  return best.chosen.flatMap((candidate, i) => {
    const label = wanted[i]
    return label ? [{ ...label, x: candidate.x, line: candidate.line, y: 0 }] : []
  })
}

function candidatesFor({ text, at }: Wanted, { left, right }: { left: number; right: number }): Candidate[] {
  const width = textWidth(text)
  const over = Math.max(left, Math.min(right - width, at - width / 2))
  const sides = [
    { x: at + BESIDE_PX, cost: 0 },
    { x: at - BESIDE_PX - width, cost: 0.1 },
    { x: over, cost: 0.5 },
  ].filter(({ x }) => (x >= left && x + width <= right) || x === over)
  return Array.from({ length: LINES }, (_, line) => line).flatMap((line) =>
    sides.map(({ x, cost }) => ({
      x,
      line,
      cost: cost + 2 * line,
      box: { x, y: -(line + 1) * LINE_PX, width, height: LINE_PX },
    })),
  )
}

/** What it costs to have two labels so: no price is right for words on words; a crossed word is only unpleasant. */
function clash(one: Candidate, oneLabel: Wanted | undefined, two: Candidate, twoLabel: Wanted | undefined): number {
  if (one.line === two.line) {
    if (overlaps(one.box, two.box, 6)) return 1000
    // In a wider drawing the marks move apart and take their words along: words in another order would meet.
    if (oneLabel && twoLabel && Math.sign(oneLabel.at - twoLabel.at) === Math.sign(two.x - one.x)) return 1000
  }
  const crossed =
    (oneLabel && one.line > two.line && runsThrough(oneLabel.at, two.box)) ||
    (twoLabel && two.line > one.line && runsThrough(twoLabel.at, one.box))
  return crossed ? 20 : 0
}

function runsThrough(x: number, { x: left, width }: Box): boolean {
  return x > left - 3 && x < left + width + 3
}
