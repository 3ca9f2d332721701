import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { middleByLightness } from '@/app/[look]/method/data'
import { parseExample } from '@/app/[look]/method/try/example'
import { FIELDS, hasExample, queryOf, type Texts, textsFrom } from '@/app/[look]/method/try/fields'
import { WorkedExample } from '@/app/[look]/method/try/worked-example'
import { METHOD } from '@/lib/method/constants'
import { makeMethodData } from '@/tests/fixtures/method-data'

const { start } = makeMethodData()
const texts = (fields: Partial<Texts>): Texts => ({ ...start.texts, ...fields })
const problemsOf = (fields: Partial<Texts>) => parseExample(texts(fields)).problems

describe('what is typed', () => {
  test('readings are one a line, with spaces, commas or semicolons between', () => {
    const { example } = parseExample(texts({ pageReadings: ' 70 −1.5 1 \r\n\r\n70.1;-1.5;1.1\n69.9,\t-1.4, .9' }))
    expect(example?.page).toEqual([
      { L: 70, a: -1.5, b: 1 },
      { L: 70.1, a: -1.5, b: 1.1 },
      { L: 69.9, a: -1.4, b: 0.9 },
    ])
  })

  test('three numbers are one reading each, and the lists are not looked at', () => {
    const { example, problems } = parseExample(texts({ from: 'numbers', pageReadings: 'nonsense', inkReadings: '' }))
    expect(problems).toEqual([])
    expect(example).toMatchObject({ page: [{ L: 70, a: -1.5, b: 1 }], ink: [{ L: 23, a: -0.3, b: -0.8 }] })
  })

  // Method 1, section 3: house sizes of text, in microsteradians.
  test('the size of the text stands for the method’s target size', () => {
    for (const text of ['small', 'normal', 'large'] as const) {
      expect(parseExample(texts({ text })).example?.size).toBe(METHOD.reserve.size.value[text])
    }
  })

  test.each<[Partial<Texts>, string, string]>([
    [{ pageReadings: '' }, 'pageReadings', 'must hold one reading at least'],
    [{ pageReadings: '70 -1' }, 'pageReadings', 'line 1 must be three numbers'],
    [{ pageReadings: '70 -1 2\n70,5 -1,5 2' }, 'pageReadings', 'line 2 must be three numbers'],
    [{ pageReadings: '19.9 0 0' }, 'pageReadings', 'line 1: L* must be from 20 to 100'],
    [{ inkReadings: '20 0 61' }, 'inkReadings', 'line 1: a* and b* must be from −60 to 60'],
    [{ pageReadings: '70 0 0\n'.repeat(41) }, 'pageReadings', 'may hold 40 readings at most'],
    [{ pageReadings: '7'.repeat(5000) }, 'pageReadings', 'is too long a list'],
    [{ from: 'numbers', pageL: '' }, 'pageL', 'L* of the page: is missing: it must be a number from 20 to 100'],
    [{ from: 'numbers', inkL: '0' }, 'inkL', 'is not a number from 0.1 to 100'],
    [{ from: 'numbers', pageA: 'green' }, 'pageA', '"green" is not a number from −60 to 60'],
    [{ units: '1.5' }, 'units', 'must be a whole number from 1 to 20'],
    [{ lux: '1e9' }, 'lux', 'is not a number of lux from 0 to 200,000'],
    [{ age: '19' }, 'age', 'is not a number of years from 20 to 65'],
    [{ text: 'huge' }, 'text', 'is not one of the choices'],
    [{ from: 'guesses' }, 'from', 'must be one of the two ways'],
  ])('%j is refused at its field', (fields, id, message) => {
    const problems = problemsOf(fields)
    expect(problems.map((problem) => problem.id)).toEqual([id])
    expect(problems[0]?.message).toContain(message)
  })

  test('every field is told of by itself, in the order of the form', () => {
    const all = problemsOf({ from: 'numbers', pageL: 'x', inkB: 'x', lux: '-1', age: '' })
    expect(all.map(({ id }) => id)).toEqual(['pageL', 'inkB', 'lux', 'age'])
  })
})

describe('the address', () => {
  test('an example comes back from its address as it was typed', () => {
    for (const from of ['numbers', 'readings']) {
      const typed = texts({ from, units: '2', lux: '400' })
      const query = queryOf(typed)
      const back = textsFrom(new URLSearchParams(query), start.texts)
      expect(parseExample(back)).toEqual(parseExample(typed))
      expect(query).not.toContain(from === 'numbers' ? 'Readings' : 'pageL')
    }
  })

  test('an address that says nothing of it, or one thing twice, is left alone', () => {
    expect(hasExample(new URLSearchParams('utm=1&start=plain'))).toBe(false)
    expect(hasExample(new URLSearchParams('lux=5'))).toBe(true)
    expect(textsFrom(new URLSearchParams('lux=5&lux=6'), start.texts).lux).toBe('80')
  })
})

test('the example starts from the page in the middle, not from the lightest', () => {
  const page = (slug: string, L: number) => ({ slug, page: { L, a: 0, b: 0 } })
  expect(middleByLightness([page('light', 76), page('dark', 54), page('middle', 68)])?.slug).toBe('middle')
  expect(middleByLightness([page('b', 70), page('a', 70)])?.slug).toBe('a')
  expect(middleByLightness([])).toBeNull()
})

describe('the page without a script', () => {
  const html = (typed?: Texts) => renderToStaticMarkup(<WorkedExample data={makeMethodData()} texts={typed} />)

  test('is a form that is sent, each field with a label, filled from a real set', () => {
    const page = html()
    expect(page).toMatch(/<form[^>]*aria-label="Worked example"[^>]*action="\/method\/try"/)
    for (const name of FIELDS) expect(page).toContain(`name="${name}"`)
    expect(page).toContain('Example plain, unit p-1, centre, session session-1')
    expect(page).toContain('70.1, -1.5, 1.1')
  })

  test('shows figures and every step', () => {
    const page = html()
    for (const title of ['From readings to a colour', 'How sure that is', 'In this light'])
      expect(page).toContain(title)
    expect(page).toContain('Outside the formula’s limits, marked †')
    expect(page).toContain('k = 2, about 95 %')
  })

  test('ties each error to its field and lists it above', () => {
    const page = html(texts({ lux: 'bright' }))
    expect(page).toContain('href="#lux"')
    expect(page).toMatch(/<input[^>]*id="lux"[^>]*aria-describedby="lux-error"[^>]*aria-invalid="true"/)
    expect(page).toContain('Nothing is worked out yet')
  })
})
