/**
 * Repeatable chance. A stream is named by a text: the text is hashed four times by MurmurHash3 (x86, 32 bits, seeds 0
 * to 3) into the 128 bits of state of xoshiro128**, whose numbers Marsaglia's polar method turns into normal variates.
 * Nothing here knows the clock, so a name always gives the same numbers, and streams of different names do not touch.
 */

/**
 * MurmurHash3, x86 variant, 32 bits.
 * @see Austin Appleby, SMHasher (public domain); written from memory, held to known values by the tests
 */
export function murmur3(bytes: Uint8Array, seed: number): number {
  const blocks = bytes.length & ~3
  let hash = seed | 0
  for (let i = 0; i < blocks; i += 4) {
    const block = bytes[i]! | (bytes[i + 1]! << 8) | (bytes[i + 2]! << 16) | (bytes[i + 3]! << 24)
    hash = Math.imul(rotate(hash ^ scramble(block), 13), 5) + 0xe6546b64
  }
  let tail = 0
  for (let i = bytes.length - 1; i >= blocks; i--) tail = (tail << 8) | bytes[i]!
  hash ^= scramble(tail) ^ bytes.length
  hash = Math.imul(hash ^ (hash >>> 16), 0x85ebca6b)
  hash = Math.imul(hash ^ (hash >>> 13), 0xc2b2ae35)
  return (hash ^ (hash >>> 16)) >>> 0
}

function scramble(block: number): number {
  return Math.imul(rotate(Math.imul(block, 0xcc9e2d51), 15), 0x1b873593)
}

function rotate(x: number, bits: number): number {
  return (x << bits) | (x >>> (32 - bits))
}

/** Four 32-bit words, not all 0. */
export type State = [number, number, number, number]

/**
 * xoshiro128**, 1.1: 32-bit whole numbers of period 2¹²⁸ − 1, signed here.
 * @see Blackman & Vigna, Scrambled linear pseudorandom number generators, ACM TOMS 47(4), 2021
 */
export class Xoshiro128 {
  private a: number
  private b: number
  private c: number
  private d: number

  constructor([a, b, c, d]: State) {
    this.a = a | 0
    this.b = b | 0
    this.c = c | 0
    // All 0 is the one state it never leaves; no known text leads there, and none shall.
    this.d = (a | b | c | d) === 0 ? 1 : d | 0
  }

  static named(name: string): Xoshiro128 {
    const bytes = new TextEncoder().encode(name)
    return new Xoshiro128([murmur3(bytes, 0), murmur3(bytes, 1), murmur3(bytes, 2), murmur3(bytes, 3)])
  }

  /** The next number, −2³¹ to 2³¹ − 1. */
  next(): number {
    const { b } = this
    const result = Math.imul(rotate(Math.imul(b, 5), 7), 9)
    this.c ^= this.a
    this.d ^= b
    this.b ^= this.c
    this.a ^= this.d
    this.c ^= b << 9
    this.d = rotate(this.d, 11)
    return result
  }
}

const HALF_RANGE = 2 ** 31

/**
 * Fills `out` with independent standard normal variates of the stream so named. A longer array begins with the numbers
 * of a shorter one. The logarithm's last bit may differ between engines, and with it that of a variate.
 * @see Marsaglia & Bray, A convenient method for generating normal variables, SIAM Review 6, 1964
 */
export function fillNormals(name: string, out: Float64Array): Float64Array {
  const stream = Xoshiro128.named(name)
  for (let i = 0; i < out.length; i += 2) {
    let u: number
    let v: number
    let square: number
    do {
      u = stream.next() / HALF_RANGE
      v = stream.next() / HALF_RANGE
      square = u * u + v * v
    } while (square >= 1 || square === 0)
    const stretch = Math.sqrt((-2 * Math.log(square)) / square)
    out[i] = u * stretch
    // Past the end of an odd length this is a write to nowhere, which typed arrays ignore.
    out[i + 1] = v * stretch
  }
  return out
}
