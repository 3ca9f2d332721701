import type { Components } from '@/lib/method/figures'
import type { Edition } from '@/lib/method/types'

type Lab = { l: number; a: number; b: number }

/**
 * All that an edition rests on and that can no longer change once it is released: its document, the components pooled
 * for it, and of sets, readings, sessions and controls the parts that the database refuses to alter. What may still be
 * put right (the name of an instrument, the note of a session, how a unit was obtained) is not here.
 */
export type DatasetSource = {
  edition: Edition
  components: { page: Components; ink: Components }
  sets: {
    id: number
    device: string
    unit: string
    session: string
    position: string
    state: 'page' | 'ink'
    shown: string
  }[]
  readings: (Lab & {
    set: number
    ordinal: number
    instrumentWhiteness: number | null
    /** Radiance factors at `WAVELENGTHS`. */
    spectrum: number[] | null
    flag: 'none' | 'flagged' | 'left-out'
    reason: string | null
  })[]
  sessions: {
    session: string
    instrument: number
    startedAt: Date
    endedAt: Date
    temperature: number
    geometry: string
    specular: string
    illuminant: string
    /** Degrees. */
    observer: string
    aperture: number
    uv: string
  }[]
  controls: (Lab & { session: string; kind: string; sample: number; moment: string; ordinal: number })[]
}
