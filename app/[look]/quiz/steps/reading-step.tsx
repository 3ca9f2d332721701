import { RadioGroup } from '@/components/ui/radio-group'
import { HOLDS, READING_KINDS } from '@/lib/method/types'
import { AMOUNTS } from '@/lib/quiz/answers'
import { AMOUNT_NAMES, HOLD_NAMES, KIND_NAMES } from '@/lib/quiz/words'
import { ChoiceRow } from './choice-row'
import type { StepProps } from './step-body'

const AMOUNT_CHOICES = AMOUNTS.map((amount) => ({ value: String(amount), label: AMOUNT_NAMES[amount] }))

/** Step 1: how much of each kind one reads, and how one holds the device. */
export function ReadingStep({ text, error }: StepProps) {
  return (
    <div className="grid gap-8">
      <div className="border-t border-rule">
        {READING_KINDS.map((kind) => (
          <ChoiceRow
            key={kind}
            name={kind}
            legend={KIND_NAMES[kind]}
            error={error(kind)}
            choices={AMOUNT_CHOICES}
            defaultValue={text(kind)}
          />
        ))}
      </div>
      <RadioGroup
        name="hold"
        legend="How do you hold it, most of the time?"
        legendClassName="font-heading text-h3 font-semibold"
        hint="In one hand a light device counts for more; on a table weight counts for nothing."
        error={error('hold')}
        layout="row"
        options={HOLDS.map((hold) => ({ value: hold, label: HOLD_NAMES[hold] }))}
        defaultValue={text('hold')}
      />
    </div>
  )
}
