import { METHOD } from './constants'
import { frontLightMax } from './light'
import type { EditionDevice, Limit, Limits, NearMiss } from './types'

/** How a device stands to one limit. `by`: how far off a number is, in the limit's unit; null where it is none. */
type Verdict = { limit: Limit; field: keyof EditionDevice } & (
  | { meets: true | null }
  | { meets: false; by: number | null }
)

export type LimitsApplied = {
  /** Devices not known to fail a limit, in the order given, each with the limited fields that are not stated. */
  left: { device: EditionDevice; notStated: string[] }[]
  excluded: { slug: string; failed: Limit[] }[]
  /** Devices failing exactly one limit. */
  nearMisses: NearMiss[]
}

const HAS = ['pen', 'colour', 'pageButtons', 'onSale', 'lending', 'speech'] as const

/**
 * Sets aside the devices known to fail a limit. What is not stated, a price in another currency too, fails nothing.
 * Method 1, section 7.
 */
export function applyLimits(devices: readonly EditionDevice[], limits: Limits): LimitsApplied {
  const left: LimitsApplied['left'] = []
  const excluded: LimitsApplied['excluded'] = []
  const nearMisses: NearMiss[] = []
  for (const device of devices) {
    const verdicts = judge(device, limits)
    const failed = verdicts.filter((verdict) => verdict.meets === false)
    if (failed.length === 0) {
      left.push({ device, notStated: verdicts.filter((v) => v.meets === null).map((v) => v.field) })
      continue
    }
    excluded.push({ slug: device.slug, failed: failed.map((verdict) => verdict.limit) })
    const [only, another] = failed
    if (only && !another) nearMisses.push({ slug: device.slug, limit: only.limit, by: only.by })
  }
  return { left, excluded, nearMisses }
}

/** The limits a reader set. `currency` belongs to the budget; no formats named is no limit. */
export function limitsSet(limits: Limits): Limit[] {
  return (Object.keys(limits) as (keyof Limits)[]).filter(
    (field): field is Limit =>
      field !== 'currency' && limits[field] !== undefined && (field !== 'formats' || limits.formats!.length > 0),
  )
}

/** What a reader should hear about their limits: that they are many, or that they leave little to choose from. */
export function limitWarnings(limits: Limits, devicesLeft: number): ('many-limits' | 'few-devices')[] {
  const set = limitsSet(limits).length
  const warnings: ('many-limits' | 'few-devices')[] = []
  if (set > METHOD.changes.manyLimits.value) warnings.push('many-limits')
  if (set > 0 && devicesLeft < METHOD.changes.fewDevices.value) warnings.push('few-devices')
  return warnings
}

function judge(device: EditionDevice, limits: Limits): Verdict[] {
  const { budget, currency, minDiagonal, maxDiagonal, maxWeight, water, frontLight, formats } = limits
  const verdicts: Verdict[] = []
  const price = device.price?.currency === currency ? (device.price?.amount ?? null) : null

  if (budget !== undefined) verdicts.push(atMost('budget', 'price', price, budget))
  if (minDiagonal !== undefined) verdicts.push(atLeast('minDiagonal', 'diagonal', device.diagonal, minDiagonal))
  if (maxDiagonal !== undefined) verdicts.push(atMost('maxDiagonal', 'diagonal', device.diagonal, maxDiagonal))
  if (maxWeight !== undefined) verdicts.push(atMost('maxWeight', 'weight', device.weight, maxWeight))
  for (const field of HAS) {
    const wanted = limits[field]
    if (wanted !== undefined) verdicts.push(has(field, device[field], wanted))
  }
  if (frontLight !== undefined) {
    const lit = device.frontLight === null ? null : frontLightMax(device.frontLight) > 0
    verdicts.push(has('frontLight', lit, frontLight))
  }
  if (water !== undefined) verdicts.push(atLeast('water', 'water', device.water, water))
  if (formats?.length) {
    const stated = device.formats?.map((format) => format.toUpperCase())
    const readsAll = stated ? formats.every((format) => stated.includes(format.toUpperCase())) : null
    verdicts.push(has('formats', readsAll, true))
  }
  return verdicts
}

function atMost(limit: Limit, field: keyof EditionDevice, value: number | null, most: number): Verdict {
  if (value === null) return { limit, field, meets: null }
  return value <= most ? { limit, field, meets: true } : { limit, field, meets: false, by: plain(value - most) }
}

function atLeast(limit: Limit, field: keyof EditionDevice, value: number | null, least: number): Verdict {
  if (value === null) return { limit, field, meets: null }
  return value >= least ? { limit, field, meets: true } : { limit, field, meets: false, by: plain(least - value) }
}

function has(field: Limit & keyof EditionDevice, value: boolean | null, wanted: boolean): Verdict {
  if (value === null) return { limit: field, field, meets: null }
  return value === wanted ? { limit: field, field, meets: true } : { limit: field, field, meets: false, by: null }
}

/** 7 − 6.8 is 0.2, not 0.2000000000000002. */
function plain(difference: number): number {
  return Number(difference.toFixed(6))
}
