import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const C = METHOD.criteria
const H = METHOD.handling
const state = ({ L, a, b }: { L: number; a: number; b: number }) => `L* ${n(L)}, a* ${n(a)}, b* ${n(b)}`

export function CriteriaSection() {
  const halfWeight = n(H.resolutionShare.value)
  return (
    <MethodSection id="criteria" number={4} title="Four criteria, each scored from 0 to 1">
      <Prose>
        <p>
          Every score lies between two fixed reference pages, so that adding a device never reorders the others. The
          bright page has {state(C.brightPage.value)} and ink of L* {n(C.brightInk.value)}; the dim page{' '}
          {state(C.dimPage.value)} and ink of L* {n(C.dimInk.value)}. Both count as having a front light of{' '}
          {n(C.referenceFrontLight.value)} cd/m² in spots where one may be used. η is a spot’s share of your hours.
        </p>
        <h3 className="pt-4">Clarity</h3>
        <p>How easily the text reads in your spots, by the contrast reserve:</p>
      </Prose>
      <Formula>
        clarity = clamp( Σ η(<var>ρ</var>
        <sub>device</sub> − <var>ρ</var>
        <sub>dim</sub>) / Σ η(<var>ρ</var>
        <sub>bright</sub> − <var>ρ</var>
        <sub>dim</sub>) )
      </Formula>
      <Prose>
        <p>
          Where the denominator is below {n(C.alike.value)} all references read alike: the score is 1 if the numerator
          is at least −{n(C.alike.value)}, else 0. <em>Unreadable</em> is the share of hours in spots where R is under{' '}
          {n(METHOD.reserve.spotReading.value)}, and exactly 1 when no spot can be read.
        </p>
        <h3 className="pt-4">Whiteness</h3>
        <p>
          How near the page comes to white as you like it. (a<sub>p</sub>, b<sub>p</sub>) is the white you prefer. The{' '}
          <em>max</em> is house: W rises steeply with blueness, so a page earns nothing for being bluer than that white.
        </p>
      </Prose>
      <Formula>
        whiteness = clamp( (<var>W</var>
        <sub>10</sub>(<var>L</var>*, <var>a</var>* − <var>a</var>
        <sub>p</sub>, max(<var>b</var>* − <var>b</var>
        <sub>p</sub>, 0)) − <var>W</var>
        <sub>dim</sub>) / (<var>W</var>
        <sub>bright</sub> − <var>W</var>
        <sub>dim</sub>) )
      </Formula>
      <Prose>
        <h3 className="pt-4">Tint</h3>
        <p>How little the page’s colour strays from that white:</p>
      </Prose>
      <Formula>
        tint = clamp( 1 − √((<var>a</var>* − <var>a</var>
        <sub>p</sub>)² + (<var>b</var>* − <var>b</var>
        <sub>p</sub>)²)/{n(C.tintSpan.value)} )
      </Formula>
      <Prose>
        <h3 className="pt-4">Handling</h3>
        <p>Whether it is the right size for what you read, light for how you hold it, and fine enough:</p>
      </Prose>
      <Formula>
        handling = ( size + hold·clamp(({n(H.heaviest.value)} − grams)/{n(H.weightSpan.value)}) + {halfWeight}
        ·clamp((ppi − {n(H.coarsest.value)})/{n(H.resolutionSpan.value)}) ) / (
        {n(H.sizeShare.value + H.resolutionShare.value)} + hold)
      </Formula>
      <Prose>
        <p>
          <em>size</em> is summed over what you read, each by its share: a trapezoid of the diagonal, 0 at the outer and
          1 between the inner numbers of the table. A term whose value is not stated is left out with its weight, so
          that it neither helps nor harms by itself, and the result names it. With no kind of reading given the size is
          left out; with nothing known, handling is 0.
        </p>
      </Prose>
      <ConstantsTable
        caption="Constants of the criteria"
        constants={[...Object.values(METHOD.criteria), ...Object.values(METHOD.handling)]}
      />
    </MethodSection>
  )
}
