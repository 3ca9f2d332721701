import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { ChangedDevices } from '@/app/[look]/editions/[number]/changed-devices'
import type { Changelog } from '@/app/[look]/editions/[number]/changelog'
import { Moved } from '@/app/[look]/editions/[number]/moved'
import { editionChanges } from '@/lib/edition/changes'
import { rankMoves } from '@/lib/edition/changes-ranks'
import { match } from '@/lib/method/ranking'
import { makeAnswers, syntheticEdition } from '../fixtures/edition'

/** Forty devices, every page of another lightness in the newer edition, so that the order is another too. */
const previous = syntheticEdition(40)
const edition = {
  ...previous,
  number: 2,
  devices: previous.devices.map((device, i) => ({ ...device, page: { ...device.page, L: 54 + i / 2 } })),
}
const ranked = (of: typeof previous) => match(of, makeAnswers(), { draws: 50 }).ranked
const changelog: Changelog = {
  edition,
  previous,
  title: 'Edition 2',
  note: 'Every page read again.',
  latest: 2,
  corrected: [],
  wrong: [],
  changes: editionChanges(previous, edition),
  moves: rankMoves(ranked(previous), ranked(edition)),
}
const count = (markup: string, part: RegExp) => markup.match(part)?.length ?? 0

describe('the long lists of an edition', () => {
  test('show who moved thirty at a time, each page at an address of its own', () => {
    const [first, second] = [1, 2].map((page) => renderToStaticMarkup(<Moved changelog={changelog} page={page} />))
    expect(count(first!, /role="rowheader"/g)).toBe(30)
    expect(count(second!, /role="rowheader"/g)).toBe(10)
    expect(first).toContain('href="/editions/2/moved/2"')
    expect(second).toContain('href="/editions/2#moved"')
    expect(second).toContain('Devices 31–40 of 40, page 2 of 2')
  })

  test('show what changed thirty devices at a time', () => {
    const [first, second] = [1, 2].map((page) =>
      renderToStaticMarkup(<ChangedDevices changelog={changelog} units="metric" page={page} />),
    )
    expect(count(first!, /<article/g)).toBe(30)
    expect(count(second!, /<article/g)).toBe(10)
    expect(first).toContain('href="/editions/2/changed/2"')
    expect(second).toContain('href="/editions/2#changed"')
  })

  test('leave to the corrections what was corrected', () => {
    const [one] = changelog.changes!.changed
    const correction = {
      id: 1,
      slug: one!.slug,
      name: one!.after.name,
      notedOn: '2026-05-12',
      figure: 'Lightness',
      note: 'Too dark.',
      wrongIn: 1,
      rightIn: 2,
      replies: [],
    }
    const markup = renderToStaticMarkup(
      <ChangedDevices changelog={{ ...changelog, corrected: [correction] }} units="metric" page={1} />,
    )
    expect(markup).toContain('in 39 devices')
    expect(markup).not.toContain(`href="/devices/${one!.slug}"`)
  })
})
