import type { Edition, EditionDevice, Lab } from '@/lib/method/types'
import { type ChangedFact, changedFacts } from './changes-facts'
import { type MovedFigure, movedFigures } from './changes-figures'

/** A device of both editions of which anything published differs, its doubt aside. */
export type DeviceChange = {
  slug: string
  before: EditionDevice
  after: EditionDevice
  figures: MovedFigure[]
  facts: ChangedFact[]
}

/** A value of the whole edition, in both. */
export type SharedChange = { what: 'paper' | 'common' | 'session'; before: Lab; after: Lab }

export type EditionChanges = {
  /** In the new edition only, and in the old one only, by name. */
  added: EditionDevice[]
  withdrawn: EditionDevice[]
  /** By name. */
  changed: DeviceChange[]
  /** Devices of both editions with nothing changed but, perhaps, their doubt. */
  unchanged: EditionDevice[]
  /** What all figures share: the control paper, and the uncertainties common to all and of a session. */
  shared: SharedChange[]
  /** Numbers of the method; null where it is the same. */
  method: { before: number; after: number } | null
}

/** What differs between two released editions, figure by figure, from their frozen documents alone. */
export function editionChanges(before: Edition, after: Edition): EditionChanges {
  const old = new Map(before.devices.map((device) => [device.slug, device]))
  const kept = new Set(after.devices.map(({ slug }) => slug))
  const both = after.devices.flatMap((device) => {
    const was = old.get(device.slug)
    return was ? [deviceChange({ ...before, device: was }, { ...after, device })] : []
  })
  const isChanged = ({ figures, facts }: DeviceChange) => figures.length + facts.length > 0
  return {
    added: byName(after.devices.filter(({ slug }) => !old.has(slug))),
    withdrawn: byName(before.devices.filter(({ slug }) => !kept.has(slug))),
    changed: both.filter(isChanged).sort((one, other) => compare(one.after.name, other.after.name)),
    unchanged: byName(both.filter((change) => !isChanged(change)).map((change) => change.after)),
    shared: sharedChanges(before, after),
    method: before.method === after.method ? null : { before: before.method, after: after.method },
  }
}

type Placed = Pick<Edition, 'uncertainty'> & { device: EditionDevice }

/** What differs of one device between two editions. */
export function deviceChange(before: Placed, after: Placed): DeviceChange {
  return {
    slug: after.device.slug,
    before: before.device,
    after: after.device,
    figures: movedFigures(before, after),
    facts: changedFacts(before.device, after.device),
  }
}

function sharedChanges(before: Edition, after: Edition): SharedChange[] {
  const pairs: SharedChange[] = [
    { what: 'paper', before: before.control.paper, after: after.control.paper },
    { what: 'common', before: before.uncertainty.common, after: after.uncertainty.common },
    { what: 'session', before: before.uncertainty.session, after: after.uncertainty.session },
  ]
  return pairs.filter((one) => (['L', 'a', 'b'] as const).some((channel) => one.before[channel] !== one.after[channel]))
}

function byName(devices: EditionDevice[]): EditionDevice[] {
  return devices.toSorted((one, other) => compare(one.name, other.name))
}

const collator = new Intl.Collator('en-GB', { numeric: true })
function compare(one: string, other: string): number {
  return collator.compare(one, other)
}
