import { createHash } from 'node:crypto'
import { answering } from '@/app/api/answering'
import { only } from '@/app/api/methods'
import { pageLinks } from '@/app/api/page-links'
import { readQuery } from '@/app/api/read-query'
import { CHANGING, storedJson } from '@/app/api/stored-json'
import { listDeviceReadings } from '@/db/queries/dataset'
import { type DeviceReadingsAnswer, deviceReadingsQuery, READING_UNITS } from '@/lib/contract/device'
import { read } from '@/lib/server/db'
import { findDevice } from '../find-device'

export const dynamic = 'force-dynamic'

type Context = { params: Promise<{ slug: string }> }

/** Every reading the edition's figures of a device rest on, those left out included, a page at a time. */
export const GET = answering(async (request, { params }: Context) => {
  const question = readQuery(request, deviceReadingsQuery)
  if ('refusal' in question) return question.refusal
  const { page, limit, edition: number } = question.query
  const found = await findDevice((await params).slug, number)
  if ('refusal' in found) return found.refusal

  const { edition, device } = found
  const all = await read((db) => listDeviceReadings(db, edition.number, device.slug))
  const pages = Math.max(1, Math.ceil(all.length / limit))
  const answer: DeviceReadingsAnswer = {
    edition: edition.number,
    device: device.slug,
    total: all.length,
    page,
    pages,
    limit,
    units: READING_UNITS,
    readings: all.slice((page - 1) * limit, page * limit).map(({ set, ordinal, l, a, b, of, ...rest }) => ({
      set,
      ordinal,
      unit: of.unit,
      session: of.session,
      position: of.position,
      state: of.state,
      L: l,
      a,
      b,
      ...rest,
      counted: rest.flag !== 'left-out',
    })),
  }
  const body = JSON.stringify(answer)
  const response = storedJson(request, body, createHash('sha256').update(body).digest('hex'), CHANGING)
  const links = pageLinks(`/api/v1/devices/${device.slug}/readings`, question.asked, page, pages)
  if (links) response.headers.set('link', links)
  return response
})

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
