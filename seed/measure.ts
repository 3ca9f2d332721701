import { labToXyz } from '@/lib/colour/lab'
import { cieWhiteness } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import { fillNormals } from '@/lib/method/random'
import type { Lab } from '@/lib/method/types'
import { DRIFT_PER_DAY, type InstrumentKey, RECALIBRATED_ON, SESSIONS } from './scenario/bench'
import type { ScenarioDevice } from './scenario/devices'
import { spectrumOf } from './spectra'

/** Standard deviations the simulated bench works with, in L*, a*, b*. */
const SPREAD = {
  session: { L: 0.07, a: 0.025, b: 0.04 },
  unit: { L: 0.34, a: 0.12, b: 0.2 },
  position: { L: 0.16, a: 0.05, b: 0.08 },
  reading: { L: 0.045, a: 0.015, b: 0.02 },
  tileReading: { L: 0.025, a: 0.01, b: 0.012 },
} as const

export const POSITIONS = ['centre', 'upper-outer', 'lower-inner'] as const
export type State = 'page' | 'ink'

export type SimulatedReading = Lab & { instrumentWhiteness: number | null; spectrum: number[] | null }

/** Three normal errors, always the same for the same name. */
function errorsOf(name: string, spread: Lab): Lab {
  const [L, a, b] = fillNormals(`demo ${name}`, new Float64Array(4)) as unknown as [number, number, number]
  return { L: L * spread.L, a: a * spread.a, b: b * spread.b }
}

function add(...parts: Lab[]): Lab {
  return parts.reduce((sum, part) => ({ L: sum.L + part.L, a: sum.a + part.a, b: sum.b + part.b }))
}

/** What a session adds to everything read in it: its own error, and the first instrument's slow drift. */
function sessionError(session: string): Lab {
  const { instrument } = SESSIONS.find((one) => one.name === session)!
  const day = session.slice(0, 10)
  const since = instrument === 'one' ? (day < RECALIBRATED_ON ? '2025-08-28' : RECALIBRATED_ON) : day
  const days = (Date.parse(day) - Date.parse(since)) / 86_400_000
  return add(errorsOf(`session ${session}`, SPREAD.session), { L: DRIFT_PER_DAY * days, a: 0, b: 0 })
}

/** A reading of a control. */
export function readControl(colour: Lab, session: string, serial: string, name: string): Lab {
  return toInstrument(add(colour, sessionError(session), errorsOf(`${serial} ${session} ${name}`, SPREAD.tileReading)))
}

type Place = { session: string; revision: string; unit: number; position: string; state: State; ordinal: number }

/** One reading of a device's page or ink, as the instrument of that session would record it. */
export function readDevice(device: ScenarioDevice, place: Place, extra: Lab = { L: 0, a: 0, b: 0 }): SimulatedReading {
  const { session, revision, unit, position, state, ordinal } = place
  const instrument = SESSIONS.find((one) => one.name === session)!.instrument
  const truth = device.revisions.find((one) => one.name === revision)![state]
  const where = `${device.slug} ${revision} ${state} unit ${unit}`
  const exact = add(
    truth,
    scaled(errorsOf(where, SPREAD.unit), state),
    scaled(errorsOf(`${where} ${position}`, SPREAD.position), state),
    errorsOf(`${where} ${position} ${session} ${ordinal}`, SPREAD.reading),
    sessionError(session),
    extra,
  )
  return recorded(exact, instrument, device.colour ? 'filter' : 'mono')
}

/** Inks of two units are a little closer than their pages. */
function scaled(error: Lab, state: State): Lab {
  const by = state === 'ink' ? 0.7 : 1
  return { L: error.L * by, a: error.a * by, b: error.b * by }
}

function recorded(exact: Lab, instrument: InstrumentKey, kind: 'mono' | 'filter'): SimulatedReading {
  const shown = toInstrument(exact)
  if (instrument === 'one') return { ...shown, instrumentWhiteness: null, spectrum: null }
  const { whiteness } = cieWhiteness(xyzToXyy(labToXyz(exact)))
  const spectrum = spectrumOf(exact, kind).map((value) => Math.round(value * 1e6) / 1e6)
  return { ...shown, instrumentWhiteness: Math.round(whiteness * 100) / 100, spectrum }
}

/** Instruments record two decimals. */
function toInstrument({ L, a, b }: Lab): Lab {
  const two = (value: number) => Math.round(value * 100) / 100
  return { L: two(L), a: two(a), b: two(b) }
}
