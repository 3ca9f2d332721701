import 'server-only'
import { join } from 'node:path'
import { LRUCache } from 'lru-cache'
import Piscina from 'piscina'
import type { Answers, Edition, MatchAnswer } from '@/lib/method/types'
import { config } from './config'

type RankedAnswer = Omit<MatchAnswer, 'assumed'>

/** More rankings are waiting than we can answer soon; try again in some seconds. */
export class TooBusy extends Error {
  override name = 'TooBusy'
  readonly retryAfterSeconds = 5
}

/** Rankings that may wait; with one thread and a second for the slowest question, the last waits this many seconds. */
const MAX_WAITING = 12
/** Milliseconds after which a ranking is given up. */
const RANK_DEADLINE_MS = 15_000

const globals = globalThis as { lampleafMatchPool?: Piscina }
function pool(): Piscina {
  globals.lampleafMatchPool ??= new Piscina({
    // Bundled by scripts/build-worker.mjs: a thread cannot read what the site's own bundler made.
    filename: join(process.cwd(), 'build', 'match-worker.mjs'),
    minThreads: 0,
    maxThreads: config().matchThreads,
    idleTimeout: 60_000,
    maxQueue: MAX_WAITING,
  })
  return globals.lampleafMatchPool
}

// The same question always has the same answer, and shared links make the same question come often.
const answered = new LRUCache<string, Promise<RankedAnswer>>({ max: 300 })

/**
 * Ranks one reader's answers on one edition with 4,000 draws, in a worker thread so that pages stay quick.
 * @throws TooBusy where too many rankings wait already
 */
export function matchOnServer(edition: Edition, answers: Answers): Promise<RankedAnswer> {
  const key = JSON.stringify([edition.sha256, answers])
  const known = answered.get(key)
  if (known) return known
  const fresh = rank(edition, answers)
  answered.set(key, fresh)
  fresh.catch(() => answered.delete(key))
  return fresh
}

async function rank(edition: Edition, answers: Answers): Promise<RankedAnswer> {
  const threads = pool()
  if (threads.queueSize >= MAX_WAITING) throw new TooBusy('Too many rankings are waiting')
  const signal = AbortSignal.timeout(RANK_DEADLINE_MS)
  try {
    return (await threads.run({ edition, answers }, { signal })) as RankedAnswer
  } catch (error) {
    if (signal.aborted) throw new TooBusy('The ranking took too long', { cause: error })
    throw error
  }
}
