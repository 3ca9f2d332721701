/** The address of one of the other sites the browser tests run against; see playwright.config.ts. */
export function fromAddress(name: 'EMPTY_URL' | 'DOWN_URL'): string {
  const address = process.env[name]
  if (!address) throw new Error(`${name} is missing: the browser tests are started by npm test`)
  return address
}
