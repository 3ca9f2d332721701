import type { Edition } from '@/lib/method/types'

/** Whose work the data set is, as a citation prints it. */
export const CREATOR = 'Lampleaf'

export const LICENCE = {
  /** SPDX. */
  id: 'CC-BY-4.0',
  title: 'Creative Commons Attribution 4.0 International',
  url: 'https://creativecommons.org/licenses/by/4.0/',
} as const

export const TITLE = 'Measured pages of electronic-paper reading devices'

export const KEYWORDS = [
  'electronic paper',
  'reading device',
  'spectrophotometry',
  'CIELAB',
  'CIE whiteness',
  'contrast',
]

/** One sentence on what was measured and how. */
export const TECHNIQUE =
  'Sphere spectrophotometry at d/8°, specular included, worked out for illuminant D65 and the CIE 1964 10° observer; page and ink of each unit, in sets of five readings or more.'

export function describeEdition({ number, devices }: Pick<Edition, 'number' | 'devices'>): string {
  return `Edition ${number}: lightness, colour, whiteness, tint and contrast of the pages of ${devices.length} ${devices.length === 1 ? 'device' : 'devices'}, with their doubts and every reading they rest on. ${TECHNIQUE}`
}

/** A name for good, whatever address the site has: a tag URI (RFC 4151). */
export function datasetId(number: number): string {
  return `tag:lampleaf.example,2026:dataset/${number}`
}
