import { expect, test } from 'vitest'
import { citationText } from '@/lib/cite/text'
import { EDITION } from './works'

test('a citation names who, when, what, which edition and where', () => {
  expect(citationText(EDITION)).toBe(
    'Lampleaf (2026). Page figures of electronic-paper devices. Edition 3, released 20 November 2026. https://lampleaf.example/editions/3. Licence: CC-BY-4.0.',
  )
})

test('several authors read as a sentence, and nothing is said of a licence where there is none', () => {
  const text = citationText({ ...EDITION, authors: ['A', 'B', 'C'], licence: undefined })
  expect(text).toMatch(/^A, B and C \(2026\)\./)
  expect(text).toMatch(/editions\/3\.$/)
})
