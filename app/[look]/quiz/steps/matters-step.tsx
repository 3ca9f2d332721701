import { AIM_NAMES } from '@/components/aims'
import { Sheet } from '@/components/sheet'
import { RadioGroup } from '@/components/ui/radio-group'
import { formatOrdinal } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { AIMS, WHITES } from '@/lib/method/types'
import { PLACES } from '@/lib/quiz/answers'
import { WHITE_NAMES } from '@/lib/quiz/words'
import { ChoiceRow } from './choice-row'
import { Extremes } from './extremes'
import type { StepProps } from './step-body'

const PLACE_CHOICES = PLACES.map((place) => ({ value: String(place), label: formatOrdinal(place) }))
/** The whites are drawn at the lightness of an ordinary electronic page, with its ink. */
const ORDINARY = { page: 72, ink: { L: 22, a: 0, b: 0 } }

/** Step 4: the four aims in places, each with its two extremes, and the white one likes. */
export function MattersStep({ text, error }: StepProps) {
  return (
    <div className="grid gap-9">
      <div className="border-t border-rule">
        {AIMS.map((aim) => (
          <ChoiceRow
            key={aim}
            name={aim}
            legend={AIM_NAMES[aim]}
            hint={<Extremes aim={aim} />}
            error={error(aim)}
            choices={PLACE_CHOICES}
            defaultValue={text(aim)}
          />
        ))}
        <p className="mt-3 text-note text-soft paper:hidden">
          The pages drawn are the fixed references every device is judged between, approximate on your display.
        </p>
      </div>
      <RadioGroup
        name="white"
        legend="Which white do you like a page to be?"
        legendClassName="font-heading text-h3 font-semibold"
        hint="Tint and whiteness are judged from there."
        error={error('white')}
        layout="row"
        options={WHITES.map((white) => {
          const { a, b } = METHOD.criteria.preferredWhite.value[white]
          return {
            value: white,
            label: (
              <span className="flex items-center gap-3">
                <span aria-hidden="true" className="rounded-card bg-booth p-1 paper:hidden">
                  <Sheet page={{ L: ORDINARY.page, a, b }} ink={ORDINARY.ink} size="thumb" />
                </span>
                {WHITE_NAMES[white]}
              </span>
            ),
          }
        })}
        defaultValue={text('white')}
      />
    </div>
  )
}
