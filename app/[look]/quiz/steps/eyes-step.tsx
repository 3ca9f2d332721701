import { RadioGroup } from '@/components/ui/radio-group'
import { LIGHT_NEEDS, TEXT_SIZES, type TextSize } from '@/lib/method/types'
import { NEED_NAMES, SIZE_NAMES } from '@/lib/quiz/words'
import type { StepProps } from './step-body'

const SIZE_HINTS: Record<TextSize, string> = {
  small: 'Like the footnotes of a paperback',
  normal: 'Like the text of a paperback',
  large: 'Like a large-print book',
}
/** Drawn sizes of the sample, rough, since no page knows how far away it is read. */
const SIZE_LOOKS: Record<TextSize, string> = { small: 'text-note', normal: 'text-lead', large: 'text-h2' }

/** Step 3: the wish for light, asked as a wish and never as age, and the size of type. */
export function EyesStep({ text, error }: StepProps) {
  return (
    <div className="grid gap-9">
      <RadioGroup
        name="light-need"
        legend="Do you often want more light than the people around you?"
        legendClassName="font-heading text-h3 font-semibold"
        error={error('light-need')}
        layout="row"
        options={LIGHT_NEEDS.map((need) => ({ value: need, label: NEED_NAMES[need] }))}
        defaultValue={text('light-need')}
      />
      <RadioGroup
        name="type-size"
        legend="How large do you set the type?"
        legendClassName="font-heading text-h3 font-semibold"
        error={error('type-size')}
        options={TEXT_SIZES.map((size) => ({
          value: size,
          label: (
            <span className="flex items-center gap-4">
              <span>{SIZE_NAMES[size]}</span>
              <span aria-hidden="true" className={`font-heading leading-none ${SIZE_LOOKS[size]}`}>
                the rain had come in
              </span>
            </span>
          ),
          hint: SIZE_HINTS[size],
        }))}
        defaultValue={text('type-size')}
      />
      <p className="max-w-[58ch] text-note text-soft">
        This is not medical advice, and comfort or “eye strain” are not rated. Sudden changes in sight, pain or haloes
        belong to an eye-care professional.
      </p>
    </div>
  )
}
