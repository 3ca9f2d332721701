import { revalidatePath } from 'next/cache'
import { findPageChanges } from '@/db/queries/page-changes'
import { publicPages } from '@/lib/public-pages'
import { read } from '@/lib/server/db'
import { latestEdition } from '@/lib/server/editions'
import { isOwnProcess, OWN_PROCESS_HEADER } from '@/lib/serving/own-process.mjs'

export const dynamic = 'force-dynamic'

/** What the pages showed when this process last looked; nothing before it has. */
let shown: string | null = null

/**
 * For this process alone: whether anything the pages show has changed since the last look, and if so the public pages.
 * Every stored page is marked old then; each is made anew when it is next asked for.
 */
export async function POST(request: Request): Promise<Response> {
  if (!isOwnProcess(request.headers.get(OWN_PROCESS_HEADER))) return new Response(null, { status: 404 })
  const [edition, changes] = await Promise.all([latestEdition(), read(findPageChanges)])
  const now = JSON.stringify([edition?.number, changes.editions, changes.corrections, ...changes.devices])
  const changed = now !== shown
  if (changed && shown !== null) revalidatePath('/', 'layout')
  shown = now
  const paths = changed ? publicPages(edition, changes).map(({ path }) => path) : []
  return Response.json({ changed, paths }, { headers: { 'Cache-Control': 'no-store' } })
}
