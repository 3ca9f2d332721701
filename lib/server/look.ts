import 'server-only'
import { notFound } from 'next/navigation'
import { type Look, parseLook } from '@/lib/look'

/** What every page below `[look]` is given. */
export type LookParams = { look: string }

/** The look a page is asked for in; leaves with 404 where there is no such look. */
export async function requireLook(params: Promise<LookParams>): Promise<Look> {
  return parseLook((await params).look) ?? notFound()
}
