import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { inOrder } from '@/app/[look]/devices/[slug]/big-figures'
import { Heading, inOneLine } from '@/app/[look]/devices/[slug]/heading'
import { Sessions } from '@/app/[look]/devices/[slug]/sessions'
import { Unreleased } from '@/app/[look]/devices/[slug]/unreleased'
import type { DeviceRecord } from '@/db/queries/devices'
import type { TileReading } from '@/db/queries/session-state'
import type { EditionDevice } from '@/lib/method/types'
import { makeDevice } from '@/tests/fixtures/edition'

const text = (element: React.ReactElement) =>
  renderToStaticMarkup(element)
    .replace(/<[^>]+>/g, ' ')
    .replace(/\s+/g, ' ')

describe('the rank of a device', () => {
  test('is one place only where it stands clear of the others', () => {
    expect(inOrder({ place: 3, best: 3, worst: 3, of: 16 })).toBe('3rd of 16 by lightness, clear of the others')
  })
  test('is a band where others are too close to call', () => {
    expect(inOrder({ place: 4, best: 3, worst: 6, of: 16 })).toBe('3rd to 6th of 16 by lightness, too close to call')
  })
  test('is none among one', () => {
    expect(inOrder({ place: 1, best: 1, worst: 1, of: 1 })).toBe('the only one measured')
  })
})

describe('the head of a device’s page', () => {
  const heading = (fields: Partial<EditionDevice>, { edition = 3, latest = 3 } = {}) =>
    text(
      <Heading
        device={makeDevice({ slug: 'example', ...fields })}
        pricedOn="2026-10-30"
        edition={{ number: edition, publishedAt: '2026-11-20T09:00:00Z' }}
        latest={latest}
        units="metric"
      />,
    )

  test('says when the device is not in the newest edition, and whose figures follow', () => {
    expect(heading({}, { edition: 2 })).toContain('not in edition 3, the newest. What follows is as edition 2 has it')
    expect(heading({})).not.toContain('the newest')
  })

  test('says what rests on one unit and what is no longer sold', () => {
    expect(heading({ provisional: true, onSale: false, price: null })).toMatch(/Provisional:.+Not on sale when/)
    expect(heading({})).not.toMatch(/Provisional|Not on sale/)
  })

  test('names the price with the month it was seen, and none where there is none', () => {
    expect(heading({})).toContain('£129 in October 2026')
    expect(heading({ price: null })).not.toContain('October')
  })

  test('names what is not stated, and sizes in the units chosen', () => {
    const device = makeDevice({ slug: 'example', colour: null, frontLight: null })
    expect(inOneLine(device, 'metric')).toMatch(
      /^6\.0\sin \(15\.2\scm\), 300 ppi, colour not stated, front light not stated\.$/,
    )
    expect(inOneLine(device, 'inch')).toMatch(/^6\.0\sin, 300/)
    expect(inOneLine(makeDevice({ slug: 'example', diagonal: null }), 'metric')).toMatch(/^Size not stated/)
  })
})

describe('the control on the days of a device', () => {
  const session = (n: number) => ({
    session: `session ${n}`,
    startedAt: new Date(Date.UTC(2026, 0, n, 9)),
    instrumentId: 1,
    instrument: 'Example sphere',
  })
  const tile = (n: number, L: number): TileReading => ({
    ...session(n),
    sampleId: 1,
    sample: 'Example tile',
    moment: 'start',
    L,
    a: 0,
    b: 0,
  })
  const set = (n: number) =>
    ({
      ...session(n),
      id: n,
      operator: 'tester 1',
      temperatureCelsius: 23,
      apertureMm: 8,
    }) as DeviceRecord['sets'][number]
  const quiet = Array.from({ length: 12 }, (_, i) => tile(i + 1, 95 + (i % 2) * 0.02))
  const white = { instrumentId: 1, at: new Date(Date.UTC(2026, 0, 13, 8, 45)), tileSerial: 'EX-TILE-1' }

  test('names the day on which it was outside its limits', () => {
    const words = text(<Sessions sets={[set(13), set(2)]} tiles={[...quiet, tile(13, 95.5)]} calibrations={[white]} />)
    expect(words).toContain('The control tile was outside its limits on 13 January 2026.')
    expect(words).toMatch(/15\smin before, on EX-TILE-1/)
    expect(words).toContain('not noted')
  })

  test('says so where it was inside, and where nobody can know', () => {
    expect(text(<Sessions sets={[set(1), set(2)]} tiles={quiet} calibrations={[]} />)).toContain(
      'within its limits in all 2 sessions',
    )
    expect(text(<Sessions sets={[set(1)]} tiles={[tile(1, 95)]} calibrations={[]} />)).toContain(
      'Of 1 January 2026 the limits are not known',
    )
    expect(text(<Sessions sets={[]} tiles={[]} calibrations={[]} />)).toContain('Nothing has been read yet.')
  })
})

test('a device without released figures has its name and a kind word', () => {
  const words = text(<Unreleased record={{ name: 'Example 7', maker: 'Example' } as DeviceRecord} />)
  expect(words).toContain('Example 7')
  expect(words).toContain('No figures of this device have been released yet. They will be here with the next edition.')
})
