import type { PartId } from './budget'

/** The lines of a budget in words, and the sign each has in the method. */
export const PART_WORDS: Record<PartId, { name: string; sign: string; from: string }> = {
  reading: { name: 'Scatter of readings', sign: 's(r)', from: 'readings of the same place, within sets' },
  position: { name: 'Places on a page', sign: 's(pos)', from: 'sets of the same unit' },
  unit: { name: 'Units of a model', sign: 's(unit)', from: 'units of the same model' },
  session: { name: 'The session', sign: 's(session)', from: 'the control tile, from session to session' },
  common: { name: 'Calibration and certificate', sign: 'u(common)', from: 'the instruments’ certificates' },
}
