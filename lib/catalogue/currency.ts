/** The currency prices are compared in; a price in another is never converted, and counts as not stated. */
export const CURRENCY = 'GBP'
