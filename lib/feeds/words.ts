/** What both feeds say of themselves. */
export const FEED_TITLE = 'Lampleaf: editions, corrections and new devices'
export const FEED_DESCRIPTION =
  'What the guide published: each edition of its figures, each correction of one, and each device it measured for the first time.'
export const FEED_AUTHOR = 'Lampleaf'
export const FEED_LANGUAGE = 'en-GB'
