import { CONTROLS, READINGS, SESSIONS, SETS, SPECTRA } from './tables-bench'
import { DEVICES, SPECS } from './tables-facts'
import { FIGURES, UNCERTAINTY } from './tables-figures'

/**
 * The tables of the data set, in the order one reads them. The dictionary on the page, the Data Package and the CSVW
 * metadata and the files themselves are all made from these descriptions.
 */
export const TABLES = [DEVICES, FIGURES, UNCERTAINTY, SPECS, SETS, READINGS, SESSIONS, CONTROLS, SPECTRA] as const

export type { Column, Table } from './table'
