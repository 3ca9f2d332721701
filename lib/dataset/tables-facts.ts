import { DEVICE, type Table } from './table'

export const DEVICES: Table = {
  name: 'devices',
  title: 'Devices',
  description: 'One row a device the edition prints, in the order of their slugs.',
  key: ['device'],
  columns: [
    DEVICE,
    { name: 'name', type: 'text', meaning: 'Its name as sold.' },
    { name: 'maker', type: 'text', meaning: 'Who makes it.' },
    { name: 'revision', type: 'text', meaning: 'The revision the figures belong to.' },
    { name: 'units', type: 'integer', meaning: 'How many units were measured in both states.' },
    {
      name: 'provisional',
      type: 'boolean',
      meaning: 'Whether the figures rest on a single unit, and so are less sure.',
    },
    {
      name: 'price_minor',
      type: 'integer',
      unit: 'minor units of price_currency',
      meaning: 'Price the team saw last before the release, tax included; never converted.',
      empty: 'No price was seen, or the device is no longer on sale.',
    },
    {
      name: 'price_currency',
      type: 'text',
      meaning: 'Currency of the price, ISO 4217.',
      empty: 'There is no price.',
    },
  ],
}

export const SPECS: Table = {
  name: 'specs',
  title: 'Specifications',
  description:
    'One row a fact of a device as the edition took it to be stated; a list of formats has a row for each. In the order of devices, then of fields as in the API.',
  key: ['device', 'field', 'item'],
  references: [{ columns: ['device'], table: 'devices', to: ['device'] }],
  columns: [
    DEVICE,
    {
      name: 'field',
      type: 'text',
      meaning: 'Which fact.',
      words: [
        'frontLight',
        'frontLightMax',
        'frontLightMin',
        'diagonal',
        'ppi',
        'weight',
        'pen',
        'colour',
        'water',
        'pageButtons',
        'onSale',
        'lending',
        'speech',
        'formats',
      ],
    },
    { name: 'item', type: 'integer', meaning: 'Place in a list of formats, from 1; 1 for every other fact.' },
    {
      name: 'stated',
      type: 'text',
      meaning: 'yes: has it, or the value beside; no: has it not; not-stated: nobody says, which is never a no.',
      words: ['yes', 'no', 'not-stated'],
    },
    {
      name: 'value',
      type: 'number',
      unit: 'as in the column unit',
      meaning: 'The number, where the fact is one. Front lights are measured by us, the rest is as stated.',
      empty: 'The fact is not a number, or is not stated.',
    },
    {
      name: 'unit',
      type: 'text',
      meaning: 'Unit of the value: in, ppi, g, cd/m², or the second digit of an IEC 60529 code.',
      empty: 'There is no value.',
    },
    {
      name: 'text',
      type: 'text',
      meaning: 'Name of a file format.',
      empty: 'The fact is not a list of formats, or is not stated.',
    },
  ],
}
