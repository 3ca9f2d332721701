import { describe, expect, test } from 'vitest'
import { fillNormals, murmur3, Xoshiro128 } from '@/lib/method/random'

const bytes = (text: string) => new TextEncoder().encode(text)

describe('streams of chance', () => {
  // Known values of MurmurHash3_x86_32, collected by Ian Boyd; from memory.
  test.each([
    { text: '', seed: 0, hash: 0 },
    { text: '', seed: 1, hash: 0x514e28b7 },
    { text: '', seed: 0xffffffff, hash: 0x81f16f39 },
    { text: 'aaaa', seed: 0x9747b28c, hash: 0x5a97808a },
    { text: 'aaa', seed: 0x9747b28c, hash: 0x283e0130 },
    { text: 'aa', seed: 0x9747b28c, hash: 0x5d211726 },
    { text: 'a', seed: 0x9747b28c, hash: 0x7fa09ea6 },
    { text: 'Hello, world!', seed: 0x9747b28c, hash: 0x24884cba },
    { text: 'The quick brown fox jumps over the lazy dog', seed: 0x9747b28c, hash: 0x2fa826cd },
  ])('the hash of “$text” with seed $seed is MurmurHash3’s', ({ text, seed, hash }) => {
    expect(murmur3(bytes(text), seed)).toBe(hash)
  })

  // Outputs of the authors' xoshiro128starstar.c 1.1 from the state 1, 2, 3, 4, as the test of Rust's rand_xoshiro has them.
  test('the generator gives the numbers of xoshiro128**', () => {
    const stream = new Xoshiro128([1, 2, 3, 4])
    const expected = [
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ]
    expect(expected.map(() => stream.next() >>> 0)).toEqual(expected)
  })

  test('a state of zeros still gives numbers', () => {
    const stream = new Xoshiro128([0, 0, 0, 0])
    expect(new Set(Array.from({ length: 100 }, () => stream.next())).size).toBeGreaterThan(90)
  })

  test('a name always gives the same numbers, another name others, and more draws begin with the fewer', () => {
    const few = fillNormals('device a', new Float64Array(101))
    const many = fillNormals('device a', new Float64Array(1000))
    expect([...many.subarray(0, 101)]).toEqual([...few])
    const other = fillNormals('device b', new Float64Array(1000))
    expect(other.every((value, i) => value !== many[i])).toBe(true)
  })

  // Moments and tail shares of the standard normal distribution; each within four standard errors of 400,000 variates.
  test('the variates are standard normal and independent', () => {
    const n = 400_000
    const z = fillNormals('normality', new Float64Array(n))
    const moment = (power: number) => z.reduce((sum, value) => sum + value ** power, 0) / n
    expect(Math.abs(moment(1))).toBeLessThan(4 / Math.sqrt(n))
    expect(Math.abs(moment(2) - 1)).toBeLessThan(4 * Math.sqrt(2 / n))
    expect(Math.abs(moment(3))).toBeLessThan(4 * Math.sqrt(15 / n))
    expect(Math.abs(moment(4) - 3)).toBeLessThan(4 * Math.sqrt(96 / n))
    for (const [limit, p] of [
      [1, 0.3173105],
      [1.959964, 0.05],
      [3, 0.0026998],
    ] as const) {
      const share = z.filter((value) => Math.abs(value) > limit).length / n
      expect(Math.abs(share - p)).toBeLessThan(4 * Math.sqrt((p * (1 - p)) / n))
    }
    for (const lag of [1, 2, 3, 4]) {
      let product = 0
      for (let i = lag; i < n; i++) product += z[i]! * z[i - lag]!
      expect(Math.abs(product / n)).toBeLessThan(4 / Math.sqrt(n))
    }
  })
})
