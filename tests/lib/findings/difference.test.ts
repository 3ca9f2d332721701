import { expect, test } from 'vitest'
import { differenceDoubt, type Measured, withinDoubt } from '@/lib/findings/difference'

const edition = { uncertainty: { common: { L: 5, a: 5, b: 5 }, session: { L: 0.2, a: 0.1, b: 0.1 } } }
const lightness = ({ page }: { page: { L: number } }) => page.L

function measured(slug: string, L: number, u: number, sessions: Record<string, number>): Measured {
  const state = { a: 0, b: 0, u: { L: u, a: 0.1, b: 0.1 } }
  return { slug, page: { ...state, L }, ink: { ...state, L: 22 }, sessions }
}

// Method 1, section 1: for a difference of two devices the common part, and the session part where shared, drop out.
// The closed form for one channel is U = 2·√(u₁² + u₂² + s_session²·Σ (share₁ − share₂)²).
test('the doubt of a difference leaves out what two devices share', () => {
  const one = measured('one', 72, 0.3, { s1: 1 })
  const same = measured('same', 73, 0.4, { s1: 1 })
  const other = measured('other', 73, 0.4, { s1: 0.5, s2: 0.5 })
  expect(differenceDoubt(edition, one, same, lightness)).toBeCloseTo(2 * 0.5, 9)
  expect(differenceDoubt(edition, one, other, lightness)).toBeCloseTo(2 * Math.sqrt(0.25 + 0.04 * 0.5), 9)
})

test('two figures are within the doubt up to the doubt itself, however large the part they share', () => {
  const one = measured('one', 72, 0.3, { s1: 1 })
  expect(withinDoubt(edition, one, measured('near', 72.99, 0.4, { s1: 1 }), lightness)).toBe(true)
  expect(withinDoubt(edition, one, measured('far', 73.01, 0.4, { s1: 1 }), lightness)).toBe(false)
})
