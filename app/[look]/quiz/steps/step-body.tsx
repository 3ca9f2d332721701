import type { Problem } from '@/lib/quiz/address'
import type { Step } from '@/lib/quiz/answers'
import type { FieldName } from '@/lib/quiz/fields'
import { EyesStep } from './eyes-step'
import { LimitsStep } from './limits-step'
import { MattersStep } from './matters-step'
import { ReadingStep } from './reading-step'
import { SpotsStep } from './spots-step'

/** What a step's questions need: the text each field opens with, and what is wrong with it. */
export type StepProps = {
  text: (field: FieldName) => string | undefined
  error: (field: FieldName) => string | undefined
}

/** The questions of a step. Every field is native and named as in the address. */
export function StepBody({
  step,
  texts,
  problems,
  formats,
}: {
  step: Step
  texts: ReadonlyMap<FieldName, string>
  problems: readonly Problem[]
  formats: readonly string[]
}) {
  const props: StepProps = {
    text: (field) => texts.get(field),
    error: (field) => problems.find((problem) => problem.field === field)?.message,
  }
  switch (step) {
    case 1:
      return <ReadingStep {...props} />
    case 2:
      return <SpotsStep {...props} />
    case 3:
      return <EyesStep {...props} />
    case 4:
      return <MattersStep {...props} />
    case 5:
      return <LimitsStep {...props} formats={formats} />
  }
}
