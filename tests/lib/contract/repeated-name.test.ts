import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { findRepeatedName } from '@/lib/contract/repeated-name'

// RFC 7493 (I-JSON), section 2.3: names in an object must differ, after escapes are read.
describe('a name that stands twice in one object is found', () => {
  test.each([
    ['{"a":1,"a":2}', 'a'],
    ['{"spots":[{"lux":1},{"lux":1,"lux":2}]}', 'spots.1.lux'],
    ['{"a":{"b":1},"c":{"b":1,"\\u0062":2}}', 'c.b'],
    ['{"__proto__":1,"__proto__":2}', '__proto__'],
    ['[[],{"x":"{\\"x\\":","x":0}]', '1.x'],
  ])('%s', (text, path) => {
    expect(findRepeatedName(text)).toBe(path)
  })
})

test('the same name in different objects, and names inside strings, are no repetition', () => {
  expect(findRepeatedName('[{"a":"\\"a\\":1,"},{"a":{"a":[1,"a"]}}]')).toBeNull()
})

test('what JSON.stringify writes never repeats a name', () => {
  fc.assert(fc.property(fc.jsonValue(), (value) => findRepeatedName(JSON.stringify(value)) === null))
})

test('a deep text is walked without recursion', () => {
  expect(findRepeatedName(`${'[{"a":'.repeat(5000)}1${'}]'.repeat(5000)}`)).toBeNull()
})
