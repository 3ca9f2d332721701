import { describe, expect, test } from 'vitest'
import { deviceChange, editionChanges } from '@/lib/edition/changes'
import { type FigureName, movedFigures } from '@/lib/edition/changes-figures'
import type { EditionDevice, Lab } from '@/lib/method/types'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const lab = (L: number, a = 0, b = 0): Lab => ({ L, a, b })
const NONE = { common: lab(0), session: lab(0) }
/** A device of this page, its own doubts of L* alone, read in the sessions named, in equal shares. */
const read = (L: number, u: number, sessions: string[], slug = 'example'): EditionDevice =>
  makeDevice({
    slug,
    page: { ...lab(L), u: lab(u) },
    ink: { ...lab(24), u: lab(0) },
    sessions: Object.fromEntries(sessions.map((name) => [name, 1 / sessions.length])),
  })
const moved = (before: EditionDevice, after: EditionDevice, uncertainty = NONE) => {
  const figures = movedFigures({ uncertainty, device: before }, { uncertainty, device: after })
  return (name: FigureName) => figures.find(({ figure }) => figure === name)
}

describe('a figure that differs between two editions', () => {
  test('is given with both values as the documents have them', () => {
    const lightness = moved(read(74, 0.3, ['one']), read(72.5, 0.4, ['one']))('lightness')
    expect(lightness).toMatchObject({ before: 74, after: 72.5 })
  })

  // JCGM 100, 5.1.2: independent parts add in squares; k = 2.
  test('has the doubt of the two devices’ own parts together', () => {
    const lightness = moved(read(74, 0.3, ['one']), read(72.5, 0.4, ['one']))('lightness')!
    expect(lightness.doubt).toBeCloseTo(2 * Math.hypot(0.3, 0.4), 6)
    expect(lightness.beyond).toBe(true)
  })

  // JCGM 100, F.1.2.3: an error common to both drops out of their difference.
  test('owes nothing to the calibration, nor to a session both editions rest on', () => {
    const uncertainty = { common: lab(0.5), session: lab(0.3) }
    const shared = moved(read(74, 0.3, ['one']), read(73, 0.4, ['one']), uncertainty)('lightness')!
    expect(shared.doubt).toBeCloseTo(1, 6)
    // Half of the newer figure's sets are of a session the older one does not have: errors 1 − ½ and −½ of 0.3 each.
    const half = moved(read(74, 0.3, ['one']), read(73, 0.4, ['one', 'two']), uncertainty)('lightness')!
    expect(half.doubt).toBeCloseTo(2 * Math.hypot(0.3, 0.4, 0.15, 0.15), 6)
  })

  test('is more than its doubt from there on and no sooner', () => {
    const before = read(74, 0.3, ['one'])
    const beyond = [73.01, 72.99].map((L) => moved(before, read(L, 0.4, ['one']))('lightness')!.beyond)
    expect(beyond).toEqual([false, true])
  })

  test('takes the larger uncertainty where the editions differ in it', () => {
    const [before, after] = [read(74, 0, ['one']), read(73, 0, ['two'])]
    const [small, large] = [
      { common: lab(0), session: lab(0.1) },
      { common: lab(0), session: lab(0.3) },
    ]
    const doubtOf = (first: typeof small, second: typeof small) =>
      movedFigures({ uncertainty: first, device: before }, { uncertainty: second, device: after })[0]!.doubt
    expect(doubtOf(small, large)).toBeCloseTo(2 * Math.hypot(0.3, 0.3), 6)
    expect(doubtOf(large, small)).toBeCloseTo(doubtOf(small, large), 12)
  })

  test('is told only where the document differs: a page that moves takes its whiteness and contrast along', () => {
    const figures = movedFigures(
      { uncertainty: NONE, device: read(74, 0.3, ['one']) },
      { uncertainty: NONE, device: read(72.5, 0.3, ['one']) },
    )
    expect(figures.map(({ figure }) => figure)).toEqual(['lightness', 'whiteness', 'tint', 'contrast'])
    const same = read(74, 0.3, ['one'])
    expect(movedFigures({ uncertainty: NONE, device: same }, { uncertainty: NONE, device: { ...same } })).toEqual([])
  })
})

describe('facts', () => {
  const change = (before: Partial<EditionDevice>, after: Partial<EditionDevice>) =>
    deviceChange(
      { uncertainty: NONE, device: makeDevice({ slug: 'example', ...before }) },
      { uncertainty: NONE, device: makeDevice({ slug: 'example', ...after }) },
    ).facts

  test('that are stated differently are told, and whether a fit rests on them', () => {
    expect(change({ weight: 170 }, { weight: 180 })).toEqual([{ fact: 'weight', ofTheFit: true }])
    expect(change({ price: { amount: 100, currency: 'GBP' } }, { price: { amount: 90, currency: 'GBP' } })).toEqual([
      { fact: 'price', ofTheFit: false },
    ])
    expect(change({ pen: null }, { pen: false })).toEqual([{ fact: 'pen', ofTheFit: false }])
    expect(change({ formats: ['EPUB'] }, { formats: ['EPUB', 'PDF'] })).toEqual([{ fact: 'formats', ofTheFit: false }])
    expect(change({ frontLight: { max: 90, min: 1 } }, { frontLight: { max: 90, min: null } })).toEqual([
      { fact: 'frontLight', ofTheFit: true },
    ])
  })

  test('are the same whatever the order of their parts', () => {
    const [one, other] = [
      { max: 90, min: 1 },
      { min: 1, max: 90 },
    ]
    expect(change({ frontLight: one }, { frontLight: other })).toEqual([])
  })
})

describe('an edition beside the one before', () => {
  const before = makeEdition([
    makeDevice({ slug: 'stays' }),
    makeDevice({ slug: 'goes' }),
    makeDevice({ slug: 'moves', name: 'Example moves', weight: 170 }),
  ])
  const after = makeEdition(
    [
      makeDevice({ slug: 'comes-10', name: 'Comes 10' }),
      makeDevice({ slug: 'comes-9', name: 'Comes 9' }),
      makeDevice({ slug: 'stays', page: { ...before.devices[0]!.page, u: lab(0.1, 0.1, 0.1) } }),
      makeDevice({ slug: 'moves', name: 'Example moves', weight: 180 }),
    ],
    {
      number: 2,
      uncertainty: { ...before.uncertainty, session: lab(0.2, 0.05, 0.07) },
      control: { paper: lab(93.5, 0.4, 2.2) },
    },
  )
  const slugs = (devices: readonly { slug: string }[]) => devices.map(({ slug }) => slug)

  test('has every device in exactly one list: added, withdrawn, changed or unchanged', () => {
    const changes = editionChanges(before, after)
    expect(slugs(changes.added)).toEqual(['comes-9', 'comes-10'])
    expect(slugs(changes.withdrawn)).toEqual(['goes'])
    expect(slugs(changes.changed)).toEqual(['moves'])
    // A doubt alone is no change of a figure.
    expect(slugs(changes.unchanged)).toEqual(['stays'])
  })

  test('tells what all figures share where that changed, and the method only where it is another', () => {
    const changes = editionChanges(before, after)
    expect(changes.shared.map(({ what }) => what)).toEqual(['paper', 'session'])
    expect(changes.method).toBeNull()
    expect(editionChanges(before, { ...after, method: 2 }).method).toEqual({ before: 1, after: 2 })
  })

  test('has nothing to tell beside itself', () => {
    const changes = editionChanges(after, after)
    const { unchanged, ...rest } = changes
    expect(unchanged).toHaveLength(4)
    expect(rest).toEqual({ added: [], withdrawn: [], changed: [], shared: [], method: null })
  })
})
