import { match } from '@/lib/method/ranking'
import type { Answers, Edition } from '@/lib/method/types'

/** What a worker thread does with one question; see match.ts. */
export default function rankInThread({ edition, answers }: { edition: Edition; answers: Answers }) {
  return match(edition, answers)
}
