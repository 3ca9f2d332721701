import { expect, test } from 'vitest'
import { CATALOGUE_KEYS } from '@/lib/catalogue/keys'
import { catalogueFields } from '@/lib/catalogue/schema'
import nextConfig from '@/next.config'
import { config as proxyConfig } from '@/proxy'

test('every parameter the catalogue understands is one of its keys, and no other', () => {
  expect(Object.keys(catalogueFields).sort()).toEqual([...CATALOGUE_KEYS].sort())
})

test('an address with any of the keys is answered by a page made for it', async () => {
  const rewrites = await nextConfig.rewrites!()
  const { beforeFiles = [] } = Array.isArray(rewrites) ? {} : rewrites
  const keys = beforeFiles.filter(({ source }) => source === '/devices').flatMap(({ has }) => queryKeys(has))
  expect([...new Set(keys)].sort()).toEqual([...CATALOGUE_KEYS].sort())
})

test('and that page gets a policy with a nonce of its own', () => {
  const keys = proxyConfig.matcher.flatMap((matcher) =>
    typeof matcher === 'object' && matcher.source === '/devices' ? queryKeys(matcher.has) : [],
  )
  expect(keys.sort()).toEqual([...CATALOGUE_KEYS].sort())
})

function queryKeys(has: readonly { type: string; key?: string }[] = []): string[] {
  return has.filter(({ type }) => type === 'query').map(({ key }) => key ?? '')
}
