import { pageMetadata } from '@/lib/server/page-metadata'

/** What the home page says of itself; its structured data say the same. */
export const HOME_DESCRIPTION =
  'How light, how white and how tinted the pages of electronic-paper reading devices are, measured, each figure with its doubt, and a quiz that finds the page for the light you read in.'

/** @param index false for the home page in another light: the same page at another address */
export const homeMetadata = ({ index = true } = {}) =>
  pageMetadata({
    title: 'Lampleaf: find the page that suits your light',
    description: HOME_DESCRIPTION,
    path: '/',
    index,
  })
