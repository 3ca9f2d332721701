import { expect, test } from 'vitest'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Answers, EditionDevice } from '@/lib/method/types'
import { NO_ANSWERS } from '@/lib/quiz/answers'
import { darkSpots, deviceInLight, paperInLight } from '@/lib/quiz/in-light'
import { leadSentence, reasonsFor, sentenceOf } from '@/lib/quiz/reasons'
import { namedSpots } from '@/lib/quiz/request'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const plain = (text: string) => text.replace(/[\u202f\u00a0]/g, ' ')
const page = (L: number, a: number, b: number) => ({ L, a, b, u: { L: 0.2, a: 0.1, b: 0.1 } })
const ALIKE = { clarity: 0.25, whiteness: 0.25, tint: 0.25, handling: 0.25 }

const light = makeDevice({ slug: 'light', page: page(74, -0.4, 0.3), diagonal: 7, weight: 190 })
const middle = makeDevice({ slug: 'middle', page: page(70, -2, 1), diagonal: 8, weight: 400 })
const dark = makeDevice({ slug: 'dark', page: page(60, -3, 3.6), diagonal: 13.3, weight: 520, frontLight: false })
const left = [light, middle, dark]

function reasons(device: EditionDevice, answers: Partial<Answers> = {}, spots = namedSpots(NO_ANSWERS)) {
  const reader = { edition: makeEdition(left), answers: { ...DEFAULT_ANSWERS, ...answers }, spots, left }
  const { pro, contra } = reasonsFor(device, ALIKE, reader)
  return { pro: pro.map(plain), contra: contra.map(plain) }
}

test('a light, neutral page on a light device is praised with its own numbers', () => {
  const { pro, contra } = reasons(light)
  expect(contra).toEqual([])
  expect(pro).toHaveLength(4)
  expect(pro[0]).toMatch(/^by your bedside lamp, with its front light on, its page keeps \d+\.\d times the contrast/)
  expect(pro).toContain('its page is the lightest of these 3 (L* 74.0)')
  expect(pro).toContain('it is nearly free of tint (a* −0.4, b* 0.3)')
  expect(pro).toContain('it is light to hold in two hands (190 g)')
})

test('a dark, tinted, heavy device is told what speaks against it', () => {
  expect(reasons(dark).contra).toEqual([
    'its page is among the darkest of these 3 (L* 60.0)',
    'it has a strong yellowish tint (a* −3.0, b* 3.6)',
    'it is heavy to hold in two hands (520 g)',
    'its 13.3 inches are large for what you read',
  ])
})

test('a tint is measured from the white the reader likes', () => {
  const warm = makeDevice({ slug: 'warm', page: page(70, -0.5, 3.8) })
  expect(reasons(warm, { preferredWhite: 'warm' }).pro).toContain(
    'it is very close to the warm white you like (a* −0.5, b* 3.8)',
  )
  expect(reasons(warm, { preferredWhite: 'cool' }).contra).toContain(
    'it is far from the cool white you like (a* −0.5, b* 3.8)',
  )
  expect(reasons(warm).pro.join()).not.toContain('tint')
})

test('where a page cannot be read, that is said first, and no number is praised', () => {
  const spots = [{ name: 'Cellar', slug: null, lux: 0.1, hours: 3, frontLight: true }]
  const { pro, contra } = reasons(dark, {}, spots)
  expect(contra[0]).toBe('in “Cellar” it cannot be read')
  expect(pro.join()).not.toContain('contrast')
})

test('what is not stated is neither praised nor blamed', () => {
  const unknown = makeDevice({ slug: 'unknown', weight: null, diagonal: null })
  const { pro, contra } = reasons(unknown)
  expect([...pro, ...contra].join()).not.toMatch(/hold|inches/)
})

test('an aim that counts for nothing gives no reason', () => {
  const reader = { edition: makeEdition(left), answers: DEFAULT_ANSWERS, spots: namedSpots(NO_ANSWERS), left }
  const { pro } = reasonsFor(light, { clarity: 1, whiteness: 0, tint: 0, handling: 0 }, reader)
  expect(pro).toHaveLength(1)
})

test('clauses become one sentence', () => {
  expect(sentenceOf(['it is a', 'it is b', 'it is c'])).toBe('It is a, it is b and it is c.')
  expect(sentenceOf([])).toBe('')
})

const row = (slug: string, clarity: number, tint: number) => ({
  slug,
  fit: clarity + tint + 20,
  contributions: { clarity, whiteness: 10, tint, handling: 10 },
})
const nameOf = (slug: string) => slug.toUpperCase()

test('a lead is explained by the aims that bring and cost the most', () => {
  expect(leadSentence([row('a', 30, 20), row('b', 32, 15)], nameOf)).toBe(
    'It is 3.0 points ahead of B: 5.0 points more for being free of tint, 2.0 points fewer for being clear in your light.',
  )
  expect(leadSentence([row('a', 30, 20), row('b', 30, 19)], nameOf)).toBe(
    'It is 1.0 point ahead of B, with 1.0 point more for being free of tint.',
  )
})

test('where all have the same fit no lead is made up', () => {
  expect(leadSentence([row('a', 30, 20), row('b', 30, 20)], nameOf)).toBe(
    'Nothing in your answers tells these devices apart: all have the same fit.',
  )
  expect(leadSentence([row('a', 30, 20), row('b', 30, 20), row('c', 10, 20)], nameOf)).toBe(
    'It has the same fit as B, to a tenth of a point.',
  )
  expect(leadSentence([row('a', 30, 20)], nameOf)).toBeNull()
})

// Method 1, sections 2 and 3: without a front light 0.1 lx on a page of Y 40 % is 0.013 cd/m², under the model's 0.05.
test('lights off are readable by a front light alone', () => {
  const spot = { lux: 0.1, hours: 1, frontLight: true }
  const eye = { age: 25, size: 4.8 }
  expect(deviceInLight(light, spot, eye)).toMatchObject({ readable: true, frontLightOn: true })
  expect(deviceInLight(dark, spot, eye)).toEqual({ reserve: 0, readable: false, frontLightOn: false })
  expect(paperInLight({ L: 93, a: 0, b: 0 }, spot, eye).readable).toBe(false)
  expect(darkSpots([spot, { ...spot, frontLight: false }], [light, dark], eye)).toEqual([
    { ...spot, frontLight: false },
  ])
})
