import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { CONTENTS } from '@/app/[look]/method/contents'
import { HOUSE_WORDS } from '@/app/[look]/method/house-words'
import { MethodView } from '@/app/[look]/method/method-view'
import { QUANTITIES } from '@/app/[look]/method/quantities'
import { SEEN } from '@/lib/compare/seen'
import { editionSchema } from '@/lib/contract/edition'
import { matchAnswerSchema } from '@/lib/contract/match-answer'
import { formatExact } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import { makeMethodData } from '@/tests/fixtures/method-data'

const html = renderToStaticMarkup(<MethodView data={makeMethodData()} />)
const text = plain(html)

/** Every number inside a constant, however deep. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value]
  if (typeof value !== 'object' || value === null) return []
  return Object.values(value).flatMap(numbersIn)
}
const shows = (value: number, where = text) =>
  new RegExp(`(?<![\\d.])${formatExact(value).replaceAll('.', '\\.')}(?![\\d]|[.,]\\d)`).test(where)

function plain(markup: string): string {
  return markup
    .replaceAll(/<[^>]+>/g, ' ')
    .replaceAll('&lt;', '<')
    .replaceAll('&gt;', '>')
    .replaceAll('&#x27;', '’')
    .replaceAll('&amp;', '&')
    .replaceAll(/\s+/g, ' ')
}

/** The table row that holds a constant: a number elsewhere on the page proves nothing. */
const rows = html.split(/<tr\b/).map(plain)
const rowOf = (name: string) => rows.find((row) => row.includes(name)) ?? ''

describe('every constant of the method stands on its page with its name, value, source and standing', () => {
  const constants = Object.entries(METHOD).flatMap(([section, group]) =>
    Object.entries(group).map(([key, constant]) => ({ at: `${section}.${key}`, ...constant })),
  )
  test.each(constants)('$at', ({ name, value, source, standing }) => {
    const row = rowOf(name)
    expect(row).not.toBe('')
    for (const number of numbersIn(value)) expect(shows(number, row), `${number} in: ${row}`).toBe(true)
    expect(row).toContain(source)
    expect(row).toContain(standing)
  })
})

/** Exports that hold no constant of the published method, each with why. */
const NOT_OF_THE_METHOD: Record<string, string> = {
  E313_D65_10: 'yellowness is computed for the bench only',
  WAVELENGTHS_NM: 'spectra are stored, not scored',
  WEIGHTS: 'spectra are stored, not scored',
  CAT16_MATRIX: 'draws a page on a display',
  METHOD: 'held by the test above',
  LOG_SPOT_READING: 'a logarithm of a constant',
  LOG_BEST_READING: 'a logarithm of a constant',
  BRIGHT_PAGE: 'made from the reference pages',
  DIM_PAGE: 'made from the reference pages',
  WHITENESS_DIM: 'made from the reference pages',
  WHITENESS_SPAN: 'made from the reference pages',
  LEAST_TOTAL: 'guards a division by zero',
  TOUCHING: 'rounding of the arithmetic',
  FINE: 'a mark of the tables that make draws quick',
  COARSE: 'a mark of the tables that make draws quick',
  USELESS: 'a mark of the tables that make draws quick',
  COARSE_ERROR: 'accuracy of the tables that make draws quick',
  AIMS: 'words',
  READING_KINDS: 'words',
  LIGHT_NEEDS: 'words',
  TEXT_SIZES: 'words',
  WHITES: 'words',
  HOLDS: 'words',
}

describe('every constant that colour, vision, statistics and method export stands on the page too', () => {
  const modules = import.meta.glob<Record<string, unknown>>('../../lib/{colour,vision,stats,method}/**/*.ts', {
    eager: true,
  })
  const exported = Object.entries(modules).flatMap(([file, names]) =>
    Object.entries(names)
      .filter(([name]) => /^[A-Z][A-Z0-9_]*$/.test(name) && !(name in NOT_OF_THE_METHOD))
      .map(([name, value]) => ({ at: `${file.replace('../../', '')} ${name}`, value })),
  )
  test('there are some', () => {
    expect(exported.map(({ at }) => at)).toContain('lib/vision/contrast-reserve.ts THRESHOLD_MODEL')
  })
  test.each(exported)('$at', ({ value }) => {
    for (const number of numbersIn(value)) expect(shows(number), String(number)).toBe(true)
  })
})

/** Paths of a schema's fields, `device.page.L`, as deep as objects go; lists are entered, other values end a path. */
function fieldsOf(schema: unknown, path: string): string[] {
  const { shape, element } = schema as { shape?: Record<string, unknown>; element?: unknown }
  if (element) return fieldsOf(element, path)
  if (!shape) return [path]
  return Object.entries(shape).flatMap(([field, inner]) => fieldsOf(inner, `${path}.${field}`))
}

/** Fields that identify or describe and are not measured or computed. */
const NOT_A_FIGURE =
  /^(edition\.(number|publishedAt|sha256|method)|device\.(slug|name|maker|revision|provisional|units|diagonal|ppi|weight|price|pen|colour|water|pageButtons|onSale|lending|speech|formats)|answer\.(edition|method|assumed|ranked\.slug))$/

describe('every figure we publish has its method described', () => {
  const { devices, ...edition } = editionSchema.shape
  const fields = [
    ...fieldsOf({ shape: edition }, 'edition'),
    ...fieldsOf(devices, 'device'),
    ...fieldsOf(matchAnswerSchema, 'answer'),
  ].filter((field) => !NOT_A_FIGURE.test(field))

  test.each(fields)('%s', (field) => {
    const quantity = QUANTITIES.find((one) =>
      one.fields.some((named) => field === named || field.startsWith(`${named}.`)),
    )
    expect(quantity, 'a quantity in app/[look]/method/quantities.ts').toBeDefined()
    expect(html).toContain(`id="q-${quantity?.id}"`)
    expect(text).toContain(quantity?.how)
  })
})

// Check value of the threshold model: Method 1, section 3.
test('the page prints the model’s check value as the code computes it', () => {
  expect(text).toContain('0.04803076')
  expect(text).toContain('18.738')
})

/** Addresses other pages link to: they must never move. */
const ADDRESSES = 'spots figures light reserve criteria weights fit limits example budget controls words unknowns'

test('each address in the contents is a section of the page, in that order and with that title', () => {
  const contents = html.slice(html.indexOf('On this page'), html.indexOf('<section'))
  const targets = [...contents.matchAll(/href="#([a-z]+)"/g)].map(([, id]) => id)
  expect(targets.join(' ')).toBe(ADDRESSES)
  const sections = [...html.matchAll(/<section id="([a-z]+)"/g)].map(([, id]) => id)
  expect(sections).toEqual(targets)
  for (const [number, { id, title }] of CONTENTS.entries()) {
    const heading = plain(html.slice(html.indexOf(`<h2 id="${id}-title"`)).split('</h2>')[0] ?? '')
    expect(heading.trim().startsWith(`${number}. ${title}`), heading).toBe(true)
  }
})

test('no two elements of the page have the same address', () => {
  const ids = [...html.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id)
  expect(ids.filter((id, i) => ids.indexOf(id) !== i)).toEqual([])
})

/** The part of the page from a section's start to the next one's. */
const section = (id: string) => html.slice(html.indexOf(`<section id="${id}"`)).split(/<section id="[a-z]+"/)[1] ?? ''

// JCGM 100, 5.1.2, by hand for the fixture: 2 units, 2 sets, 10 readings, one half of the sets in each session.
test('the budget prints the parts and what they make together, with the coverage factor', () => {
  const own = Math.sqrt(0.36 ** 2 / 2 + 0.14 ** 2 / 2 + 0.05 ** 2 / 10)
  const all = Math.hypot(own, 0.12 * Math.SQRT1_2, 0.25)
  const budget = section('budget').split(/<tr\b/).map(plain)
  const row = (name: string) => budget.find((line) => line.includes(name) && line.includes('√'))
  expect(row('Units of a model')).toContain((0.36 / Math.SQRT2).toFixed(3))
  expect(budget.find((line) => line.includes(`Expanded, k = ${COVERAGE_FACTOR}`))).toContain((2 * all).toFixed(3))
  expect(plain(section('budget'))).toMatch(/The largest part of L\*: units of a model/)
})

test('the control charts say which session is outside, since when all is well, and what was done', () => {
  const controls = plain(section('controls'))
  expect(controls).toContain('Outside the limits: session-7 (12 February 2026).')
  expect(controls).toContain('10 February 2026, Example sphere: Serviced.')
})

test('every word that stands for a number is listed with it', () => {
  const words = section('words').split(/<tr\b/).map(plain)
  for (const { words: said, holds } of HOUSE_WORDS) {
    expect(
      words.find((row) => row.includes(said) && row.includes(holds)),
      said,
    ).toBeDefined()
  }
  // The second threshold of side-by-side seeing, lib/compare.
  expect(words.find((row) => row.includes(SEEN[2].words))).toContain(`from ${SEEN[2].from}`)
})

describe('where no edition has been released', () => {
  const start = { ...makeMethodData().start, from: null }
  const none = { edition: null, bench: null, sets: [], series: [], events: [], devices: [], start }
  const empty = plain(renderToStaticMarkup(<MethodView data={makeMethodData(none)} />))
  test('the method is all there, and each part that needs one says so', () => {
    expect(empty).toContain('so there is nothing to budget')
    expect(empty).toContain('so there are no control charts')
    expect(empty).toContain('starts from the method’s bright reference page')
    expect(empty).toContain('No doubts: without an edition')
    expect(empty).toContain('Constants of the contrast reserve')
  })
})
