import type { Term } from './term'

/** Words of publishing: what makes a figure citable and a mistake visible. */
export const PUBLISHING_TERMS: readonly Term[] = [
  {
    id: 'edition',
    name: 'edition',
    text: 'A numbered, dated release of all figures. It is frozen with the sets it rests on and never changes afterwards.',
    source: 'house',
    used: { href: '/editions', name: 'editions' },
  },
  {
    id: 'correction',
    name: 'correction',
    text: 'A public note that a published figure was wrong. It names the edition that printed it and, once there is one, the edition that puts it right.',
    source: 'house',
    used: { href: '/corrections', name: 'corrections' },
  },
  {
    id: 'withdrawn',
    name: 'withdrawn',
    text: 'Of readings: no longer counted, still visible, with the reason. Of a device: in an earlier edition and not in this one.',
    source: 'house',
    used: { href: '/editions', name: 'editions' },
  },
  {
    id: 'reply',
    name: 'reply',
    text: 'What a maker, an owner or the team says about a correction or a figure, printed beside it under the role they speak in.',
    source: 'house',
    used: { href: '/corrections', name: 'corrections' },
  },
  {
    id: 'seal',
    name: 'seal',
    also: ['SHA-256', 'fingerprint'],
    text: 'A number of 64 hexadecimal digits worked out from an edition’s document in canonical form. Change one figure and it no longer fits.',
    source: 'RFC 8785; FIPS 180-4',
    used: { href: '/editions', name: 'editions' },
  },
  {
    id: 'method',
    name: 'method',
    text: 'The numbered rules by which readings become figures and answers an order. A change of any rule is a new method with a new number, and old results keep theirs.',
    source: 'house',
    used: { href: '/method', name: 'the method' },
  },
  {
    id: 'house',
    name: 'house',
    text: 'Marks what we chose ourselves, a constant or a word, where no standard or paper we know of says it.',
    source: 'house',
    used: { href: '/method', name: 'the method' },
  },
  {
    id: 'device',
    name: 'device',
    text: 'The product you hold, with its maker and model name. What we measure is its page.',
    source: 'house',
    used: { href: '/devices', name: 'the devices' },
  },
]
