/**
 * The classes of a component by its look: what every look shares, the look's own, and what the caller adds for layout.
 * @example const button = variants('px-4 font-semibold', { primary: 'bg-shade text-on-shade' }); button('primary')
 */
export function variants<Look extends string>(shared: string, looks: Record<Look, string>) {
  return (look: Look, added?: string) => [shared, looks[look], added].filter(Boolean).join(' ')
}
