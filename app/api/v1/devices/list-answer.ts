import { createHash } from 'node:crypto'
import { listDevices } from '@/lib/catalogue/list'
import { type DeviceListAnswer, deviceListQuery } from '@/lib/contract/device-list'
import { fieldErrors, problem } from '@/lib/contract/problem'
import { clip } from '@/lib/contract/shown'
import type { Edition } from '@/lib/method/types'
import { pageLinks } from '../../page-links'
import { CHANGING, storedJson } from '../../stored-json'

/** The devices of an edition that a request asks for, one page of them, or the problem that names what is wrong. */
export function listAnswer(request: Request, edition: Edition): Response {
  const { searchParams } = new URL(request.url)
  const twice = [...new Set(searchParams.keys())].filter(
    (name) => name !== 'maker' && searchParams.getAll(name).length > 1,
  )
  if (twice.length > 0) {
    return refuse(twice.map((name) => ({ field: clip(name), message: `${clip(name)} is given twice; give it once.` })))
  }
  const makers = searchParams.getAll('maker')
  const parsed = deviceListQuery.safeParse({
    ...Object.fromEntries(searchParams),
    ...(makers.length > 0 && { maker: makers.join(',') }),
  })
  if (!parsed.success) return refuse(fieldErrors(parsed.error))

  const { limit, page = 1, ...query } = parsed.data
  const { known, open } = listDevices(edition, query)
  const all = [...known, ...open]
  const pages = Math.max(1, Math.ceil(all.length / limit))
  const answer: DeviceListAnswer = {
    edition: edition.number,
    total: all.length,
    matching: known.length,
    page,
    pages,
    limit,
    devices: all
      .slice((page - 1) * limit, page * limit)
      .map(({ device, notStated }) => ({ ...device, notStated, href: `/api/v1/devices/${device.slug}` })),
  }
  const body = JSON.stringify(answer)
  const response = storedJson(request, body, createHash('sha256').update(body).digest('hex'), CHANGING)
  const links = pageLinks('/api/v1/devices', searchParams, page, pages)
  if (links) response.headers.set('link', links)
  return response
}

const refuse = (errors: { field: string; message: string }[]) => problem(400, 'The filter is not understood', errors)
