import { describe, expect, test } from 'vitest'
import { clarityScore, tintScore, WHITENESS_DIM, WHITENESS_SPAN, whitenessScore, whiteOf } from '@/lib/method/criteria'
import { handlingScore, handlingWish, trapezoid } from '@/lib/method/handling'

describe('whiteness and tint of a page', () => {
  // By hand from CIE 15 and ISO/CIE 11664-4: on the achromatic axis W = Y but for the white's rounding to four digits,
  // Y(80) = 100·(96/116)³ = 56.681. Dim page: f = 66/116, X = 94.811·(f − 0.006)³ = 16.91803, Y = 18.41865,
  // Z = 107.304·(f − 0.025)³ = 17.28108; x = 0.321498, y = 0.350011; W = 18.41865 − 6.15863 − 32.31850.
  test('the reference pages have the whiteness worked by hand', () => {
    expect(WHITENESS_DIM + WHITENESS_SPAN).toBeCloseTo(56.681, 1)
    const f = 66 / 116
    const [X, Y, Z] = [94.811 * (f - 3 / 500) ** 3, 100 * f ** 3, 107.304 * (f - 5 / 200) ** 3]
    const total = X + Y + Z
    expect(WHITENESS_DIM).toBeCloseTo(Y + 800 * (0.3138 - X / total) + 1700 * (0.331 - Y / total), 9)
  })

  test('the bright page scores 1 and the dim page 0', () => {
    expect(whitenessScore({ L: 80, a: 0, b: 0 }, whiteOf('neutral'))).toBeCloseTo(1, 9)
    expect(whitenessScore({ L: 50, a: -3, b: 5 }, whiteOf('neutral'))).toBeCloseTo(0, 9)
  })

  test('a page earns nothing for being bluer than the white its reader wants', () => {
    const white = whiteOf('cool')
    expect(whitenessScore({ L: 70, a: 0, b: -6 }, white)).toBe(whitenessScore({ L: 70, a: 0, b: -3 }, white))
    expect(whitenessScore({ L: 70, a: 0, b: -2 }, white)).toBeLessThan(whitenessScore({ L: 70, a: 0, b: -3 }, white))
  })

  test('a reader of warm pages finds the white of a warm page as white as another a neutral one', () => {
    expect(whitenessScore({ L: 70, a: 0, b: 4 }, whiteOf('warm'))).toBe(
      whitenessScore({ L: 70, a: 0, b: 0 }, whiteOf('neutral')),
    )
  })

  // √(3² + 4²) = 5, so 1 − 5/6; then 6 and more away.
  test.each([
    { a: 0, b: 0, score: 1 },
    { a: -3, b: 4, score: 1 / 6 },
    { a: 6, b: 0, score: 0 },
    { a: 20, b: -20, score: 0 },
  ])('tint of a page at a* $a, b* $b', ({ a, b, score }) => {
    expect(tintScore({ a, b }, whiteOf('neutral'))).toBeCloseTo(score, 12)
  })
})

describe('clarity', () => {
  test.each([
    { name: 'half way', gain: 0.25, span: 0.5, score: 0.5 },
    { name: 'beyond the bright page', gain: 0.7, span: 0.5, score: 1 },
    { name: 'below the dim page', gain: -0.1, span: 0.5, score: 0 },
    { name: 'where the references read alike, no worse than they', gain: 0, span: 0, score: 1 },
    { name: 'where the references read alike, a hair worse', gain: -1e-6, span: 9e-7, score: 1 },
    { name: 'where the references read alike, worse', gain: -1.1e-6, span: 0, score: 0 },
  ])('$name', ({ gain, span, score }) => {
    expect(clarityScore(gain, span)).toBe(score)
  })
})

describe('handling', () => {
  const novels = handlingWish({ novels: 1 }, 'one-hand')

  // Method 1, section 4: novels 5, 6, 7.8, 10.5.
  test.each([
    { x: 5, score: 0 },
    { x: 5.5, score: 0.5 },
    { x: 6, score: 1 },
    { x: 7.8, score: 1 },
    { x: 9.15, score: 0.5 },
    { x: 10.5, score: 0 },
    { x: 4, score: 0 },
    { x: 16, score: 0 },
  ])('a page of $x inches suits novels to $score', ({ x, score }) => {
    expect(trapezoid(x, [5, 6, 7.8, 10.5])).toBeCloseTo(score, 12)
  })

  // By hand: (1 + 1·(600 − 150)/450 + 0.5·(300 − 150)/150)/(1.5 + 1) = 1; then 375 g and 225 ppi: (1 + 0.5 + 0.25)/2.5.
  test.each([
    { weight: 150, ppi: 300, score: 1 },
    { weight: 375, ppi: 225, score: 0.7 },
    { weight: 90, ppi: 400, score: 1 },
    { weight: 900, ppi: 100, score: 0.4 },
  ])('in one hand, 6 inches, $weight g, $ppi ppi', ({ weight, ppi, score }) => {
    expect(handlingScore({ diagonal: 6, weight, ppi }, novels).score).toBeCloseTo(score, 12)
  })

  test('what is not stated is left out with its weight, and named', () => {
    const { score, notStated } = handlingScore({ diagonal: 6, weight: null, ppi: 225 }, novels)
    expect(score).toBeCloseTo((1 + 0.25) / 1.5, 12)
    expect(notStated).toEqual(['weight'])
  })

  test('on a table weight does not matter, so nobody misses it', () => {
    const { score, notStated } = handlingScore(
      { diagonal: 6, weight: null, ppi: 300 },
      handlingWish({ novels: 2 }, 'table'),
    )
    expect(score).toBe(1)
    expect(notStated).toEqual([])
  })

  test('with no kind of reading given, size is left out', () => {
    const { score, notStated } = handlingScore({ diagonal: null, weight: 600, ppi: 300 }, handlingWish({}, 'two-hands'))
    expect(score).toBeCloseTo(0.5, 12)
    expect(notStated).toEqual([])
  })

  test('with nothing known handling is 0', () => {
    const { score, notStated } = handlingScore({ diagonal: null, weight: null, ppi: null }, novels)
    expect(score).toBe(0)
    expect(notStated).toEqual(['diagonal', 'weight', 'ppi'])
  })

  // At 10 in novels score (10.5 − 10)/2.7 and documents 1: three parts to one.
  test('kinds of reading count by their share', () => {
    const wish = handlingWish({ novels: 3, documents: 1, comics: 0 }, 'table')
    const { score } = handlingScore({ diagonal: 10, weight: null, ppi: null }, wish)
    expect(score).toBeCloseTo(0.75 * (0.5 / 2.7) + 0.25, 12)
  })
})
