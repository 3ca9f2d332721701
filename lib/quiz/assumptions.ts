import { formatList } from '@/lib/format/list'
import { type QuizAnswers, STEPS, type Step } from './answers'

/** A part of the question that the method fills in where the reader did not answer. */
type Assumable = 'reads' | 'hold' | 'spots' | 'lightNeed' | 'text' | 'aims' | 'preferredWhite' | 'limits'

/** By step: what is asked, and what the defaults of Method 1 are in words. A test holds the words to the defaults. */
export const ASSUMED: Record<Assumable, { step: Step; topic: string; words: string }> = {
  reads: { step: 1, topic: 'what you read', words: 'mostly novels and a few articles' },
  hold: { step: 1, topic: 'how you hold it', words: 'a device held in two hands' },
  spots: {
    step: 2,
    topic: 'where you read',
    words: '5 hours a week in bed by a small lamp and 2 on a train or in a café by day',
  },
  lightNeed: { step: 3, topic: 'how much light you want', words: 'the usual need for light' },
  text: { step: 3, topic: 'type size', words: 'type of normal size' },
  aims: { step: 4, topic: 'what matters', words: 'four aims that matter alike' },
  preferredWhite: { step: 4, topic: 'the white you like', words: 'a neutral white' },
  limits: { step: 5, topic: 'limits', words: 'no limits' },
}

function isAssumable(field: string): field is Assumable {
  return Object.hasOwn(ASSUMED, field)
}

/** What is assumed where a step is passed over: "Not sure? Then we assume …". */
export function assumedOnSkipping(step: Step): string {
  return formatList(
    Object.values(ASSUMED)
      .filter((one) => one.step === step)
      .map((one) => one.words),
  )
}

export type Assumptions = {
  /** Topics not answered yet, in the order of the steps; and those the reader was not sure of. */
  open: string[]
  unsure: string[]
  /** What is assumed instead, as the end of a sentence; empty where nothing is. */
  words: string
}

/** What is assumed of a reader, in words. @param assumed fields as `completeAnswers` names them */
export function assumptionsOf(assumed: readonly string[], { skipped }: Pick<QuizAnswers, 'skipped'>): Assumptions {
  const fields = STEPS.flatMap((step) => assumed.filter(isAssumable).filter((field) => ASSUMED[field].step === step))
  const unsure = fields.filter((field) => skipped.includes(ASSUMED[field].step))
  return {
    open: fields.filter((field) => !unsure.includes(field)).map((field) => ASSUMED[field].topic),
    unsure: unsure.map((field) => ASSUMED[field].topic),
    words: formatList(fields.map((field) => ASSUMED[field].words)),
  }
}
