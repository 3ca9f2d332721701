import type { EditionDevice } from '@/lib/method/types'

/**
 * The catalogue as a schema.org ItemList, in the order shown. The order is by lightness, which is a measurement and no
 * ranking, and neighbours are often too close to call: the list says where a device stands, and calls none the best.
 * @param devices those shown, first to last
 * @param first the place of the first of them in the whole list, from 1, where the list is shown in parts
 * @param siteUrl makes an absolute address of a path
 * @see https://schema.org/ItemList
 */
export function catalogueStructuredData(
  devices: readonly Pick<EditionDevice, 'slug' | 'name'>[],
  { edition, total, first = 1 }: { edition: number; total: number; first?: number },
  siteUrl: (path: string) => string,
): object {
  return {
    '@context': 'https://schema.org',
    '@type': 'ItemList',
    name: `Electronic-paper reading devices by the lightness of their page, edition ${edition}`,
    url: siteUrl('/devices'),
    numberOfItems: total,
    itemListOrder: 'https://schema.org/ItemListOrderDescending',
    itemListElement: devices.map(({ slug, name }, place) => ({
      '@type': 'ListItem',
      position: first + place,
      name,
      url: siteUrl(`/devices/${slug}`),
    })),
  }
}
