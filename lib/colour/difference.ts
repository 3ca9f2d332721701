import { differenceCiede2000 } from 'culori/fn'
import { requireFinite } from './finite'
import type { Lab } from './lab'

const ciede2000 = differenceCiede2000()

// culori reads the numbers of its `lab65` mode as they stand, so the white they were taken against does not matter.
function asGiven({ L, a, b }: Lab) {
  requireFinite('L*, a*, b*', L, a, b)
  return { mode: 'lab65' as const, l: L, a, b }
}

/**
 * Colour difference ΔE00 (CIEDE2000, kL = kC = kH = 1) of two colours taken against the same white. About 1 is just
 * seen side by side. Symmetric but for hues exactly opposite, where the mean hue is a matter of the last bit.
 * @throws RangeError when a value is not finite
 * @see ISO/CIE 11664-6; Sharma, Wu, Dalal 2005
 */
export function deltaE00(one: Lab, other: Lab): number {
  return ciede2000(asGiven(one), asGiven(other))
}
