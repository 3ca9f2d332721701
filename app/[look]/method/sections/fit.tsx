import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const { draws, clearlyAheadPercent, rankLowPermille, rankHighPermille } = METHOD.ties

export function FitSection() {
  return (
    <MethodSection id="fit" number={6} title="Fit, ties and ranks">
      <Prose>
        <p>
          The fit is a sum of points, one part for each aim; the parts add up to it exactly, and every result shows
          them.
        </p>
      </Prose>
      <Formula>
        fit = 100·(1 − unreadable)·Σ <var>w</var>
        <sub>c</sub>·<var>s</var>
        <sub>c</sub>
      </Formula>
      <Prose>
        <p>
          How sure a place is we find by drawing the measurement errors again and again (JCGM 101), {n(draws.value)}{' '}
          times or more, over the devices your limits leave, with the weights held. Each draw has normal errors in each
          channel: one common to all devices and one for each session (times a device’s share in it), on page and ink
          alike, for ink on L* only; and one for each device, channel and state. L* is held to 0 to 100. The generator
          is seeded from the edition, the method and your answers, with a stream of its own for each device and session,
          so the same question always gets the same answer, and a device that is left out leaves the others’ draws
          alone. (Names are hashed by MurmurHash3 into the state of xoshiro128**; Marsaglia’s polar method makes its
          numbers normal.)
        </p>
        <p>
          In a draw a device’s rank is 1 plus the number strictly ahead; first place is shared equally among those
          level. We report the standard deviation of the fit (n − 1), the share of draws in first place, and the
          interval from the {n(rankLowPermille.value / 10)} to the {n(rankHighPermille.value / 10)} percentile of the
          rank (nearest rank).
        </p>
        <p>
          Order is by fit, equal fits by name in the address. Two devices are <strong>too close to call</strong> where
          the one with the higher fit is strictly ahead in fewer than {n(clearlyAheadPercent.value)} % of draws. On the
          page a group is the highest device not yet grouped and those directly below it while each is too close to that
          first one.
        </p>
      </Prose>
      <ConstantsTable caption="Constants of ties and ranks" constants={Object.values(METHOD.ties)} />
    </MethodSection>
  )
}
