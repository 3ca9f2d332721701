// The formulas of Method 1 once more, in plain arithmetic from the standards it names. Nothing of the product is used.

export type Lab = { L: number; a: number; b: number }
export const CHANNELS = ['L', 'a', 'b'] as const

export const average = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length

/** D65 and the 10° observer, ASTM E308. */
const WHITE = { X: 94.811, Y: 100, Z: 107.304 }

/** ISO/CIE 11664-4, the reverse, its straight line below 6/29 included. */
function tristimulus({ L, a, b }: Lab) {
  const whole = (f: number) => (f > 6 / 29 ? f * f * f : 3 * (6 / 29) ** 2 * (f - 4 / 29))
  const f = (L + 16) / 116
  return { X: WHITE.X * whole(f + a / 500), Y: WHITE.Y * whole(f), Z: WHITE.Z * whole(f - b / 200) }
}

export const luminanceFactor = (L: number) => tristimulus({ L, a: 0, b: 0 }).Y

/** CIE 15 and ISO 11475, for D65 and the 10° observer. */
export function whitenessAndTint(page: Lab) {
  const { X, Y, Z } = tristimulus(page)
  const [x, y] = [X / (X + Y + Z), Y / (X + Y + Z)]
  return {
    whiteness: Y + 800 * (0.3138 - x) + 1700 * (0.331 - y),
    tint: 900 * (0.3138 - x) - 650 * (0.331 - y),
  }
}

const degrees = (radians: number) => (radians * 180) / Math.PI
const radians = (angle: number) => (angle * Math.PI) / 180
export const chroma = ({ a, b }: Lab) => Math.sqrt(a * a + b * b)
export const hue = ({ a, b }: Lab) => (degrees(Math.atan2(b, a)) + 360) % 360

/** ISO/CIE 11664-6 with kL = kC = kH = 1, after Sharma, Wu and Dalal (2005). */
export function ciede2000(one: Lab, other: Lab): number {
  const c7 = ((chroma(one) + chroma(other)) / 2) ** 7
  const g = 0.5 * (1 - Math.sqrt(c7 / (c7 + 25 ** 7)))
  const first = { ...one, a: one.a * (1 + g) }
  const second = { ...other, a: other.a * (1 + g) }
  const [c1, c2] = [chroma(first), chroma(second)]
  const [h1, h2] = [hue(first), hue(second)]
  let turned = h2 - h1
  if (turned > 180) turned -= 360
  if (turned < -180) turned += 360
  const dL = second.L - first.L
  const dC = c2 - c1
  const dH = 2 * Math.sqrt(c1 * c2) * Math.sin(radians(turned / 2))
  const middleL = (first.L + second.L) / 2
  const middleC = (c1 + c2) / 2
  const middleH = Math.abs(h1 - h2) <= 180 ? (h1 + h2) / 2 : h1 + h2 < 360 ? (h1 + h2 + 360) / 2 : (h1 + h2 - 360) / 2
  const t =
    1 -
    0.17 * Math.cos(radians(middleH - 30)) +
    0.24 * Math.cos(radians(2 * middleH)) +
    0.32 * Math.cos(radians(3 * middleH + 6)) -
    0.2 * Math.cos(radians(4 * middleH - 63))
  const sL = 1 + (0.015 * (middleL - 50) ** 2) / Math.sqrt(20 + (middleL - 50) ** 2)
  const sC = 1 + 0.045 * middleC
  const sH = 1 + 0.015 * middleC * t
  const m7 = middleC ** 7
  const rT = -2 * Math.sqrt(m7 / (m7 + 25 ** 7)) * Math.sin(radians(60 * Math.exp(-(((middleH - 275) / 25) ** 2))))
  return Math.sqrt((dL / sL) ** 2 + (dC / sC) ** 2 + (dH / sH) ** 2 + rT * (dC / sC) * (dH / sH))
}

/** JCGM 100, 5.1.2, twice: k times the root of the squares of slope times uncertainty, slopes over a hundredth of it. */
export function expanded(figure: (errors: number[]) => number, uncertainties: number[]): number {
  const squares = uncertainties.map((u, i) => {
    if (u === 0) return 0
    const shifted = (by: number) => figure(uncertainties.map((_, k) => (k === i ? by : 0)))
    const step = u / 100
    return (((shifted(step) - shifted(-step)) / (2 * step)) * u) ** 2
  })
  return 2 * Math.sqrt(squares.reduce((sum, value) => sum + value, 0))
}
