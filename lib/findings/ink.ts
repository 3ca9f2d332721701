import { expandedFigure } from '@/lib/method/figure-doubts'
import type { Edition, EditionDevice } from '@/lib/method/types'
import type { Figure } from './published'

/** L*, a*, b* of a device's ink, its full black, each with its doubt (k = 2). */
export function inkFigures(
  { uncertainty: { common, session } }: Pick<Edition, 'uncertainty'>,
  { ink, sessions }: EditionDevice,
): Record<'lightness' | 'a' | 'b', Figure> {
  const channel = (name: 'L' | 'a' | 'b'): Figure => ({
    value: ink[name],
    doubt: expandedFigure(ink.u[name], session[name], sessions, common[name]),
  })
  return { lightness: channel('L'), a: channel('a'), b: channel('b') }
}
