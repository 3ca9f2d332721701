type Features = typeof import('./motion-features').default

const TOUCHES = ['pointerdown', 'keydown', 'input'] as const

/**
 * The code that moves things, fetched when the reader first touches or types: until then nothing has to move, and
 * whoever only reads is not sent it.
 */
export function motionWhenUsed(): Promise<Features> {
  return new Promise((resolve, reject) => {
    const begin = () => {
      for (const touch of TOUCHES) window.removeEventListener(touch, begin)
      import('./motion-features').then((features) => resolve(features.default), reject)
    }
    for (const touch of TOUCHES) window.addEventListener(touch, begin, { passive: true })
  })
}
