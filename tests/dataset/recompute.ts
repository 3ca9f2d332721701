import {
  average,
  CHANNELS,
  chroma,
  ciede2000,
  expanded,
  hue,
  type Lab,
  luminanceFactor,
  whitenessAndTint,
} from './arithmetic'
import { variances } from './components'
import { readCsv } from './read-csv'

type Rows = Record<string, string>[]
type State = 'page' | 'ink'
const STATES: State[] = ['page', 'ink']

/** Half away from zero, as the edition rounds. */
const rounded = (value: number, decimals: number) =>
  (Math.sign(value) * Math.round(Math.abs(value) * 10 ** decimals)) / 10 ** decimals
const byChannel = (value: (channel: 'L' | 'a' | 'b') => number): Lab => ({
  L: value('L'),
  a: value('a'),
  b: value('b'),
})
const roundLab = (lab: Lab) => byChannel((channel) => rounded(lab[channel], 4))
const labOf = (row: Record<string, string>): Lab => ({ L: Number(row.l), a: Number(row.a), b: Number(row.b) })
const plus = (...labs: Lab[]) => byChannel((channel) => labs.reduce((sum, lab) => sum + lab[channel], 0))

function groupBy<T>(items: T[], key: (item: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>()
  for (const item of items) groups.set(key(item), [...(groups.get(key(item)) ?? []), item])
  return groups
}
const grouped = <T>(items: T[], key: (item: T) => string) => [...groupBy(items, key).values()]

/** House: spreads between units while fewer than three models have two (Method 1, section 1). */
const LEAST_UNIT_SPREAD: Lab = { L: 0.5, a: 0.3, b: 0.4 }

type SetOfReadings = { device: string; unit: string; session: string; state: State; readings: Lab[] }

/**
 * Every figure of every device, from the readings, sets and controls of a data set alone, but for the certificates'
 * part, which no reading shows. Method 1, section 1.
 * @param files of the data set by name
 */
export function recompute(files: (name: string) => string) {
  const readings = readCsv(files('readings.csv'))
  const accepted = groupBy(
    readings.filter(({ flag }) => flag !== 'left-out'),
    ({ set }) => set!,
  )
  const sets = readCsv(files('sets.csv')).map(
    ({ set, device, unit, session, state }): SetOfReadings => ({
      device: device!,
      unit: unit!,
      session: session!,
      state: state as State,
      readings: accepted.get(set!)!.map(labOf),
    }),
  )
  const controls = readCsv(files('controls.csv'))
  const common = labOf(readCsv(files('uncertainty.csv')).find(({ part }) => part === 'common')!)
  const shared = { common, session: roundLab(sessionSpread(controls)), paper: roundLab(paperColour(controls)) }
  const spreads = Object.fromEntries(STATES.map((state) => [state, pooled(sets.filter((set) => set.state === state))]))
  const devices = grouped(sets, ({ device }) => device).map((own) => ({
    device: own[0]!.device,
    ...figures(own, spreads as Record<State, Spreads>, shared),
  }))
  return { devices, shared, spreads: spreads as Record<State, Spreads> }
}

type Spreads = { reading: Lab; position: Lab; unit: Lab }

function pooled(sets: SetOfReadings[]): Spreads {
  const models = grouped(sets, ({ device }) => device).map((model) => grouped(model, ({ unit }) => unit))
  const found = byChannelOf(models)
  const known = models.filter((units) => units.length > 1).length >= 3
  const root = (level: 'reading' | 'position' | 'unit') =>
    byChannel((channel) => Math.sqrt(Math.max(0, found[channel][level])))
  const unit = root('unit')
  return {
    reading: root('reading'),
    position: root('position'),
    unit: byChannel((channel) => (known ? unit[channel] : Math.max(unit[channel], LEAST_UNIT_SPREAD[channel]))),
  }
}

function byChannelOf(models: SetOfReadings[][][]) {
  const of = (channel: 'L' | 'a' | 'b') =>
    variances(models.map((units) => units.map((sets) => sets.map((set) => set.readings.map((one) => one[channel])))))
  return { L: of('L'), a: of('a'), b: of('b') }
}

/** Between sessions of the tile: sessions stand where positions do, tiles where units do. */
function sessionSpread(controls: Rows): Lab {
  const tiles = grouped(
    controls.filter(({ kind }) => kind === 'tile'),
    ({ sample }) => sample!,
  )
  const sessions = tiles.map((tile) => grouped(tile, ({ session }) => session!))
  return byChannel((channel) => {
    const { position } = variances([sessions.map((tile) => tile.map((rows) => rows.map((row) => labOf(row)[channel])))])
    return Math.sqrt(Math.max(0, position))
  })
}

function paperColour(controls: Rows): Lab {
  const all = controls.filter(({ kind }) => kind === 'paper')
  const inUse = all.filter(({ sample }) => sample === all.at(-1)!.sample)
  const sessions = grouped(inUse, ({ session }) => session!)
  return byChannel((channel) => average(sessions.map((rows) => average(rows.map((row) => labOf(row)[channel])))))
}

function stateOf(sets: SetOfReadings[], { unit, position, reading }: Spreads): { colour: Lab; u: Lab } {
  const units = grouped(sets, (set) => set.unit)
  const n = sets.flatMap((set) => set.readings).length
  const colour = byChannel((channel) =>
    average(units.map((own) => average(own.map((set) => average(set.readings.map((one) => one[channel])))))),
  )
  const u = byChannel((channel) =>
    Math.sqrt(unit[channel] ** 2 / units.length + position[channel] ** 2 / sets.length + reading[channel] ** 2 / n),
  )
  return { colour: roundLab(colour), u: roundLab(u) }
}

function figures(
  sets: SetOfReadings[],
  spreads: Record<State, Spreads>,
  shared: { common: Lab; session: Lab; paper: Lab },
) {
  const of = (state: State) =>
    stateOf(
      sets.filter((set) => set.state === state),
      spreads[state],
    )
  const [page, ink] = [of('page'), of('ink')]
  const shares = grouped(sets, ({ session }) => session).map((own) => own.length / sets.length)
  const together = Math.sqrt(shares.reduce((sum, share) => sum + share ** 2, 0))

  // Errors, each an input of its own: page, ink (L* alone), sessions together, common.
  const sizes = [
    ...CHANNELS.map((channel) => page.u[channel]),
    ink.u.L,
    ...CHANNELS.map((channel) => together * shared.session[channel]),
    ...CHANNELS.map((channel) => shared.common[channel]),
  ]
  type Figure = (page: Lab, inkL: number, paper: Lab) => number
  const doubt = (figure: Figure) =>
    expanded((e) => {
      const own = { L: e[0]!, a: e[1]!, b: e[2]! }
      const session = { L: e[4]!, a: e[5]!, b: e[6]! }
      const common = { L: e[7]!, a: e[8]!, b: e[9]! }
      return figure(
        plus(page.colour, own, session, common),
        ink.colour.L + e[3]! + session.L + common.L,
        plus(shared.paper, common),
      )
    }, sizes)
  const all: Record<string, Figure> = {
    page_l: (one) => one.L,
    page_a: (one) => one.a,
    page_b: (one) => one.b,
    whiteness: (one) => whitenessAndTint(one).whiteness,
    tint: (one) => whitenessAndTint(one).tint,
    contrast: (one, inkL) => luminanceFactor(one.L) / luminanceFactor(inkL),
    chroma,
    hue,
    page_y: (one) => luminanceFactor(one.L),
    ink_y: (_, inkL) => luminanceFactor(inkL),
    from_paper: (one, _, paper) => ciede2000(one, paper),
    times_the_light: (one, _, paper) => luminanceFactor(paper.L) / luminanceFactor(one.L),
  }
  const values: Record<string, number> = {
    ink_l: ink.colour.L,
    ink_a: ink.colour.a,
    ink_b: ink.colour.b,
    page_l_u: page.u.L,
    page_a_u: page.u.a,
    page_b_u: page.u.b,
    ink_l_u: ink.u.L,
    ink_a_u: ink.u.a,
    ink_b_u: ink.u.b,
  }
  for (const [name, figure] of Object.entries(all)) {
    values[name] = figure(page.colour, ink.colour.L, shared.paper)
    values[`${name}_doubt`] = doubt(figure)
  }
  return { values, units: new Set(sets.map(({ unit }) => unit)).size }
}
