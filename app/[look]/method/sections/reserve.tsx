import { formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import {
  contrastReserve,
  MODEL_RANGE,
  pupilRadius,
  retinalIlluminance,
  THRESHOLD_MODEL,
  thresholdContrast,
} from '@/lib/vision/contrast-reserve'
import { VISION_CONSTANTS } from '../constants'
import { ConstantsTable } from '../constants-table'
import { Formula, MethodSection, Prose } from '../parts'

const { pupil, lens, ageing, log, size } = THRESHOLD_MODEL
const { spotReading, fluentReading, bestReading } = METHOD.reserve

/** The model worked once, so that others can hold their own arithmetic to ours. */
const CHECK = { luminance: 10, age: 40, size: 4.8 }
const CHECK_CONTRAST = 0.9

export function ReserveSection() {
  const radius = pupilRadius(CHECK.luminance)
  const troland = retinalIlluminance(CHECK.luminance, CHECK.age)
  const threshold = thresholdContrast(CHECK)
  const reserve = contrastReserve({ ...CHECK, contrast: CHECK_CONTRAST })
  return (
    <MethodSection id="reserve" number={3} title="Contrast reserve">
      <Prose>
        <p>
          The less light there is, the more contrast an eye needs to see a letter at all. The contrast reserve says how
          many times more contrast a page gives than that. The least contrast is that of Rea and Ouellette’s model, from
          the luminance of the page (L, at most {n(MODEL_RANGE.highestLuminance)} cd/m²), the observer’s age (A) and the
          size of the target (ω, in microsteradians). log is to base 10.
        </p>
      </Prose>
      <Formula>
        <var>r</var> = {n(pupil.middle)} − {n(pupil.swing)}·tanh({n(pupil.slope)}·log <var>L</var>), pupil radius in mm
        <br />
        <var>I</var> = <var>L</var>·π·<var>r</var>²·(1 − {n(lens.lossPerYear)}(<var>A</var> − {n(lens.baseAge)})), light
        on the retina in troland
        <br />
        <var>p</var>
        <sub>1</sub> = log tanh({n(size.perSteradian)}·<var>ω</var>·10<sup>−6</sup>); <var>p</var>
        <sub>2</sub> = log log(10·<var>I</var>/π)
        <br />
        <var>C</var>
        <sub>t</sub> = (1 + {n(ageing.rise)}/{n(ageing.overYears)}·(<var>A</var> − {n(lens.baseAge)})) · 10<sup>q</sup>,
        with
        <br />
        <var>q</var> = {n(log.constant)} {term(log.size)}
        <var>p</var>
        <sub>1</sub> {term(log.light)}
        <var>p</var>
        <sub>2</sub> {term(log.size2)}
        <var>p</var>
        <sub>1</sub>² {term(log.light2)}
        <var>p</var>
        <sub>2</sub>² {term(log.sizeLight)}
        <var>p</var>
        <sub>1</sub>
        <var>p</var>
        <sub>2</sub>
        <br />
        <var>R</var> = <var>C</var>/<var>C</var>
        <sub>t</sub>
      </Formula>
      <Prose>
        <p>
          R is 0 where the page is darker than {n(MODEL_RANGE.lowestLuminance)} cd/m², or log(10·I/π) is under{' '}
          {n(MODEL_RANGE.lowestLogRetinal)}: there the model says nothing. To check your own arithmetic: at A{' '}
          {n(CHECK.age)}, ω {n(CHECK.size)}, L {n(CHECK.luminance)}, r is {n(Number(radius.toFixed(6)))}, I is{' '}
          {n(Number(troland.toFixed(6)))}, C<sub>t</sub> is {n(Number(threshold.toFixed(8)))}, and a contrast of{' '}
          {n(CHECK_CONTRAST)} has the reserve {n(Number(reserve.toFixed(3)))}.
        </p>
        <p>
          Reading is possible in spots from a reserve of {n(spotReading.value)}, fluent from {n(fluentReading.value)},
          and gains nothing more past {n(bestReading.value)}; between, ρ = clamp(log R; log {n(spotReading.value)}, log{' '}
          {n(bestReading.value)}). These anchors are for letters and from memory, the model’s thresholds for targets of
          the size of a reading task; carrying one to the other is house, as is using the model outside the luminances
          it was fitted to, which its paper may state but we could not see.
        </p>
        <p>
          We never ask your age. “Do you often want more light than the people around you?” stands for an observer’s
          age, and the size of your text for that of the target.
        </p>
      </Prose>
      <ConstantsTable
        caption="Constants of the contrast reserve"
        constants={[...VISION_CONSTANTS, ...Object.values(METHOD.reserve)]}
      />
    </MethodSection>
  )
}

/** A coefficient with its sign before it: "− 0.178589·". */
const term = (coefficient: number) => `${coefficient < 0 ? '−' : '+'} ${n(Math.abs(coefficient))}·`
