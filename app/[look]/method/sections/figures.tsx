import { D65_10 } from '@/lib/colour/white'
import { WHITENESS_D65_10, WHITENESS_FACTORS, WHITENESS_LIMITS } from '@/lib/colour/whiteness'
import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { GRUBBS_ALPHA } from '@/lib/stats/grubbs'
import { COLOUR_CONSTANTS } from '../constants'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const { xn, yn, tintX } = WHITENESS_D65_10
const { x: toX, y: toY, tintY } = WHITENESS_FACTORS
const { lowest, perY, belowY, tintLowest, tintHighest } = WHITENESS_LIMITS
const { coverage, unitFloor, leastReadings, leastLightness } = METHOD.figures

export function FiguresSection() {
  return (
    <MethodSection id="figures" number={1} title="From readings to a published figure">
      <Prose>
        <p>
          We lay a sphere spectrophotometer on the page and read how much of each colour of light it gives back:
          geometry d/8° with the specular part included (d/8:i), illuminant D65, CIE 1964 10° observer. Readings with
          the specular part excluded may be recorded beside them and are never mixed in. Every device is read in two
          states: the <strong>page</strong> (full white after a full refresh, front light off) and the{' '}
          <strong>ink</strong> (full black). Both are required: a page alone hides a protecting film or a glossy cover.
        </p>
        <p>
          A <em>set</em> is one unit, one position, one state and one session, with at least {n(leastReadings.value)}{' '}
          readings. Nothing is deleted: a reading is left out only for a reason that stays beside it, and stays visible
          itself. Grubbs’ two-sided test at α = {n(GRUBBS_ALPHA)} flags, a person decides. A set’s figure is the mean of
          its accepted readings, a unit’s the mean of its sets, a device’s the mean of its units. While measuring, the
          bench shows the half-width t·s/√n (Student, 95 %).
        </p>
        <p>
          The doubt of a figure has three parts. What is the <strong>device’s own</strong> comes from how much readings
          scatter within a set (s<sub>r</sub>), positions within a unit (s<sub>pos</sub>) and units within a model (s
          <sub>unit</sub>), pooled over all devices of the edition; k units, m sets and N readings make it smaller.
          While fewer than {n(METHOD.figures.modelsForUnitSpread.value)} models have two or more units, s<sub>unit</sub>{' '}
          is at least {n(unitFloor.value.L)} (L*), {n(unitFloor.value.a)} (a*) and {n(unitFloor.value.b)} (b*). So a
          device known from one unit is less sure; it is marked provisional. The <strong>session’s</strong> part, s
          <sub>session</sub>, is how much the control tile differs from session to session; a device carries the share
          of its sets in each. The <strong>common</strong> part, u<sub>common</sub>, is the calibration and its
          certificate: it moves all pages together and hardly changes a ranking.
        </p>
      </Prose>
      <Formula>
        <var>u</var>² = <var>s</var>
        <sub>unit</sub>²/<var>k</var> + <var>s</var>
        <sub>pos</sub>²/<var>m</var> + <var>s</var>
        <sub>r</sub>²/<var>N</var>
        <br />
        <var>U</var> = {n(coverage.value)}·√(<var>u</var>² + <var>s</var>
        <sub>session</sub>²·Σ share² + <var>u</var>
        <sub>common</sub>²)
      </Formula>
      <Prose>
        <p>
          U is about 95 % (JCGM 100). For the difference of two devices the common part drops out, and so does the
          session part where they share one. The doubts of whiteness, tint, contrast and chroma follow by first-order
          propagation with numerical derivatives (JCGM 100, 5.1.2), channels independent. A page of L* under{' '}
          {n(leastLightness.value)} or outside 0 to 100 gets no figures.
        </p>
        <p>
          L*a*b* become X, Y, Z by ISO/CIE 11664-4, with the linear branch below (6/29)³, and the white X<sub>n</sub>{' '}
          {n(D65_10.X)}, Y<sub>n</sub> {n(D65_10.Y)}, Z<sub>n</sub> {n(D65_10.Z)}. Y is the light given back, in percent
          of a perfect diffuser; x and y are the chromaticity.
        </p>
      </Prose>
      <Formula>
        <var>W</var>
        <sub>10</sub> = <var>Y</var> + {n(toX)}({n(xn)} − <var>x</var>) + {n(toY)}({n(yn)} − <var>y</var>)
        <br />
        <var>T</var>
        <sub>10</sub> = {n(tintX)}({n(xn)} − <var>x</var>) − {n(tintY)}({n(yn)} − <var>y</var>)
        <br />
        stated limits: {n(lowest)} &lt; <var>W</var>
        <sub>10</sub> &lt; {n(perY)}
        <var>Y</var> − {n(belowY)} and {n(tintLowest)} &lt; <var>T</var>
        <sub>10</sub> &lt; {n(tintHighest)}
      </Formula>
      <Prose>
        <p>
          <strong>† Outside the formula’s limits.</strong> CIE vouches for whiteness and tint only inside the limits
          above (CIE 15; ISO 11475). There is no room between them unless Y is over {n((lowest + belowY) / perY)}, about
          L* 84, so every electronic-paper page is outside. We publish both because readers ask for them, mark them †
          wherever they stand, and never sort by whiteness of our own accord: at L* 70 one unit of b* outweighs four of
          L*, so a list by whiteness is a list by blueness.
        </p>
        <p>
          Also shown: the chroma C*<sub>ab</sub> = √(a*² + b*²) and the hue angle of the page; the contrast ratio Y
          <sub>page</sub>/Y<sub>ink</sub>, always with its geometry; the difference ΔE<sub>00</sub> from the named
          control paper (ISO/CIE 11664-6); and how many times the light of that paper a page needs, Y<sub>paper</sub>/Y
          <sub>page</sub>. A place in a list is given with the band it may truly hold: devices whose difference is
          within its doubt may change places.
        </p>
      </Prose>
      <ConstantsTable
        caption="Constants of the figures"
        constants={[...Object.values(METHOD.figures), ...COLOUR_CONSTANTS]}
      />
    </MethodSection>
  )
}
