import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { groupTies } from '@/lib/method/groups'
import { match, rankByFit } from '@/lib/method/ranking'
import { AIMS } from '@/lib/method/types'
import { anyAnswers, anyDevice } from '@/tests/fixtures/arbitraries'
import { makeAnswers, makeDevice, makeEdition, syntheticEdition } from '@/tests/fixtures/edition'

const DRAWS = { draws: 400 }
const edition = syntheticEdition(16)

describe('the answer to a reader', () => {
  test('the same question on the same edition has the same answer', () => {
    const answers = makeAnswers()
    expect(match(structuredClone(edition), structuredClone(answers))).toEqual(match(edition, answers))
  })

  test('the order is by fit, and equal fits by slug', () => {
    const twins = makeEdition(['b', 'c', 'a'].map((slug) => makeDevice({ slug })))
    expect(rankByFit(twins, makeAnswers()).ranked.map(({ slug }) => slug)).toEqual(['a', 'b', 'c'])
    const fits = rankByFit(edition, makeAnswers()).ranked.map(({ fit }) => fit)
    expect(fits).toEqual([...fits].sort((one, other) => other - one))
  })

  test('with draws it ranks as without, and adds the doubt', () => {
    const answers = makeAnswers()
    const { ranked, ...rest } = rankByFit(edition, answers)
    const answer = match(edition, answers, DRAWS)
    expect(answer).toMatchObject(rest)
    for (const [i, device] of answer.ranked.entries()) {
      expect(device).toMatchObject(ranked[i]!)
      expect(device.sd).toBeGreaterThan(0)
      expect(device.rank95[0]).toBeLessThanOrEqual(device.rank95[1])
      expect(device.tiedWith).not.toContain(device.slug)
    }
    expect(answer.ranked.reduce((sum, { first }) => sum + first, 0)).toBeCloseTo(1, 9)
  })

  test('ties are mutual and listed in ranked order', () => {
    const { ranked } = match(edition, makeAnswers(), DRAWS)
    const order = ranked.map(({ slug }) => slug)
    expect(ranked.some(({ tiedWith }) => tiedWith.length > 0)).toBe(true)
    for (const { slug, tiedWith } of ranked) {
      expect(tiedWith).toEqual(order.filter((other) => tiedWith.includes(other)))
      for (const other of tiedWith) expect(ranked.find((one) => one.slug === other)!.tiedWith).toContain(slug)
    }
  })

  test('two devices alike but for their draws are too close to call', () => {
    const { ranked } = match(makeEdition([makeDevice({ slug: 'a' }), makeDevice({ slug: 'b' })]), makeAnswers())
    expect(ranked.map(({ tiedWith }) => tiedWith)).toEqual([['b'], ['a']])
    // Each is first in about half of 4,000 draws: within four standard errors.
    expect(Math.abs(ranked[0]!.first - 0.5)).toBeLessThan(4 * Math.sqrt(0.25 / 4000))
  })

  test('one more device never reorders the others: their fits, and their draws, stay as they were', () => {
    fc.assert(
      fc.property(
        fc.tuple(...['a', 'b', 'c', 'd'].map(anyDevice)),
        anyDevice('newcomer'),
        anyAnswers,
        (devices, newcomer, answers) => {
          const before = match(makeEdition(devices), answers, { draws: 50 })
          const after = match(makeEdition([newcomer, ...devices]), answers, { draws: 50 })
          const others = after.ranked.filter(({ slug }) => slug !== 'newcomer')
          const own = ({
            slug,
            fit,
            sd,
            scores,
            contributions,
            unreadable,
            notStated,
            tiedWith,
          }: (typeof others)[number]) => ({
            slug,
            fit,
            sd,
            scores,
            contributions,
            unreadable,
            notStated,
            tiedWith: tiedWith.filter((other) => other !== 'newcomer'),
          })
          expect(others.map(own)).toEqual(before.ranked.map(own))
        },
      ),
      { numRuns: 100 },
    )
  })

  test('a limit that takes devices away leaves the doubts of the others as they were', () => {
    const free = match(edition, makeAnswers(), DRAWS)
    const limited = match(edition, makeAnswers({ limits: { pen: false } }), DRAWS)
    expect(limited.excluded.length).toBeGreaterThan(0)
    expect(limited.ranked.length).toBeGreaterThan(0)
    for (const { slug, fit, sd } of limited.ranked) {
      expect(free.ranked.find((one) => one.slug === slug)).toMatchObject({ fit, sd })
    }
  })

  test('every answer is numbers that JSON keeps', () => {
    fc.assert(
      fc.property(fc.tuple(...['a', 'b', 'c'].map(anyDevice)), anyAnswers, (devices, answers) => {
        const answer = match(makeEdition(devices), answers, { draws: 30 })
        expect(JSON.parse(JSON.stringify(answer))).toEqual(answer)
      }),
      { numRuns: 200 },
    )
  })

  test('where the limits leave no device, it says so truthfully', () => {
    const answer = match(edition, makeAnswers({ limits: { water: 9, pen: true, maxWeight: 1 } }), DRAWS)
    expect(answer.ranked).toEqual([])
    expect(answer.excluded).toHaveLength(16)
    expect(AIMS.reduce((sum, aim) => sum + answer.weights[aim], 0)).toBeCloseTo(1, 12)
    expect(match(makeEdition([]), makeAnswers()).ranked).toEqual([])
  })

  test('where nothing can be read on any device, all are level in first place and none is ahead', () => {
    // Six sixths do not add up to 1 in binary.
    const dark = Array.from({ length: 6 }, () => ({ lux: 0, hours: 1, frontLight: false }))
    const { ranked, wouldChange } = match(edition, makeAnswers({ spots: dark }), DRAWS)
    for (const device of ranked) {
      expect(device).toMatchObject({ fit: 0, sd: 0, unreadable: 1, rank95: [1, 1] })
      expect(device.first).toBeCloseTo(1 / 16, 12)
      expect(device.tiedWith).toHaveLength(15)
    }
    expect(wouldChange.weights.every(({ to }) => to === null)).toBe(true)
  })

  test('fields not stated are named once, whether the score or a limit asked', () => {
    const device = makeDevice({ slug: 'a', weight: null, frontLight: null, price: null })
    const limits = { maxWeight: 300, frontLight: true, budget: 100, currency: 'GBP' }
    const [only] = rankByFit(makeEdition([device]), makeAnswers({ limits })).ranked
    expect(only!.notStated).toEqual(['frontLight', 'weight', 'price'])
  })

  test.each([0, -1, 1.5, Number.NaN])('%s draws are refused', (draws) => {
    expect(() => match(edition, makeAnswers(), { draws })).toThrow(RangeError)
  })
})

describe('groups too close to call', () => {
  const device = (slug: string, ...tiedWith: string[]) => ({ slug, tiedWith })

  // Method 1, section 6: the highest not yet grouped, and those directly below while each is too close to that first one.
  test('a group ends at the first device that is not too close to its first, whatever comes after', () => {
    const ranked = [
      device('a', 'b', 'd'),
      device('b', 'a', 'c', 'd'),
      device('c', 'b', 'd'),
      device('d', 'a', 'b', 'c'),
      device('e'),
    ]
    expect(groupTies(ranked).map((group) => group.map(({ slug }) => slug))).toEqual([['a', 'b'], ['c', 'd'], ['e']])
  })

  test('no devices make no groups', () => {
    expect(groupTies([])).toEqual([])
  })
})
