import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import MethodPage from '@/app/[look]/method/page'
import { QUANTITIES } from '@/app/[look]/method/quantities'
import { editionSchema } from '@/lib/contract/edition'
import { matchAnswerSchema } from '@/lib/contract/match-answer'
import { formatExact } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'

const html = renderToStaticMarkup(<MethodPage />)
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

test('each address in the contents is a section of the page', () => {
  const targets = [...html.matchAll(/href="#([a-z]+)"/g)].map(([, id]) => id)
  expect(targets).toHaveLength(9)
  for (const id of targets) expect(html).toContain(`<section id="${id}"`)
})
