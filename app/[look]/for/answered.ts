import 'server-only'
import type { Result } from '@/lib/quiz/result'
import { addressOf, questionOf, type Reader } from '@/lib/readers/reader'
import { latestEdition } from '@/lib/server/editions'
import { matchOnServer } from '@/lib/server/match'

/**
 * A typical reader's answers put to the newest edition, by the same method and the same worker as any reader's; null
 * while nothing has been released.
 */
export async function answeredFor(reader: Reader): Promise<Result | null> {
  const edition = await latestEdition()
  if (!edition || edition.devices.length === 0) return null
  const { answers, assumed } = questionOf(reader)
  return { address: addressOf(reader), answers, assumed, edition, match: await matchOnServer(edition, answers) }
}
