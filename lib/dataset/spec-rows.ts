import type { EditionDevice } from '@/lib/method/types'
import type { Row } from './table'

type YesOrNo = 'pen' | 'colour' | 'pageButtons' | 'onSale' | 'lending' | 'speech'

/** The facts of a device as its edition took them to be stated, a row each, in the order of the edition document. */
export function specRows(device: EditionDevice): Row[] {
  const row = (
    field: string,
    stated: string,
    rest: Partial<Record<'item' | 'value' | 'unit' | 'text', string | number>>,
  ) => ({
    device: device.slug,
    field,
    item: 1,
    stated,
    value: null,
    unit: null,
    text: null,
    ...rest,
  })
  const known = (value: unknown) => (value === null ? 'not-stated' : value === false ? 'no' : 'yes')
  const truth = (field: YesOrNo) => row(field, known(device[field]), {})
  const number = (field: string, value: number | null, unit: string) =>
    row(field, known(value), value === null ? {} : { value, unit })

  const { frontLight, water, formats } = device
  return [
    row('frontLight', known(frontLight), {}),
    ...(frontLight
      ? [number('frontLightMax', frontLight.max, 'cd/m²'), number('frontLightMin', frontLight.min, 'cd/m²')]
      : []),
    number('diagonal', device.diagonal, 'in'),
    number('ppi', device.ppi, 'ppi'),
    number('weight', device.weight, 'g'),
    truth('pen'),
    truth('colour'),
    // Stated to have no protection is a code of 0.
    { ...number('water', water, 'IEC 60529 second digit'), ...(water === 0 && { stated: 'no' }) },
    truth('pageButtons'),
    truth('onSale'),
    truth('lending'),
    truth('speech'),
    ...(formats?.length
      ? formats.map((text, i) => row('formats', 'yes', { item: i + 1, text }))
      : [row('formats', formats ? 'no' : 'not-stated', {})]),
  ]
}
