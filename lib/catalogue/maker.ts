/** Longest name of a maker in an address, characters. */
export const LONGEST_MAKER = 60

/** A maker's name as an address holds it: small letters and digits of any script, hyphens between the words. */
export function makerKey(name: string): string {
  return name
    .normalize('NFC')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/g, '')
}
