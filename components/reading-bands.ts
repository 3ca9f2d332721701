import type { LadderBand } from './charts/ladder'

/** Bands of light a ladder marks, around three of the method's reading spots (common practice, no source). */
export const READING_BANDS: LadderBand[] = [
  { label: 'Bedside', hint: 'small lamp', lo: 50, hi: 200, tone: 'lamp' },
  { label: 'Desk', hint: 'office light', lo: 320, hi: 500, tone: 'room' },
  { label: 'Shade', hint: 'outdoors', lo: 5000, hi: 10_000, tone: 'daylight' },
]
