import type { RankedDevice } from '@/lib/method/types'

export type PicksList = {
  name: string
  description: string
  /** Absolute address of the page. */
  url: string
  /** Shown groups, best fit first; a group of several is too close to call. */
  groups: readonly (readonly Pick<RankedDevice, 'slug'>[])[]
  nameOf: (slug: string) => string
  /** Absolute address of a device's page. */
  urlOf: (slug: string) => string
}

/**
 * Picks as a schema.org ItemList. A device that stands alone has its place as `position`; those too close to call have
 * none, since they have no order.
 * @see https://schema.org/ItemList
 */
export function picksList({ name, description, url, groups, nameOf, urlOf }: PicksList) {
  let before = 0
  const items = groups.flatMap((group) => {
    const place = before + 1
    before += group.length
    return group.map(({ slug }) => ({
      '@type': 'ListItem',
      ...(group.length === 1 ? { position: place } : {}),
      name: nameOf(slug),
      url: urlOf(slug),
    }))
  })
  const ordered = groups.every((group) => group.length === 1)
  return {
    '@context': 'https://schema.org',
    '@type': 'ItemList',
    '@id': `${url}#picks`,
    name,
    description,
    url,
    itemListOrder: `https://schema.org/${ordered ? 'ItemListOrderAscending' : 'ItemListUnordered'}`,
    numberOfItems: items.length,
    itemListElement: items,
  }
}
