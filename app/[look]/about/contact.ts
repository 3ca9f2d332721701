/** Where the invented team would be written to; `.example` is a domain no mail ever reaches (RFC 2606). */
export const CONTACT = {
  corrections: 'corrections@lampleaf.example',
  makers: 'makers@lampleaf.example',
  privacy: 'privacy@lampleaf.example',
} as const
