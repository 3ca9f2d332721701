/**
 * Ranked devices in groups too close to call: the highest not yet grouped, and those directly below it while each is
 * too close to that first one. Method 1, section 6.
 * @param ranked in ranked order
 */
export function groupTies<Device extends { slug: string; tiedWith: string[] }>(ranked: readonly Device[]): Device[][] {
  const groups: Device[][] = []
  for (const device of ranked) {
    const group = groups.at(-1)
    if (group?.[0]?.tiedWith.includes(device.slug)) group.push(device)
    else groups.push([device])
  }
  return groups
}
