import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { ConstantsTable } from '../constants-table'
import { MethodSection, Prose } from '../parts'

const { manyLimits, fewDevices, hourStep } = METHOD.changes

export function LimitsSection() {
  return (
    <MethodSection id="limits" number={7} title="Limits, and what would change the answer">
      <Prose>
        <p>
          You may set limits to price, size, weight, pen, colour, front light, water resistance, page buttons, being on
          sale, library lending, reading aloud and file formats. A budget and a largest value pass at or below, a least
          value at or above. Water resistance compares the second digit of the IEC 60529 code (X counts as not stated).
          A limit removes only devices known to fail it: what is <strong>not stated</strong>, a price in another
          currency too, keeps the device with a visible note. More than {n(manyLimits.value)} limits, or fewer than{' '}
          {n(fewDevices.value)} devices left, draws a warning. Near misses are devices that fail exactly one limit, with
          that limit and, for numbers, by how much.
        </p>
        <p>What would change the answer:</p>
        <ul>
          <li>
            for each aim, the smallest change of that one final weight within 0 to 1, the others keeping their
            proportions, after which no device is ahead of the runner-up, or that none does it;
          </li>
          <li>
            over all pairs of spots, the fewest hours, in steps of {n(hourStep.value)}, moved from one to the other that
            change first place;
          </li>
          <li>the lowest higher budget that does.</li>
        </ul>
      </Prose>
      <ConstantsTable caption="Constants of limits and changes" constants={Object.values(METHOD.changes)} />
    </MethodSection>
  )
}
