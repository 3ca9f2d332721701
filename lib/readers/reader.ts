import { completeRequest } from '@/lib/contract/complete-request'
import type { Answers } from '@/lib/method/types'
import type { Address } from '@/lib/quiz/address'
import type { QuizAnswers } from '@/lib/quiz/answers'
import { quizHref, resultHref } from '@/lib/quiz/moves'
import { toRequest } from '@/lib/quiz/request'

/** A typical reader: the answers such a reader would give in the quiz, and nothing else the picks depend on. */
export type Reader = {
  /** Its place: `/for/{slug}`. */
  slug: string
  name: string
  /** Who this is, in one line. */
  line: string
  answers: QuizAnswers
}

/** The reader's answers as an address of the quiz holds them. */
export function addressOf({ answers }: Pick<Reader, 'answers'>): Address {
  return { answers, problems: [], texts: new Map(), unknown: [] }
}

/** The question to the method, with every default filled in, and the fields it filled. */
export function questionOf({ answers }: Pick<Reader, 'answers'>): { answers: Answers; assumed: string[] } {
  return completeRequest(toRequest(answers))
}

/** Where a reader goes to change these answers to their own, from the first step on. */
export function yoursHref(reader: Pick<Reader, 'answers'>): string {
  return quizHref(1, addressOf(reader))
}

/** The full result for exactly these answers. */
export function wholeResultHref(reader: Pick<Reader, 'answers'>): string {
  return resultHref(addressOf(reader))
}
