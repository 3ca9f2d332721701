import { formatExact, formatNumber as n, THIN_SPACE } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { inkContrast, pageLuminance } from '@/lib/method/light'
import {
  contrastReserve,
  MODEL_RANGE,
  pupilRadius,
  READING_ANCHORS,
  retinalIlluminance,
  THRESHOLD_MODEL,
  thresholdContrast,
} from '@/lib/vision/contrast-reserve'
import { put, type Step } from './step'

export type Seen = {
  /** Luminance factors of page and ink, percent. */
  yPage: number
  yInk: number
  /** Light on the page, lux, 0–200,000; most a front light may add, cd/m², 0 for none. */
  lux: number
  frontLight: number
  /** Observer's age, 20–65 years; target size, µsr, above 0. */
  age: number
  size: number
}

export type ReserveFigures = {
  /** cd/m², of the page in this light, and as far as the model counts it. */
  luminance: number
  counted: number
  contrast: number
  /** mm; td; null where the page is too dark for the model. */
  pupil: number | null
  troland: number | null
  /** Least contrast that is seen; null outside the model. */
  threshold: number | null
  /** 0 outside the model. */
  reserve: number
}

/** Contrast reserve of a page in one light, with what it is made of. Method 1, sections 2 and 3. */
export function reserveFigures({ yPage, yInk, lux, frontLight, age, size }: Seen): ReserveFigures {
  const luminance = pageLuminance(lux, yPage, frontLight)
  const counted = Math.min(luminance, MODEL_RANGE.highestLuminance)
  const contrast = inkContrast(yPage, yInk)
  const threshold = thresholdContrast({ luminance, age, size })
  const bright = luminance >= MODEL_RANGE.lowestLuminance
  return {
    luminance,
    counted,
    contrast,
    pupil: bright ? pupilRadius(counted) : null,
    troland: bright ? retinalIlluminance(counted, age) : null,
    threshold: Number.isFinite(threshold) ? threshold : null,
    reserve: contrastReserve({ contrast, luminance, age, size }),
  }
}

/** The same, step by step. */
export function reserveSteps(seen: Seen): Step[] {
  const f = reserveFigures(seen)
  const { pupil, lens, source } = THRESHOLD_MODEL
  const comfort = METHOD.light.comfort.value
  const ambient = pageLuminance(seen.lux, seen.yPage, 0)
  const steps: Step[] = [
    {
      id: 'luminance',
      name: 'Luminance of the page in this light',
      formula: `L = E·Y/(100·π), and from a front light what is missing to ${n(comfort)} cd/m², as far as it goes`,
      worked: `L = ${formatExact(seen.lux)}·${n(seen.yPage, 3)}/(100·π) = ${short(ambient)}; front light + ${short(f.luminance - ambient)}`,
      result: `L ${short(f.luminance)}${THIN_SPACE}cd/m²`,
      source: 'a matte surface, Lambert’s law; the front light’s use is house',
      note: f.luminance > f.counted ? `More than ${n(f.counted)} cd/m² counts as ${n(f.counted)}.` : undefined,
    },
    {
      id: 'ink-contrast',
      name: 'Contrast of ink on page',
      formula: 'C = max(0, 1 − Y(ink)/Y(page))',
      worked: `C = 1 − ${n(seen.yInk, 3)}/${n(seen.yPage, 3)}`,
      result: `C ${n(f.contrast, 4)}`,
      source: 'Method 1, section 2',
    },
  ]
  if (f.pupil === null || f.troland === null || f.threshold === null) {
    return [
      ...steps,
      {
        id: 'reserve',
        name: 'Contrast reserve',
        formula: 'R = C/Ct',
        worked: `L is under ${formatExact(MODEL_RANGE.lowestLuminance)} cd/m², or log(10·I/π) under ${formatExact(MODEL_RANGE.lowestLogRetinal)}: outside the model`,
        result: 'R 0: it cannot be read in this light',
        source: 'house limits of the model',
      },
    ]
  }
  return [
    ...steps,
    {
      id: 'retina',
      name: 'Light on the retina',
      formula: `r = ${formatExact(pupil.middle)} − ${formatExact(pupil.swing)}·tanh(${formatExact(pupil.slope)}·log L); I = L·π·r²·(1 − ${formatExact(lens.lossPerYear)}·(A − ${lens.baseAge}))`,
      worked: `r = ${formatExact(pupil.middle)} − ${formatExact(pupil.swing)}·tanh(${formatExact(pupil.slope)}·log ${short(f.counted)}) = ${n(f.pupil, 4)}; I = ${short(f.counted)}·π·${n(f.pupil, 4)}²·(1 − ${formatExact(lens.lossPerYear)}·${put(seen.age - lens.baseAge, 0)})`,
      result: `r ${n(f.pupil, 3)}${THIN_SPACE}mm, I ${short(f.troland)}${THIN_SPACE}td`,
      source,
    },
    {
      id: 'threshold',
      name: 'Least contrast this eye sees there',
      formula: 'Ct from I, A and ω, by the formula of section 3',
      worked: `A ${formatExact(seen.age)} years, ω ${formatExact(seen.size)} µsr, I ${short(f.troland)} td`,
      result: `Ct ${n(f.threshold, 5)}`,
      source,
    },
    {
      id: 'reserve',
      name: 'Contrast reserve',
      formula: 'R = C/Ct',
      worked: `R = ${n(f.contrast, 4)}/${n(f.threshold, 5)}`,
      result: `R ${n(f.reserve, 1)} times, ${reserveWords(f.reserve)}`,
      source: READING_ANCHORS.source,
      note: 'The anchors of reading are from memory, and carrying them to this model is house.',
    },
  ]
}

/** What a reserve lets one do, by the anchors 3, 10 and 30. */
export function reserveWords(reserve: number): string {
  const { spot, fluent, best } = READING_ANCHORS
  if (reserve < spot) return `under ${n(spot)}: too little to read`
  if (reserve < fluent) return `enough to read, short of fluent (${n(fluent)})`
  if (reserve < best) return `enough to read fluently, short of the best rate (${n(best)})`
  return `all that the best reading rate asks for (${n(best)})`
}

/** A number with the digits that matter, however small or large. */
function short(value: number): string {
  if (value === 0) return '0'
  return Math.abs(value) >= 100 ? n(value, 1) : Math.abs(value) >= 1 ? n(value, 2) : n(value, 4)
}
