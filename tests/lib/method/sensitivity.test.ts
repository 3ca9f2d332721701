import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { prepareAnswers } from '@/lib/method/fit'
import { changeByHours } from '@/lib/method/hours-change'
import { match, rankByFit } from '@/lib/method/ranking'
import { AIMS, type Answers, type Edition, type Spot } from '@/lib/method/types'
import { anyAnswers, plausibleDevice } from '@/tests/fixtures/arbitraries'
import { makeAnswers, makeDevice, makeEdition, syntheticEdition } from '@/tests/fixtures/edition'

const DRAWS = { draws: 200 }
const LEAD = 1e-9

const moved = (spots: Spot[], from: number, to: number, hours: number) =>
  spots.map((spot, i) => ({ ...spot, hours: spot.hours + (i === to ? hours : 0) - (i === from ? hours : 0) }))

/** The method's words by brute force: every pair, every half hour, the whole ranking each time. */
function changeByTrying(edition: Edition, answers: Answers) {
  const leader = rankByFit(edition, answers).ranked[0]!.slug
  const { spots } = answers
  const most = Math.max(...spots.map((spot) => spot.hours))
  for (let hours = 0.5; hours <= most; hours += 0.5) {
    for (let from = 0; from < spots.length; from++) {
      for (let to = 0; to < spots.length; to++) {
        if (from === to || spots[from]!.hours < hours || spots[to]!.hours === 0) continue
        if (spots[to]!.hours + hours > 168) continue
        const { ranked } = rankByFit(edition, { ...answers, spots: moved(spots, from, to, hours) })
        const toBeat = ranked.find(({ slug }) => slug === leader)!.fit
        if (ranked[0]!.fit > toBeat + LEAD) return { from, to, hours, first: ranked[0]!.slug }
      }
    }
  }
  return null
}

function changeOf(edition: Edition, answers: Answers) {
  const bySlug = new Map(edition.devices.map((device) => [device.slug, device]))
  const devices = rankByFit(edition, answers).ranked.map(({ slug }) => bySlug.get(slug)!)
  return changeByHours(prepareAnswers(answers), devices)
}

describe('hours that would change first place', () => {
  test('are what trying every move with whole rankings finds', () => {
    const devices = ['a', 'b', 'c', 'd', 'e'].map(plausibleDevice)
    const hours = fc.constantFrom(0, 0.5, 1, 2, 3.5, 5, 8)
    const spot = fc.record({ lux: fc.constantFrom(0.1, 5, 30, 80, 200, 1000, 80_000), hours, frontLight: fc.boolean() })
    const spots = fc.array(spot, { minLength: 2, maxLength: 4 }).filter((all) => all.some((one) => one.hours > 0))
    let changes = 0
    fc.assert(
      fc.property(fc.tuple(...devices), anyAnswers, spots, (devices, answers, spots) => {
        const edition = makeEdition(devices)
        const expected = changeByTrying(edition, { ...answers, spots })
        expect(changeOf(edition, { ...answers, spots })).toEqual(expected)
        if (expected) changes++
      }),
      // Trying every move is too slow to look for a simpler failure too.
      { numRuns: 150, endOnFailure: true },
    )
    expect(changes).toBeGreaterThan(10)
  })

  test('keep every spot within a week, and point at the request’s spots past those of 0 hours', () => {
    const edition = makeEdition([
      makeDevice({ slug: 'lit', page: { L: 62, a: -1, b: 1, u: { L: 0, a: 0, b: 0 } } }),
      makeDevice({ slug: 'pale', frontLight: false, page: { L: 76, a: -1, b: 1, u: { L: 0, a: 0, b: 0 } } }),
    ])
    const dark = { lux: 0.1, frontLight: true }
    const bright = { lux: 100, frontLight: false }
    const spots = [
      { ...bright, hours: 0 },
      { ...bright, hours: 20 },
      { ...dark, hours: 0 },
      { ...dark, hours: 1 },
    ]
    const answers = makeAnswers({ spots })
    expect(rankByFit(edition, answers).ranked[0]!.slug).toBe('pale')
    const change = changeOf(edition, answers)
    expect(change).toMatchObject({ from: 1, to: 3, first: 'lit' })
    expect(change).toEqual(changeByTrying(edition, answers))
    // Weights set by hand stay as they are while the hours move.
    const byHand = { ...answers, weights: { clarity: 1, whiteness: 6, tint: 0, handling: 1 } }
    expect(changeOf(edition, byHand)).not.toBeNull()
    expect(changeOf(edition, byHand)).toEqual(changeByTrying(edition, byHand))
    // Eight more hours in the dark would be a whole week of it, and they are too few.
    const weeks = [{ ...dark, hours: 160 }, ...Array.from({ length: 10 }, () => ({ ...bright, hours: 168 }))]
    expect(changeOf(edition, makeAnswers({ spots: weeks }))).toBeNull()
    expect(
      changeOf(edition, makeAnswers({ spots: weeks.map((spot) => ({ ...spot, hours: spot.hours / 2 })) })),
    ).not.toBeNull()
    // With the dark already a whole week, nothing can be moved there, and the other way is where the pale one leads.
    expect(
      changeOf(
        edition,
        makeAnswers({
          spots: [
            { ...bright, hours: 1 },
            { ...dark, hours: 168 },
          ],
        }),
      ),
    ).toEqual(
      changeByTrying(
        edition,
        makeAnswers({
          spots: [
            { ...bright, hours: 1 },
            { ...dark, hours: 168 },
          ],
        }),
      ),
    )
  })

  test('count for a device that is better in one respect alone, once the light lets that respect count', () => {
    const u = { L: 0, a: 0, b: 0 }
    const lighter = makeDevice({ slug: 'lighter', frontLight: false, page: { L: 74, a: -2.6, b: 1, u } })
    const purer = makeDevice({ slug: 'purer', frontLight: false, page: { L: 69, a: -0.6, b: 1, u } })
    const spots = [
      { lux: 2, hours: 7, frontLight: false },
      { lux: 4000, hours: 1, frontLight: false },
    ]
    const answers = makeAnswers({ spots })
    const [first, second] = rankByFit(makeEdition([lighter, purer]), answers).ranked
    expect(first!.slug).toBe('lighter')
    expect(AIMS.filter((aim) => second!.scores[aim] > first!.scores[aim])).toEqual(['tint'])
    const change = changeOf(makeEdition([lighter, purer]), answers)
    expect(change).toMatchObject({ from: 0, to: 1, first: 'purer' })
    expect(change).toEqual(changeByTrying(makeEdition([lighter, purer]), answers))
  })

  test('none where there is one spot, or one device', () => {
    const one = makeAnswers({ spots: [{ lux: 80, hours: 5, frontLight: true }] })
    expect(changeOf(syntheticEdition(5), one)).toBeNull()
    expect(changeOf(syntheticEdition(1), makeAnswers())).toBeNull()
  })

  test('twelve spots of full weeks and 160 devices are soon searched', () => {
    const spots = Array.from({ length: 12 }, (_, i) => ({ lux: 0.1 * 3.3 ** i, hours: 84, frontLight: i % 2 === 0 }))
    const start = performance.now()
    changeOf(syntheticEdition(160), makeAnswers({ spots }))
    expect(performance.now() - start).toBeLessThan(3000)
  })
})

describe('what would change the answer', () => {
  const edition = syntheticEdition(12)

  test('every aim has an entry: a new weight at which the runner-up is first, or none', () => {
    const answers = makeAnswers({ aims: [['handling'], ['clarity'], ['tint'], ['whiteness']] })
    const { weights, ranked, wouldChange } = match(edition, answers, DRAWS)
    expect(wouldChange.weights.map(({ aim }) => aim)).toEqual([...AIMS])
    let found = 0
    for (const { aim, from, to, first } of wouldChange.weights) {
      expect(from).toBe(weights[aim])
      if (to === null) {
        expect(first).toBeNull()
        continue
      }
      found++
      expect(first).toBe(ranked[1]!.slug)
      const beyond = to + Math.sign(to - from) * 1e-6
      const changed = { ...weights, [aim]: beyond }
      for (const other of AIMS) if (other !== aim) changed[other] = (weights[other] * (1 - beyond)) / (1 - from)
      expect(rankByFit(edition, { ...answers, weights: changed }).ranked[0]!.slug).toBe(first)
    }
    expect(found).toBeGreaterThan(0)
  })

  test('the lowest higher budget that changes first place, and not one that only ties or only lets in', () => {
    const u = { L: 0.4, a: 0.2, b: 0.2 }
    const priced = (slug: string, L: number, amount: number, pen = true) =>
      makeDevice({ slug, page: { L, a: -1, b: 1, u }, price: { amount, currency: 'GBP' }, pen })
    const devices = [
      priced('cheap', 68, 10_000),
      priced('no-better', 66, 12_000),
      priced('level', 68, 13_000),
      priced('better', 71, 15_000),
      priced('better-yet', 73, 15_000),
      priced('best', 76, 40_000),
      priced('best-without-pen', 77, 14_000, false),
      priced('cheapest-without-pen', 77, 9_000, false),
    ]
    const answers = makeAnswers({ limits: { budget: 11_000, currency: 'GBP', pen: true } })
    const { wouldChange, ranked } = match(makeEdition(devices), answers, DRAWS)
    expect(ranked.map(({ slug }) => slug)).toEqual(['cheap'])
    expect(wouldChange.budget).toEqual({ amount: 15_000, first: 'better-yet' })
    const raised = makeAnswers({ limits: { ...answers.limits, budget: 15_000 } })
    expect(rankByFit(makeEdition(devices), raised).ranked[0]!.slug).toBe('better-yet')
  })

  test('where the budget leaves nothing, the first device to come in is first', () => {
    const answers = makeAnswers({ limits: { budget: 1, currency: 'GBP' } })
    const { ranked, wouldChange, nearMisses } = match(edition, answers, DRAWS)
    expect(ranked).toEqual([])
    const cheapest = Math.min(...edition.devices.map((device) => device.price!.amount))
    expect(wouldChange.budget?.amount).toBe(cheapest)
    expect(nearMisses).toHaveLength(12)
    expect(wouldChange.hours).toBeNull()
    expect(wouldChange.weights.every(({ to, first }) => to === null && first === null)).toBe(true)
  })

  test('without a budget there is none to raise', () => {
    expect(match(edition, makeAnswers(), DRAWS).wouldChange.budget).toBeNull()
  })
})
