import { useEffect, useState } from 'react'
import { completeRequest } from '@/lib/contract/complete-request'
import type { Edition } from '@/lib/method/types'
import type { QuizAnswers } from '@/lib/quiz/answers'
import { toRequest } from '@/lib/quiz/request'
import { queryOfAnswers } from '@/lib/quiz/write-address'
import type { DrawsAnswer, DrawsQuestion } from './draws.worker'

/** Long enough not to start a worker for every step of a slider. */
const DRAW_DELAY_MS = 250

/**
 * The doubts and ties of the shortlist, by a worker. While answers change the worker at work is ended: the latest
 * question wins.
 * @param wanted false where there is nothing to compare
 * @returns null until the draws for these very answers are done
 */
export function useDraws(edition: Edition | undefined, quiz: QuizAnswers, wanted: boolean): DrawsAnswer | null {
  const question = wanted ? queryOfAnswers(quiz) : null
  const [done, setDone] = useState<{ question: string; answer: DrawsAnswer } | null>(null)

  useEffect(() => {
    if (!edition || question === null || done?.question === question) return
    let worker: Worker | undefined
    const timer = setTimeout(() => {
      worker = new Worker(new URL('./draws.worker.ts', import.meta.url), { type: 'module' })
      worker.addEventListener('message', ({ data }: MessageEvent<DrawsAnswer>) => {
        setDone({ question, answer: data })
        worker?.terminate()
      })
      const { answers } = completeRequest(toRequest(quiz))
      worker.postMessage({ edition, answers } satisfies DrawsQuestion)
    }, DRAW_DELAY_MS)
    return () => {
      clearTimeout(timer)
      worker?.terminate()
    }
  }, [edition, quiz, question, done])

  return done !== null && done.question === question ? done.answer : null
}
