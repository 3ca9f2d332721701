/** What narrows the catalogue, in the order a canonical address names it. */
export const FILTER_KEYS = [
  'q',
  'maker',
  'min-size',
  'max-size',
  'max-price',
  'max-weight',
  'pen',
  'colour',
  'front-light',
  'water',
  'on-sale',
] as const
export type FilterKey = (typeof FILTER_KEYS)[number]

/** What an address can ask of the catalogue. An address with any of these is answered by a page made for it. */
export const CATALOGUE_KEYS = [...FILTER_KEYS, 'sort', 'order', 'page'] as const
export type CatalogueKey = (typeof CATALOGUE_KEYS)[number]
