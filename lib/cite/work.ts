/** Something of the guide one may cite: an edition, or a device's page as an edition has it. */
export type Work = {
  title: string
  /** Number of the edition, from 1. */
  edition: number
  /** Day of release, ISO 8601: YYYY-MM-DD. */
  publishedOn: string
  /** Absolute and stable; there is no DOI. */
  url: string
  /** Names as printed, of a person or of an organisation. */
  authors: string[]
  /** SPDX identifier, such as CC-BY-4.0; absent where nothing is granted. */
  licence?: string
}
