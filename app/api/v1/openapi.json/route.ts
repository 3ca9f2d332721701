import { createHash } from 'node:crypto'
import { OPENAPI } from '@/lib/openapi/document'
import { answering } from '../../answering'
import { only } from '../../methods'
import { CHANGING, storedJson } from '../../stored-json'

export const dynamic = 'force-dynamic'

const body = JSON.stringify(OPENAPI)
const tag = createHash('sha256').update(body).digest('hex')

/** What the API is, for programs: OpenAPI 3.1. */
export const GET = answering(async (request) => storedJson(request, body, tag, CHANGING))

const { options, refused } = only('GET', 'HEAD')

export { options as OPTIONS, refused as DELETE, refused as PATCH, refused as POST, refused as PUT }
