import { labToXyz } from '@/lib/colour/lab'
import { D65_10, type Xyz } from '@/lib/colour/white'
import { WHITENESS_D65_10, WHITENESS_FACTORS, WHITENESS_LIMITS } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import { formatDoubt, formatExact, formatNumber as n, THIN_SPACE } from '@/lib/format/number'
import { type DerivedFigures, derivedFigures } from '@/lib/method/derived-figures'
import type { DerivedDoubts } from '@/lib/method/figure-doubts'
import type { Lab } from '@/lib/method/types'
import { put, type Step } from './step'

export type ColourFigures = DerivedFigures & Xyz & { x: number; y: number }

const LAB_SOURCE = 'ISO/CIE 11664-4; white of ASTM E308'
const SMALLEST_CUBE = 6 / 29
const { xn, yn, tintX, source: WHITENESS_SOURCE } = WHITENESS_D65_10
const { x: toX, y: toY, tintY } = WHITENESS_FACTORS
const { lowest, perY, belowY, tintLowest, tintHighest } = WHITENESS_LIMITS

/**
 * From L*, a*, b* of a page and its ink to every figure we publish of them.
 * @param page L* 20–100 @param ink L* above 0, at most 100
 * @throws RangeError outside those ranges
 */
export function colourFigures(page: Lab, ink: Lab): ColourFigures {
  const xyz = labToXyz(page)
  const { x, y } = xyzToXyy(xyz)
  return { ...derivedFigures(page, ink), ...xyz, x, y }
}

/** The same, step by step. @param doubts expanded (k = 2); null where they cannot be worked out */
export function colourSteps(page: Lab, ink: Lab, doubts: DerivedDoubts | null): Step[] {
  const f = colourFigures(page, ink)
  const doubt = (name: keyof DerivedDoubts, decimals: number) => {
    const size = doubts?.[name]
    return size === null || size === undefined ? '' : `${THIN_SPACE}${formatDoubt(size, decimals)}`
  }
  const unreal = f.X < 0 || f.Z < 0
  return [
    {
      id: 'xyz',
      name: 'Tristimulus values of the page',
      formula:
        'Y = Yₙ·g((L* + 16)/116), X = Xₙ·g((L* + 16)/116 + a*/500), Z = Zₙ·g((L* + 16)/116 − b*/200), with g(t) = t³, or (108/841)·(t − 4/29) where t ≤ 6/29',
      worked: [
        line('Y', D65_10.Y, `(${n(page.L, 3)} + 16)/116`, (page.L + 16) / 116, f.Y),
        line(
          'X',
          D65_10.X,
          `(${n(page.L, 3)} + 16)/116 + ${put(page.a, 3)}/500`,
          (page.L + 16) / 116 + page.a / 500,
          f.X,
        ),
        line(
          'Z',
          D65_10.Z,
          `(${n(page.L, 3)} + 16)/116 − ${put(page.b, 3)}/200`,
          (page.L + 16) / 116 - page.b / 200,
          f.Z,
        ),
      ].join('; '),
      result: `X ${n(f.X, 3)}, Y ${n(f.Y, 3)}, Z ${n(f.Z, 3)}`,
      source: LAB_SOURCE,
      note: unreal
        ? 'One of them is below 0: no surface has such a colour. The arithmetic goes on all the same.'
        : undefined,
    },
    {
      id: 'xy',
      name: 'Chromaticity of the page',
      formula: 'x = X/(X + Y + Z), y = Y/(X + Y + Z)',
      worked: `x = ${n(f.X, 3)}/${n(f.X + f.Y + f.Z, 3)}, y = ${n(f.Y, 3)}/${n(f.X + f.Y + f.Z, 3)}`,
      result: `x ${n(f.x, 5)}, y ${n(f.y, 5)}, Y ${n(f.Y, 2)}${THIN_SPACE}%${doubt('yPage', 2)}`,
      source: 'CIE 15',
    },
    {
      id: 'whiteness',
      name: 'CIE whiteness of the page',
      formula: `W₁₀ = Y + ${n(toX)}·(${formatExact(xn)} − x) + ${n(toY)}·(${formatExact(yn)} − y)`,
      worked: `W₁₀ = ${n(f.Y, 3)} + ${n(toX)}·(${formatExact(xn)} − ${put(f.x, 5)}) + ${n(toY)}·(${formatExact(yn)} − ${put(f.y, 5)})`,
      result: `W₁₀ ${n(f.whiteness, 2)}${mark(f)}${doubt('whiteness', 2)}`,
      source: WHITENESS_SOURCE,
    },
    {
      id: 'tint',
      name: 'CIE tint of the page',
      formula: `T₁₀ = ${n(tintX)}·(${formatExact(xn)} − x) − ${n(tintY)}·(${formatExact(yn)} − y)`,
      worked: `T₁₀ = ${n(tintX)}·(${formatExact(xn)} − ${put(f.x, 5)}) − ${n(tintY)}·(${formatExact(yn)} − ${put(f.y, 5)})`,
      result: `T₁₀ ${n(f.tint, 2)}${mark(f)}${doubt('tint', 2)}, ${f.tint > 0 ? 'greenish' : f.tint < 0 ? 'reddish' : 'neither greenish nor reddish'}`,
      source: WHITENESS_SOURCE,
    },
    {
      id: 'limits',
      name: 'Whether CIE vouches for them',
      formula: `${formatExact(lowest)} < W₁₀ < ${formatExact(perY)}·Y − ${formatExact(belowY)} and ${formatExact(tintLowest)} < T₁₀ < ${formatExact(tintHighest)}`,
      worked: `${formatExact(lowest)} < ${n(f.whiteness, 2)} < ${formatExact(perY)}·${n(f.Y, 2)} − ${formatExact(belowY)} = ${n(perY * f.Y - belowY, 2)} and ${formatExact(tintLowest)} < ${n(f.tint, 2)} < ${formatExact(tintHighest)}`,
      result: f.withinLimits ? 'Inside the formula’s limits' : 'Outside the formula’s limits, marked †',
      source: 'CIE 15',
      note: f.withinLimits
        ? undefined
        : 'The figures are shown because readers ask for them, not because the formula was made for such a page.',
    },
    {
      id: 'chroma',
      name: 'Chroma and hue angle of the page',
      formula: 'C*ab = √(a*² + b*²), hab = atan2(b*, a*)',
      worked: `C*ab = √(${put(page.a, 3)}² + ${put(page.b, 3)}²), hab = atan2(${n(page.b, 3)}, ${n(page.a, 3)})`,
      result: `C*ab ${n(f.chroma, 2)}${doubt('chroma', 2)}, ${f.hue === null ? 'and a neutral has no hue' : `hab ${n(f.hue, 1)}°${doubt('hue', 1)}`}`,
      source: 'ISO/CIE 11664-4',
    },
    {
      id: 'contrast',
      name: 'Contrast ratio, d/8°, specular included',
      formula: 'Y(ink) = Yₙ·g((L*(ink) + 16)/116), ratio = Y(page)/Y(ink)',
      worked: `${line('Y(ink)', D65_10.Y, `(${n(ink.L, 3)} + 16)/116`, (ink.L + 16) / 116, f.yInk)}, ratio = ${n(f.yPage, 3)}/${n(f.yInk, 3)}`,
      result: `${n(f.contrast, 2)} to 1${doubt('contrast', 2)}`,
      source: LAB_SOURCE,
      note: f.contrast <= 1 ? 'The ink is no darker than the page: there is nothing to read.' : undefined,
    },
  ]
}

const mark = ({ withinLimits }: ColourFigures) => (withinLimits ? '' : '†')

/** One of the three, by the branch that its number falls in. */
function line(name: string, white: number, inner: string, t: number, value: number): string {
  const cubed = t > SMALLEST_CUBE ? `(${inner})³` : `(108/841)·(${inner} − 4/29)`
  return `${name} = ${formatExact(white)}·${cubed} = ${n(value, 3)}`
}
