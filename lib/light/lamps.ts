import type { Light } from '@/lib/colour/weights'

/** A lamp whose light can be chosen: a CIE illuminant, by its name in the address. */
export type LampName = Light

/** Lamps from daylight to the warmest, with what they stand for. Kelvins are those of the CIE tables, rounded. */
export const LAMPS: readonly { name: LampName; title: string; cie: string; phrase: string }[] = [
  { name: 'D65', title: 'Daylight', cie: 'CIE D65', phrase: 'in daylight (CIE D65)' },
  { name: 'D50', title: 'Warmer daylight', cie: 'CIE D50, 5,000 K', phrase: 'in warmer daylight (CIE D50)' },
  {
    name: 'LED-B3',
    title: 'Neutral white LED',
    cie: 'CIE LED-B3, 4,100 K',
    phrase: 'under a neutral white LED (CIE LED-B3)',
  },
  {
    name: 'FL11',
    title: 'Fluorescent tube',
    cie: 'CIE FL11, 4,000 K',
    phrase: 'under a three-band fluorescent tube (CIE FL11)',
  },
  { name: 'A', title: 'Incandescent bulb', cie: 'CIE A, 2,856 K', phrase: 'under an incandescent bulb (CIE A)' },
  {
    name: 'LED-B1',
    title: 'Warm white LED',
    cie: 'CIE LED-B1, 2,730 K',
    phrase: 'under a warm white LED (CIE LED-B1)',
  },
]

export const LAMP_NAMES = LAMPS.map(({ name }) => name)

/** What is said of a lamp. */
export function lampNamed(name: LampName): (typeof LAMPS)[number] {
  return LAMPS.find((lamp) => lamp.name === name) ?? LAMPS[0]!
}
