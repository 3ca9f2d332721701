/** A word of the trade or of this guide, as the site means it. */
export type Term = {
  /** Its place: `/glossary#{id}`. */
  id: string
  /** Without a capital where it has none in a sentence. */
  name: string
  /** Other names and signs it goes by. */
  also?: readonly string[]
  /** One to three sentences, exact and in our own words. */
  text: string
  /** The standard or paper it is from; "house" where the word is ours. */
  source: string
  /** Where on this site it is used. */
  used: { href: `/${string}`; name: string }
  /** Published quantities (`/method#q-…`) it explains. */
  quantities?: readonly string[]
}
