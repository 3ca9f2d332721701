import type { Lab } from '@/lib/method/types'

/** The bench at Marlquay, an invented harbour town: instruments, controls, sessions. All of it is made up. */

export const INSTRUMENTS = [
  {
    key: 'one',
    name: 'Sphere one',
    serial: 'MQ-S1-0419',
    certificate: 'MQ-CAL-2025-118',
    certifiedOn: '2025-08-28',
    servicedOn: '2026-05-04',
    u: { L: 0.25, a: 0.1, b: 0.12 },
    storesSpectra: false,
    tile: 'MQ-TILE-7',
  },
  {
    key: 'two',
    name: 'Sphere two',
    serial: 'MQ-S2-1107',
    certificate: 'MQ-CAL-2025-131',
    certifiedOn: '2025-09-19',
    servicedOn: null,
    u: { L: 0.22, a: 0.09, b: 0.11 },
    storesSpectra: true,
    tile: 'MQ-TILE-9',
  },
] as const
export type InstrumentKey = (typeof INSTRUMENTS)[number]['key']

export const CONTROLS: {
  kind: 'tile' | 'chart-white' | 'paper'
  name: string
  serial: string
  note: string
  lab: Lab
}[] = [
  {
    kind: 'tile',
    name: 'White ceramic tile',
    serial: 'MQ-TILE-3',
    note: 'Kept dry and dark; for stability, not for meaning.',
    lab: { L: 95.2, a: -0.42, b: 0.61 },
  },
  {
    kind: 'chart-white',
    name: 'Chart white patch',
    serial: 'MQ-CHART-2',
    note: 'Matte white patch of a test chart, slightly yellow.',
    lab: { L: 96.02, a: -0.48, b: 1.52 },
  },
  {
    kind: 'paper',
    name: 'Control paper no. 4',
    serial: 'MQ-PAPER-4',
    note: 'Uncoated paper chosen for having almost no brightener, 80 g/m², read on four sheets of itself, kept in the dark; UV included.',
    lab: { L: 93.9, a: 0.3, b: -1.3 },
  },
]

/** The day the first instrument came back from service and was set anew: its slow drift starts again from nothing. */
export const RECALIBRATED_ON = '2026-05-05'
/** Drift of the first instrument, L* a day. */
export const DRIFT_PER_DAY = 0.0009

/** About fourteen months of sessions. The letter tells the sessions of a day apart. */
export const SESSIONS: { name: string; instrument: InstrumentKey; operator: string; hour: number; celsius: number }[] =
  [
    { name: '2025-09-24-a', instrument: 'one', operator: 'tester 1', hour: 9, celsius: 22.6 },
    { name: '2025-10-08-a', instrument: 'two', operator: 'tester 2', hour: 9, celsius: 23.1 },
    { name: '2025-10-22-a', instrument: 'one', operator: 'tester 1', hour: 13, celsius: 22.9 },
    { name: '2025-11-05-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 23.0 },
    { name: '2025-11-19-a', instrument: 'one', operator: 'tester 2', hour: 9, celsius: 22.4 },
    { name: '2025-12-03-a', instrument: 'two', operator: 'tester 1', hour: 10, celsius: 22.2 },
    { name: '2026-01-14-a', instrument: 'one', operator: 'tester 1', hour: 9, celsius: 22.1 },
    { name: '2026-01-14-b', instrument: 'two', operator: 'tester 2', hour: 14, celsius: 22.8 },
    { name: '2026-01-28-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 22.5 },
    { name: '2026-02-11-a', instrument: 'one', operator: 'tester 2', hour: 9, celsius: 22.7 },
    { name: '2026-02-18-a', instrument: 'two', operator: 'tester 1', hour: 13, celsius: 23.0 },
    { name: '2026-04-15-a', instrument: 'two', operator: 'tester 2', hour: 9, celsius: 23.2 },
    { name: '2026-05-06-a', instrument: 'one', operator: 'tester 1', hour: 9, celsius: 23.3 },
    { name: '2026-05-13-a', instrument: 'one', operator: 'tester 2', hour: 9, celsius: 23.5 },
    { name: '2026-06-03-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 23.8 },
    { name: '2026-06-10-a', instrument: 'one', operator: 'tester 2', hour: 14, celsius: 24.0 },
    { name: '2026-06-24-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 24.3 },
    { name: '2026-09-02-a', instrument: 'one', operator: 'tester 1', hour: 9, celsius: 24.1 },
    { name: '2026-09-16-a', instrument: 'two', operator: 'tester 2', hour: 9, celsius: 23.6 },
    { name: '2026-10-07-a', instrument: 'one', operator: 'tester 2', hour: 13, celsius: 23.1 },
    { name: '2026-10-21-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 22.9 },
    { name: '2026-11-04-a', instrument: 'two', operator: 'tester 1', hour: 9, celsius: 22.7 },
  ]

/** Which unit (device, revision, unit from 1) was read in which session. */
export const PLAN: [session: string, device: string, revision: string, unit: number][] = [
  ['2025-09-24-a', 'ostler-plain-6', 'A', 1],
  ['2025-09-24-a', 'quayle-margin-10', 'A', 1],
  ['2025-10-08-a', 'ostler-plain-7', 'A', 1],
  ['2025-10-08-a', 'tamber-reed-7', 'A', 1],
  ['2025-10-22-a', 'wexby-vesper-6', 'A', 1],
  ['2025-10-22-a', 'tamber-almanac-6', 'A', 1],
  ['2025-11-05-a', 'tamber-reed-7-colour', 'A', 1],
  ['2025-11-05-a', 'pellow-wayside-5', 'A', 1],
  ['2025-11-19-a', 'quayle-margin-13', 'A', 1],
  ['2025-11-19-a', 'haldon-copybook-10', 'A', 1],
  ['2025-12-03-a', 'corrin-quarto-10-colour', 'A', 1],
  ['2025-12-03-a', 'quayle-margin-10', 'A', 2],
  ['2026-01-14-a', 'ostler-plain-7', 'A', 2],
  ['2026-01-14-a', 'tamber-reed-7', 'A', 2],
  ['2026-01-14-b', 'ostler-plain-6', 'A', 2],
  ['2026-01-28-a', 'wexby-vesper-6', 'A', 2],
  ['2026-01-28-a', 'haldon-copybook-10', 'A', 2],
  ['2026-02-11-a', 'tamber-reed-7-colour', 'A', 2],
  ['2026-02-11-a', 'tamber-almanac-6', 'A', 2],
  ['2026-02-18-a', 'quayle-margin-13', 'A', 2],
  ['2026-02-18-a', 'corrin-quarto-10-colour', 'A', 2],
  ['2026-02-18-a', 'pellow-wayside-5', 'A', 2],
  ['2026-04-15-a', 'ostler-plain-6', 'B', 1],
  ['2026-04-15-a', 'wexby-vesper-8', 'A', 1],
  ['2026-05-06-a', 'corrin-octavo-8', 'A', 1],
  ['2026-06-03-a', 'haldon-copybook-10-colour', 'A', 1],
  ['2026-06-03-a', 'ostler-plain-6', 'B', 2],
  ['2026-06-10-a', 'wexby-vesper-8', 'A', 2],
  ['2026-06-10-a', 'haldon-copybook-10-colour', 'A', 2],
  ['2026-06-24-a', 'corrin-octavo-8', 'A', 2],
  ['2026-09-02-a', 'quayle-margin-10', 'A', 3],
  ['2026-09-16-a', 'corrin-duodecimo-6-colour', 'A', 1],
  ['2026-10-07-a', 'corrin-duodecimo-6-colour', 'A', 2],
  ['2026-10-21-a', 'pellow-broadsheet-13-colour', 'A', 1],
  ['2026-11-04-a', 'ostler-plain-7', 'A', 2],
]

/** The set that edition 1 rested on and edition 2 does not: the front light had been on. */
export const WITHDRAWN = {
  session: '2026-01-14-a',
  device: 'tamber-reed-7',
  unit: 2,
  /** What the light added to each of the unit's page readings that morning. */
  error: { L: 2.6, a: 0.2, b: 1.1 },
  at: '2026-05-12T10:00:00Z',
  reason: 'The front light was on at its lowest setting, found on the photograph of the session.',
  /** Its pages were read again here. */
  againIn: '2026-05-13-a',
}

/** Readings that stand out: one left out with its reason, one looked at and kept. */
export const OUTLIERS = [
  {
    session: '2025-11-19-a',
    device: 'haldon-copybook-10',
    position: 'upper-outer',
    state: 'page',
    ordinal: 5,
    error: { L: -0.86, a: 0.12, b: 0.31 },
    flag: 'left-out',
    reason: 'Stands out by Grubbs’ test; the foot was not flat on the bezel, as the tester noted.',
  },
  {
    session: '2026-02-18-a',
    device: 'pellow-wayside-5',
    position: 'centre',
    state: 'page',
    ordinal: 3,
    error: { L: -0.24, a: 0, b: 0.05 },
    flag: 'flagged',
    reason: 'Stands out by Grubbs’ test; nothing was found wrong, so it counts.',
  },
] as const

export const EDITIONS = [
  {
    publishedAt: '2026-02-27T09:00:00Z',
    title: 'Edition 1',
    note: 'The first eleven devices, read between September 2025 and February 2026.',
  },
  {
    publishedAt: '2026-07-03T09:00:00Z',
    title: 'Edition 2',
    note: 'Corrects the page of Tamber Reed 7. Adds Wexby Vesper 8, Corrin Octavo 8 and Haldon Copybook 10 Colour. Ostler Plain 6 is now its revision B.',
  },
  {
    publishedAt: '2026-11-20T09:00:00Z',
    title: 'Edition 3',
    note: 'Adds Corrin Duodecimo 6 Colour and, from one unit, Pellow Broadsheet 13 Colour. A third unit of Quayle Margin 10.',
  },
]
