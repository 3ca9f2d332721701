import { createHash } from 'node:crypto'
import { answering } from '@/app/api/answering'
import { only } from '@/app/api/methods'
import { readQuery } from '@/app/api/read-query'
import { CHANGING, storedJson } from '@/app/api/stored-json'
import { type DeviceAnswer, deviceQuery, FIGURE_UNITS } from '@/lib/contract/device'
import { publishedFigures } from '@/lib/findings/published'
import { standingBy } from '@/lib/findings/standing'
import { derive } from '@/lib/method/derived-figures'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { findDevice } from './find-device'

export const dynamic = 'force-dynamic'

type Context = { params: Promise<{ slug: string }> }

/** A device as an edition froze it, every published figure with its doubt, and where it stands. */
export const GET = answering(async (request, { params }: Context) => {
  const asked = readQuery(request, deviceQuery)
  if ('refusal' in asked) return asked.refusal
  const found = await findDevice((await params).slug, asked.query.edition)
  if ('refusal' in found) return found.refusal
  const body = JSON.stringify(deviceAnswer(found.edition, found.device))
  return storedJson(request, body, createHash('sha256').update(body).digest('hex'), CHANGING)
})

function deviceAnswer(edition: Edition, device: EditionDevice): DeviceAnswer {
  const { number, publishedAt, sha256 } = edition
  const published = publishedFigures(edition, device)
  const figures = Object.fromEntries(
    Object.entries(FIGURE_UNITS).map(([name, unit]) => {
      const figure = published[name as keyof typeof FIGURE_UNITS]
      return [name, figure && { ...figure, unit }]
    }),
  ) as DeviceAnswer['figures']
  const own = `/api/v1/devices/${device.slug}`
  return {
    edition: { number, publishedAt, sha256 },
    device,
    figures,
    standing: {
      lightness: standingBy(edition, device, ({ page }) => page.L),
      contrast: standingBy(edition, device, ({ page, ink }) => derive(page, ink).contrast),
    },
    links: {
      self: `${own}?edition=${number}`,
      readings: `${own}/readings?edition=${number}`,
      edition: `/api/v1/editions/${number}`,
      page: `/devices/${device.slug}`,
      data: `/data/${number}`,
    },
  }
}

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
