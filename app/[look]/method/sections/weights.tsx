import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { AIMS } from '@/lib/method/types'
import { rankOrderCentroid } from '@/lib/method/weights'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const W = METHOD.weights
const F = W.adaptation.value
const places = rankOrderCentroid(AIMS.length).map((weight) => n(Number(weight.toFixed(4))))

export function WeightsSection() {
  return (
    <MethodSection id="weights" number={5} title="Weights">
      <Prose>
        <p>
          You put the four aims in order, ties allowed. The order becomes rank-order-centroid weights:{' '}
          {places.join(', ')} for first to last place; tied aims share the mean of their places. Or you set the weights
          by hand: then those, rescaled to sum to 1, are final, and the light does not multiply them.
        </p>
      </Prose>
      <Formula>
        <var>w</var>
        <sub>i</sub> = ¼·Σ<sub>j ≥ i</sub> 1/<var>j</var>
      </Formula>
      <Prose>
        <p>
          Your light then multiplies them, and they are rescaled to sum to 1. Without a front light, dimmer light makes
          lightness count for more; in bright light, for normal text and usual eyes, every page is light enough.
          Clarity’s multiplier compares the two reference pages in your light with the same at {n(W.referenceLux.value)}{' '}
          lux, with μ = clamp(log R; 0, log {n(METHOD.reserve.bestReading.value)}), and μ = 0 where R is 0:
        </p>
      </Prose>
      <Formula>
        <var>m</var>
        <sub>clarity</sub> = clamp( Σ η(<var>μ</var>
        <sub>bright</sub> − <var>μ</var>
        <sub>dim</sub>) / (<var>μ</var>
        <sub>bright</sub> − <var>μ</var>
        <sub>dim</sub>)<sub>{n(W.referenceLux.value)} lx</sub>; {n(W.clarityLeast.value)}, {n(W.clarityMost.value)} )
      </Formula>
      <Prose>
        <p>
          Dim light hides a tint. For whiteness and tint the multiplier is the colourfulness part of CIECAM16, never
          taken below {n(W.leastLux.value)} lux; for handling it is 1.
        </p>
      </Prose>
      <Formula>
        <var>m</var>
        <sub>whiteness</sub> = <var>m</var>
        <sub>tint</sub> = Σ η·(<var>F</var>
        <sub>L</sub>(max(<var>E</var>, {n(W.leastLux.value)}))/<var>F</var>
        <sub>L</sub>({n(W.referenceLux.value)}))<sup>{n(W.colourfulnessPower.value)}</sup>
        <br />
        <var>L</var>
        <sub>A</sub> = {n(W.adaptingShare.value)}·<var>E</var>/π; <var>k</var> = 1/({n(F.light)}
        <var>L</var>
        <sub>A</sub> + 1); <var>F</var>
        <sub>L</sub> = {n(F['low light'])}
        <var>k</var>
        <sup>4</sup>·{n(F.light)}
        <var>L</var>
        <sub>A</sub> + {n(F['high light'])}(1 − <var>k</var>
        <sup>4</sup>)²({n(F.light)}
        <var>L</var>
        <sub>A</sub>)<sup>1/{n(F.root)}</sup>
      </Formula>
      <Prose>
        <p>Under a front light the page’s tint mixes with the colour of the lamp, which the sphere does not see.</p>
      </Prose>
      <ConstantsTable caption="Constants of the weights" constants={Object.values(METHOD.weights)} />
    </MethodSection>
  )
}
