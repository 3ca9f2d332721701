import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const { comfort, mostLux, mostHours } = METHOD.light

export function LightSection() {
  return (
    <MethodSection id="light" number={2} title="Light on the page">
      <Prose>
        <p>
          A page only gives back the light that falls on it. A spot has an illuminance E from 0 to {n(mostLux.value)}{' '}
          lux and hours a week from 0 to {n(mostHours.value)}; a spot of no hours is dropped before anything else, and
          one at least must remain. A matte page then has the luminance
        </p>
      </Prose>
      <Formula>
        <var>L</var>
        <sub>page</sub> = <var>E</var>·<var>Y</var>
        <sub>page</sub>/(100·π), in cd/m²
      </Formula>
      <Prose>
        <p>
          Where a front light may be used and the device has one, it is turned up as far as it takes to reach{' '}
          {n(comfort.value)} cd/m², a comfortable page in a dark room, or as far as it goes (F<sub>max</sub>, read on a
          white page):
        </p>
      </Prose>
      <Formula>
        <var>L</var>
        <sub>page</sub> += clamp({n(comfort.value)} − <var>L</var>
        <sub>page</sub>; 0, <var>F</var>
        <sub>max</sub>)
      </Formula>
      <Prose>
        <p>
          “None” and a maximum of 0 mean none; not stated counts as none, with a visible note. The lowest setting is
          published and shown, not scored. Page and ink give back a front light alike, so the contrast stays as
          measured: C = max(0, 1 − Y<sub>ink</sub>/Y<sub>page</sub>). (clamp(x; a, b) holds x between a and b; without
          bounds, between 0 and 1.)
        </p>
      </Prose>
      <ConstantsTable caption="Constants of the light" constants={Object.values(METHOD.light)} />
    </MethodSection>
  )
}
