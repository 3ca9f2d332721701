import type { z } from 'zod'
import { DEVICE_PARAMETERS, DEVICE_READINGS_PARAMETERS, deviceQuery, deviceReadingsQuery } from '@/lib/contract/device'
import { DEVICE_LIST_PARAMETERS, deviceListQuery } from '@/lib/contract/device-list'
import { ANY, good, NOT_MODIFIED, refusal } from './answers'
import { QUESTIONS } from './questions'
import { jsonSchema, ref } from './schemas'
import type { JsonSchema, Operation, Parameter, Path } from './types'

const SLUG: Parameter = {
  name: 'slug',
  in: 'path',
  required: true,
  description: 'The device, as the list of devices names it.',
  schema: { type: 'string', pattern: '^[a-z0-9]+(-[a-z0-9]+)*$' },
  example: 'tamber-reed-7',
}

/** The query of an operation: each parameter with the words and the example of the contract. */
function query(schema: z.core.$ZodType, told: Record<string, { description: string; example: string }>): Parameter[] {
  const { properties } = jsonSchema(schema, 'input') as { properties: Record<string, JsonSchema> }
  return Object.entries(told).map(([name, { description, example }]) => ({
    name,
    in: 'query',
    required: false,
    description,
    schema: properties[name] ?? {},
    example,
  }))
}

const reads = (operation: Omit<Operation, 'responses'> & { responses: Operation['responses'] }): Path => ({
  get: { ...operation, responses: { ...operation.responses, 304: NOT_MODIFIED, ...ANY } },
})
const NONE = refusal('No edition has been released yet.')

/** Every address of the API, in the order one meets them. */
export const PATHS: Record<string, Path> = {
  '/api/v1/editions': reads({
    operationId: 'listEditions',
    summary: 'Every released edition',
    description: 'Newest first, with the address of each one’s document.',
    responses: { 200: good('The list; empty before the first release.', ref('EditionList')) },
  }),
  '/api/v1/editions/latest': reads({
    operationId: 'latestEdition',
    summary: 'The newest edition',
    description: 'The frozen document: devices, figures, doubts and facts. Good for a minute; then ask again.',
    responses: { 200: good('The document.', ref('Edition')), 404: NONE },
  }),
  '/api/v1/editions/{number}': reads({
    operationId: 'edition',
    summary: 'An edition by its number',
    description:
      'It never changes. Its sha256 is of the RFC 8785 canonical JSON of the document without that field, so that you can check it.',
    parameters: [
      {
        name: 'number',
        in: 'path',
        required: true,
        description: 'A released edition, from 1.',
        schema: { type: 'integer', minimum: 1 },
        example: '2',
      },
    ],
    responses: {
      200: good('The document.', ref('Edition')),
      404: refusal('There is no released edition of this number.'),
    },
  }),
  '/api/v1/devices': reads({
    operationId: 'listDevices',
    summary: 'The devices of the newest edition',
    description:
      'Filtered and ordered as the catalogue on the site, lightest first where nothing is said. A device that does not state what a filter asks stays, after those known to match, and names what it does not state.',
    parameters: query(deviceListQuery, DEVICE_LIST_PARAMETERS),
    responses: {
      200: good('One page of the devices found.', ref('DeviceList'), { paged: true }),
      400: refusal('A parameter is not understood; the problem names it.'),
      404: NONE,
    },
  }),
  '/api/v1/devices/{slug}': reads({
    operationId: 'device',
    summary: 'A device, its figures and where it stands',
    description:
      'Every published figure with its doubt (expanded uncertainty, k = 2, about 95 %) and unit, and the places the doubt allows. Whiteness and tint lie outside the limits of their formula on electronic paper.',
    parameters: [SLUG, ...query(deviceQuery, DEVICE_PARAMETERS)],
    responses: {
      200: good('The device.', ref('Device')),
      400: refusal('A parameter is not understood; the problem names it.'),
      404: refusal('There is no such device in the edition, or no such edition.'),
    },
  }),
  '/api/v1/devices/{slug}/readings': reads({
    operationId: 'deviceReadings',
    summary: 'Every reading a device’s figures rest on',
    description:
      'With set, unit, session, position and flag, those left out of the mean included. In the order of sets and of time.',
    parameters: [SLUG, ...query(deviceReadingsQuery, DEVICE_READINGS_PARAMETERS)],
    responses: {
      200: good('One page of the readings.', ref('DeviceReadings'), { paged: true }),
      400: refusal('A parameter is not understood; the problem names it.'),
      404: refusal('There is no such device in the edition, or no such edition.'),
    },
  }),
  '/api/v1/match': {
    post: {
      operationId: 'match',
      summary: 'Rank the devices for one reader’s answers',
      description:
        'What the quiz asks, answered by Method 1 with reasons, ties and what would change the order. Missing parts take the defaults of the method and are named in `assumed`. Nothing of the question is kept. It may be asked by programs, and not by pages of other sites in their visitors’ browsers: a ranking costs more than a read.',
      requestBody: {
        required: true,
        content: { 'application/json': { schema: ref('MatchRequest'), examples: QUESTIONS } },
      },
      responses: {
        200: good('The ranking.', ref('MatchAnswer'), { stored: false }),
        400: refusal('The question is not understood; the problem names each field.'),
        404: refusal('There is no such edition, or none yet.'),
        408: refusal('The body did not arrive in time.'),
        413: refusal('The body is longer than 64 kB.'),
        415: refusal('The body is not application/json.'),
        ...ANY,
      },
    },
  },
  '/api/v1/openapi.json': reads({
    operationId: 'openApi',
    summary: 'This description',
    description: 'OpenAPI 3.1, made of the same schemas that check what is sent.',
    responses: { 200: good('The description.', { type: 'object' }) },
  }),
}
