import { STEPS, type Step } from '@/lib/quiz/answers'

/** How far one is, as five bars; the words stand below it. */
export function Progress({ step }: { step: Step }) {
  return (
    <div aria-hidden="true" className="grid grid-cols-5 gap-1.5">
      {STEPS.map((one) => (
        <span
          key={one}
          className={`h-1.25 rounded-card paper:h-2.5 paper:border paper:border-ink ${one < step ? 'bg-shade' : one === step ? 'bg-brass-lit' : 'bg-rule paper:bg-sheet'}`}
        />
      ))}
    </div>
  )
}
