import { type Column, labColumns, SESSION, STATES, type Table } from './table'

/** Wavelengths a spectrum is stored at, nm. */
export const WAVELENGTHS = Array.from({ length: 31 }, (_, i) => 400 + 10 * i)

const SET: Column = { name: 'set', type: 'integer', meaning: 'The set, by its number.' }
const ORDINAL: Column = { name: 'ordinal', type: 'integer', meaning: 'Place within the set, from 1, in order of time.' }

export const SESSIONS: Table = {
  name: 'sessions',
  title: 'Sessions',
  description: 'One row a session the edition rests on, for its sets or its controls, in the order they began.',
  key: ['session'],
  columns: [
    SESSION,
    { name: 'instrument', type: 'integer', meaning: 'The instrument, by its number at the bench.' },
    { name: 'started_at', type: 'datetime', meaning: 'When it began.' },
    { name: 'ended_at', type: 'datetime', meaning: 'When it ended.' },
    { name: 'temperature', type: 'number', unit: '°C', meaning: 'Temperature of the room.' },
    { name: 'geometry', type: 'text', meaning: 'CIE geometry of the readings.' },
    { name: 'specular', type: 'text', meaning: 'Whether the mirror part is in the readings.', words: ['included'] },
    { name: 'illuminant', type: 'text', meaning: 'Illuminant the colours are worked out for.', words: ['D65'] },
    { name: 'observer', type: 'integer', unit: 'deg', meaning: 'CIE standard observer.' },
    { name: 'aperture', type: 'number', unit: 'mm', meaning: 'Diameter of the spot that is read.' },
    {
      name: 'uv',
      type: 'text',
      meaning: 'Ultraviolet in the light of the instrument.',
      words: ['included', 'cut', 'adjusted'],
    },
  ],
}

export const SETS: Table = {
  name: 'sets',
  title: 'Sets',
  description:
    'One row a set the figures rest on: one unit, one position, one state, one session. In the order of their numbers. Sets that do not count are not here.',
  key: ['set'],
  references: [
    { columns: ['device'], table: 'devices', to: ['device'] },
    { columns: ['session'], table: 'sessions', to: ['session'] },
  ],
  columns: [
    SET,
    { name: 'device', type: 'text', meaning: 'The device it is of, by the last part of its address on the site.' },
    { name: 'unit', type: 'text', meaning: 'The unit, by its serial number.' },
    SESSION,
    { name: 'position', type: 'text', meaning: 'Where on the page.' },
    { name: 'state', type: 'text', meaning: 'page: full white; ink: full black.', words: STATES },
    { name: 'shown', type: 'text', meaning: 'What was shown.' },
  ],
}

export const READINGS: Table = {
  name: 'readings',
  title: 'Readings',
  description:
    'One row a press of the instrument in a set the figures rest on, those left out of the mean included. In the order of sets and of time.',
  key: ['set', 'ordinal'],
  references: [{ columns: ['set'], table: 'sets', to: ['set'] }],
  columns: [
    SET,
    ORDINAL,
    ...labColumns('the reading'),
    {
      name: 'instrument_whiteness',
      type: 'number',
      unit: '1',
      meaning: 'CIE whiteness W10 as the instrument gave it; we work out our own.',
      empty: 'The instrument gave none.',
    },
    {
      name: 'flag',
      type: 'text',
      meaning: 'none: as read; flagged: stands out, and counts; left-out: does not count.',
      words: ['none', 'flagged', 'left-out'],
    },
    {
      name: 'reason',
      type: 'text',
      meaning: 'Why it is flagged, left out or cleared.',
      empty: 'It was never flagged.',
    },
  ],
}

export const SPECTRA: Table = {
  name: 'spectra',
  title: 'Spectra',
  description: 'One row a reading whose instrument stores spectra, in the order of sets and of time.',
  key: ['set', 'ordinal'],
  references: [{ columns: ['set', 'ordinal'], table: 'readings', to: ['set', 'ordinal'] }],
  columns: [
    SET,
    ORDINAL,
    ...WAVELENGTHS.map(
      (nm): Column => ({ name: `r${nm}`, type: 'number', unit: '1', meaning: `Radiance factor at ${nm} nm.` }),
    ),
  ],
}

export const CONTROLS: Table = {
  name: 'controls',
  title: 'Readings of controls',
  description:
    'One row a reading of a control, in the order of sessions and of time. The tile gives the doubt between sessions, the paper its own colour.',
  key: ['session', 'sample', 'moment', 'ordinal'],
  references: [{ columns: ['session'], table: 'sessions', to: ['session'] }],
  columns: [
    SESSION,
    { name: 'kind', type: 'text', meaning: 'What kind of control.', words: ['tile', 'chart-white', 'paper'] },
    { name: 'sample', type: 'integer', meaning: 'Which one of its kind, by its number; another is never compared.' },
    { name: 'moment', type: 'text', meaning: 'At the start or the end of the session.', words: ['start', 'end'] },
    { name: 'ordinal', type: 'integer', meaning: 'Place in that moment, from 1.' },
    ...labColumns('the reading'),
  ],
}
