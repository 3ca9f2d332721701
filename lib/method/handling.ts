import { METHOD } from './constants'
import { clamp } from './light'
import type { Answers, EditionDevice, Hold, ReadingKind } from './types'

const H = METHOD.handling

export type HandlingWish = { shares: { kind: ReadingKind; share: number }[]; hold: number }

/** Shares of each kind of reading by their sum, and the weight of lightness in the hand. */
export function handlingWish(reads: Answers['reads'], hold: Hold): HandlingWish {
  const kinds = (Object.entries(reads) as [ReadingKind, number][]).filter(([, amount]) => amount > 0)
  // By the largest first: amounts may be so large that their sum is not a number any more.
  const largest = Math.max(...kinds.map(([, amount]) => amount))
  const total = kinds.reduce((sum, [, amount]) => sum + amount / largest, 0)
  const shares = kinds.map(([kind, amount]) => ({ kind, share: amount / largest / total }))
  return { shares, hold: H.hold.value[hold] }
}

/** 0 at and outside the outer numbers, 1 between the inner ones, straight between. */
export function trapezoid(x: number, [from, full, until, to]: readonly [number, number, number, number]): number {
  return clamp(Math.min((x - from) / (full - from), (to - x) / (to - until)))
}

/**
 * Handling, 0–1: size for what one reads, weight in the hand, resolution. A term that is not stated is left out with
 * its weight and named; with nothing known the score is 0.
 */
export function handlingScore(
  device: Pick<EditionDevice, 'diagonal' | 'weight' | 'ppi'>,
  wish: HandlingWish,
): { score: number; notStated: string[] } {
  const terms = [
    {
      field: 'diagonal',
      share: wish.shares.length > 0 ? H.sizeShare.value : 0,
      score: device.diagonal === null ? null : sizeScore(device.diagonal, wish),
    },
    {
      field: 'weight',
      share: wish.hold,
      score: device.weight === null ? null : clamp((H.heaviest.value - device.weight) / H.weightSpan.value),
    },
    {
      field: 'ppi',
      share: H.resolutionShare.value,
      score: device.ppi === null ? null : clamp((device.ppi - H.coarsest.value) / H.resolutionSpan.value),
    },
  ].filter((term) => term.share > 0)

  let points = 0
  let shares = 0
  for (const { share, score } of terms) {
    if (score === null) continue
    points += share * score
    shares += share
  }
  return {
    score: shares > 0 ? clamp(points / shares) : 0,
    notStated: terms.filter((term) => term.score === null).map((term) => term.field),
  }
}

function sizeScore(diagonal: number, { shares }: HandlingWish): number {
  return shares.reduce((sum, { kind, share }) => sum + share * trapezoid(diagonal, H.sizes.value[kind]), 0)
}
