import { describe, expect, test } from 'vitest'
import { NEWS_LIMIT, newsItems, newsUpdated, tagOf } from '@/lib/feeds/news'
import { PUBLISHED } from '@/tests/fixtures/news'

describe('news', () => {
  test('what changed last comes first; a correction changes with its replies and with the edition that puts it right', () => {
    const items = newsItems(PUBLISHED)
    expect(items.map(({ name, updated }) => [name, updated.toISOString()])).toEqual([
      ['corrections/7', '2026-08-01T00:00:00.000Z'],
      ['editions/2', '2026-07-03T09:00:00.000Z'],
      ['devices/example-reed', '2026-02-27T09:00:00.000Z'],
      ['editions/1', '2026-02-27T09:00:00.000Z'],
    ])
    expect(newsUpdated(items).toISOString()).toBe('2026-08-01T00:00:00.000Z')
    const unanswered = { ...PUBLISHED.corrections[0]!, repliedOn: [] }
    expect(newsItems({ ...PUBLISHED, corrections: [unanswered] })[0]!.updated.toISOString()).toBe(
      '2026-07-03T09:00:00.000Z',
    )
  })

  test('a correction says whether an edition puts it right', () => {
    const told = (fields: object) =>
      newsItems({ editions: [], devices: [], corrections: [{ ...PUBLISHED.corrections[0]!, ...fields }] })[0]!.text
    expect(told({})).toBe('It was too light. It is put right in edition 2.')
    expect(told({ rightIn: null, rightAt: null })).toBe('It was too light. It is not put right in an edition yet.')
  })

  test('a device the newest edition no longer has leads to the edition that had it', () => {
    const [item] = newsItems({ ...PUBLISHED, editions: [], corrections: [] })
    expect(item).toMatchObject({ path: '/editions/1', title: 'New in the guide: Example Reed' })
    expect(item!.text).toContain('read on one unit. Its figures are provisional')
  })

  test(`there are never more than ${NEWS_LIMIT} items, the newest of all kinds`, () => {
    const editions = Array.from({ length: 80 }, (_, i) => ({
      ...PUBLISHED.editions[0]!,
      number: i + 1,
      publishedAt: new Date(Date.UTC(2027, 0, i + 1)),
    }))
    const items = newsItems({ ...PUBLISHED, editions })
    expect(items).toHaveLength(50)
    expect(items[0]!.name).toBe('editions/80')
    expect(items.at(-1)!.name).toBe('editions/31')
  })

  test('a feed without news has a date all the same', () => {
    expect(newsUpdated(newsItems({ editions: [], corrections: [], devices: [] })).toISOString()).toBe(
      '2026-01-01T00:00:00.000Z',
    )
  })

  // RFC 4151, section 2.1: tag:authority,date:specific, where the authority is a name without a port.
  test('a tag names the host, the year and the thing, and nothing of the address', () => {
    expect(tagOf('guide.example', 'editions/2')).toBe('tag:guide.example,2026:editions/2')
    expect(tagOf('guide.example', 'editions/2')).toMatch(
      /^tag:[\w.-]+,\d{4}(-\d\d(-\d\d)?)?:[\w\-.~!$&'()*+,;=:@/?%]*$/,
    )
  })
})
