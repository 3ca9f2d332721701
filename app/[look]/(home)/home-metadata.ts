import { pageMetadata } from '@/lib/server/page-metadata'

/** What the home page says of itself; its structured data say the same. */
export const HOME_DESCRIPTION =
  'How light, how white and how tinted the pages of electronic-paper reading devices are, measured, each figure with its doubt, and a quiz that finds the page for the light you read in.'

export const homeMetadata = () =>
  pageMetadata({ title: 'Lampleaf: find the page that suits your light', description: HOME_DESCRIPTION, path: '/' })
