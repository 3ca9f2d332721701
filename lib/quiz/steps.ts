import type { Step } from './answers'

type StepWords = {
  /** The step's heading. */
  heading: string
  /** What it is about, behind "Next:" and in the document's title. */
  about: string
  intro: string
}

export const STEP_WORDS: Record<Step, StepWords> = {
  1: {
    heading: 'What do you read, and how do you hold it?',
    about: 'what you read',
    intro:
      'Size and weight are judged by this. How much of each counts only beside the others; leave out what you never read.',
  },
  2: {
    heading: 'Where do you read, and for how long?',
    about: 'where you read',
    intro:
      'Hours in an ordinary week. Rough is fine: what counts is the share of your reading that happens in each light.',
  },
  3: {
    heading: 'How much light and how large a type do you like?',
    about: 'your eyes and your type size',
    intro: 'Small type and a wish for more light both ask for more contrast, so light pages count for more.',
  },
  4: {
    heading: 'What matters most to you?',
    about: 'what matters',
    intro:
      'Give each of the four a place. Two may share one; what you leave open comes last. Your light has its say too: a tint, for one, hardly shows by a dim lamp.',
  },
  5: {
    heading: 'What must it have, and what not?',
    about: 'your limits',
    intro:
      'Only what you could not do without: each limit takes devices away, whatever their page is like. A device whose maker does not state something stays, with a note.',
  },
}

/** The title of a step's page, without the site's name. */
export function stepTitle(step: Step, wrong = false): string {
  return `${wrong ? 'Please correct: s' : 'S'}tep ${step} of 5, ${STEP_WORDS[step].about}`
}
