/** What an address can ask of the catalogue. An address with any of these is answered by a page made for it. */
export const CATALOGUE_KEYS = ['sort', 'order'] as const
