import { describe, expect, test } from 'vitest'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { readAddress } from '@/lib/quiz/address'
import { toRequest } from '@/lib/quiz/request'
import { queryOfAnswers } from '@/lib/quiz/write-address'
import { addressOf, questionOf, wholeResultHref, yoursHref } from '@/lib/readers/reader'
import { findReader, READERS } from '@/lib/readers/readers'
import { wordsFor } from '@/lib/readers/words'
import { DEVICES, MAKERS } from '@/seed/scenario/devices'

test('there are eight typical readers, each at an address of its own', () => {
  expect(READERS).toHaveLength(8)
  expect(new Set(READERS.map(({ slug }) => slug)).size).toBe(8)
  for (const reader of READERS) {
    expect(reader.slug).toMatch(/^[a-z]+(-[a-z]+)*$/)
    expect(findReader(reader.slug)).toBe(reader)
  }
  expect(findReader('nobody')).toBeNull()
  expect(findReader('__proto__')).toBeNull()
})

describe.each(READERS)('the reader “$name”', (reader) => {
  test('has answers that an address of the quiz gives back unchanged', () => {
    const read = readAddress(new URLSearchParams(queryOfAnswers(reader.answers)))
    expect(read.problems).toEqual([])
    expect(read.unknown).toEqual([])
    expect(read.answers).toEqual(reader.answers)
  })

  test('leads into the quiz and to the whole result with exactly those answers', () => {
    for (const [href, path] of [
      [yoursHref(reader), '/quiz'],
      [wholeResultHref(reader), '/quiz/result'],
    ]) {
      const url = new URL(href!, 'https://lampleaf.example')
      expect(url.pathname).toBe(path)
      expect(readAddress(url.searchParams).answers).toEqual(reader.answers)
    }
  })

  test('asks a question the API takes, and answers enough for the light and the aims to be theirs', () => {
    expect(() => matchRequestSchema.parse(toRequest(addressOf(reader).answers))).not.toThrow()
    const { assumed } = questionOf(reader)
    for (const field of ['spots', 'aims', 'reads', 'hold']) expect(assumed, field).not.toContain(field)
  })

  test('is told in words of its own that name no maker and no device', () => {
    const { paragraphs, cautions } = wordsFor(reader.slug)
    expect(paragraphs.length).toBeGreaterThan(1)
    expect(cautions.length).toBeGreaterThan(0)
    const text = [reader.line, ...paragraphs, ...cautions].join(' ')
    for (const name of [...MAKERS, ...DEVICES.map((device) => device.name)]) expect(text).not.toContain(name)
    expect(text).not.toMatch(/!|\bscreen\b/)
  })
})

test('words are asked for of readers there are', () => {
  expect(() => wordsFor('nobody')).toThrow('There are no words for the reader nobody')
})

test('readers whose eyes want more light are told that this is no medical advice', () => {
  expect(wordsFor('more-light').cautions.join(' ')).toContain('not medical advice')
})
