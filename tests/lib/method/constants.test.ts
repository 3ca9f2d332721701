import { describe, expect, test } from 'vitest'
import { type Constant, METHOD } from '@/lib/method/constants'

const all = Object.entries(METHOD).flatMap(([section, constants]) =>
  Object.entries(constants as Record<string, Constant>).map(([name, constant]) => ({
    id: `${section}.${name}`,
    ...constant,
  })),
)

describe('the constants the Method page prints', () => {
  test.each(all)('$id says what it is and where it is from', ({ name, source, standing, value }) => {
    expect(name.length).toBeGreaterThan(3)
    expect(source.length).toBeGreaterThan(3)
    expect(['published', 'from memory', 'house', 'common practice']).toContain(standing)
    expect(value).toBeDefined()
  })

  test('none stands twice under one name', () => {
    expect(new Set(all.map(({ name }) => name)).size).toBe(all.length)
  })
})
