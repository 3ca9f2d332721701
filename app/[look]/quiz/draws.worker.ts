import { match } from '@/lib/method/ranking'
import type { Answers, Edition, RankedDevice } from '@/lib/method/types'

export type DrawsQuestion = { edition: Edition; answers: Answers }
export type DrawsAnswer = Pick<RankedDevice, 'slug' | 'fit' | 'sd' | 'first' | 'tiedWith'>[]

/** Ranks with all draws, away from the page's own thread. One question a worker: a newer one ends it. */
self.addEventListener('message', ({ data }: MessageEvent<DrawsQuestion>) => {
  const { ranked } = match(data.edition, data.answers)
  const answer: DrawsAnswer = ranked.map(({ slug, fit, sd, first, tiedWith }) => ({ slug, fit, sd, first, tiedWith }))
  self.postMessage(answer)
})
