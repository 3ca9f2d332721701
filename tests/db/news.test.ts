import { afterAll, beforeAll, expect, test } from 'vitest'
import { listNews } from '@/db/queries/news'
import { findPageChanges } from '@/db/queries/page-changes'
import { corrections, devices, replies } from '@/db/schema'
import { newsItems } from '@/lib/feeds/news'
import { connectToTests, createSeededDatabase, rollingBack } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
})
afterAll(() => seeded.drop())

test('news are the editions, the corrections with their replies, and each device with the first edition that has it', async () => {
  const news = await listNews(seeded.db, 50)
  expect(news.editions.map(({ number }) => number)).toEqual([3, 2, 1])
  expect(news.corrections).toHaveLength(1)
  expect(news.corrections[0]).toMatchObject({
    device: 'Tamber Reed 7',
    rightIn: 2,
    rightAt: news.editions[1]!.publishedAt,
    repliedOn: ['2026-04-29', '2026-05-12'],
  })
  // tests/db/editions.test.ts: the editions hold 11, 14 and 16 devices.
  const entering = (edition: number) => news.devices.filter((device) => device.edition === edition)
  expect([1, 2, 3].map((number) => entering(number).length)).toEqual([11, 3, 2])
  expect(entering(3).map(({ slug }) => slug)).toEqual(['corrin-duodecimo-6-colour', 'pellow-broadsheet-13-colour'])
  expect(entering(3)[1]).toMatchObject({ units: 1, provisional: true, listed: true })
  expect(newsItems(news)).toHaveLength(20)
})

test('no more are read than are asked for, the newest first', async () => {
  const news = await listNews(seeded.db, 2)
  expect(news.editions.map(({ number }) => number)).toEqual([3, 2])
  expect(news.devices.map(({ edition }) => edition)).toEqual([3, 3])
})

test('a reply makes its correction, its device and the list of corrections newer', async () => {
  await rollingBack(seeded.db, async (tx) => {
    const before = await findPageChanges(tx)
    expect(before.corrections).toBe('2026-05-12T00:00:00.000Z')
    const [row] = await tx.select({ id: corrections.id }).from(corrections)
    await tx
      .insert(replies)
      .values({ correctionId: row!.id, repliedOn: '2026-11-30', from: 'the maker', note: 'Thank you.' })
    const after = await findPageChanges(tx)
    expect(after.corrections).toBe('2026-11-30T00:00:00.000Z')
    expect(after.devices.get('tamber-reed-7')).toBe('2026-11-30T00:00:00.000Z')
    for (const [slug, moment] of after.devices)
      if (slug !== 'tamber-reed-7') expect(moment).toBe(before.devices.get(slug))
    const [newest] = newsItems(await listNews(tx, 50))
    expect(newest).toMatchObject({ kind: 'correction', updated: new Date('2026-11-30T00:00:00Z') })
  })
})

test('every device has a date, and none is later than the newest thing known of it', async () => {
  const { devices: dates, editions } = await findPageChanges(seeded.db)
  const known = await seeded.db.select({ slug: devices.slug }).from(devices)
  expect([...dates.keys()].sort()).toEqual(known.map(({ slug }) => slug).sort())
  // Ostler Plain 6: its newest price was seen on this day (tests/db/devices.test.ts), after its last session.
  expect(dates.get('ostler-plain-6')).toBe('2026-10-30T00:00:00.000Z')
  expect(editions.map(({ number }) => number)).toEqual([3, 2, 1])
})

test('where nothing is published there are no news and no dates', async () => {
  const { db, close } = connectToTests()
  expect(await listNews(db, 50)).toEqual({ editions: [], corrections: [], devices: [] })
  expect(await findPageChanges(db)).toEqual({ editions: [], devices: new Map(), corrections: null })
  await close()
})
