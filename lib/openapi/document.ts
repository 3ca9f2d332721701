import { LICENCE } from '@/lib/dataset/about'
import { PATHS } from './operations'
import { SCHEMAS } from './schemas'
import type { OpenApi } from './types'

/** The API's own description. Its server is wherever the description was loaded from. */
export const OPENAPI: OpenApi = {
  openapi: '3.1.1',
  info: {
    title: 'Lampleaf API',
    version: '1',
    summary: 'Measured pages of electronic-paper reading devices, by edition.',
    description:
      'No key and no account. Reads may be asked from any site’s pages. Everything but a ranking has a strong ETag. Whatever goes wrong is application/problem+json (RFC 9457) and names the field. The same data as files: /data.',
    license: { name: LICENCE.title, identifier: LICENCE.id },
  },
  servers: [{ url: '/', description: 'The site this description is from.' }],
  security: [],
  paths: PATHS,
  components: { schemas: SCHEMAS },
}
