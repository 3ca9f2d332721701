import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { type ControlState, RULE_WORDS } from './control-state'

type Session = { name: string; startedAt: Date }

/** Since when a series is in control, in a few words. */
export function sinceWords({ since }: ControlState, sessions: readonly Session[]): string {
  const session = since === null ? undefined : sessions[since]
  if (!session) return 'not in control at its last session'
  return since === 0 ? 'all along' : `since ${formatDay(session.startedAt)}`
}

/**
 * What a chart shows, in sentences: the sessions outside a limit, the runs that chance seldom makes, and since when it
 * has been in control.
 * @param sessions as many as the state has points
 */
export function controlWords(state: ControlState, sessions: readonly Session[]): string {
  const at = (index: number) => (sessions[index] ? formatDay(sessions[index].startedAt) : '')
  const outside = state.points.flatMap(({ outside }, i) => (outside ? [i] : []))
  const beyond =
    outside.length === 0
      ? `All ${state.points.length} sessions are within the limits.`
      : `Outside the limits: ${formatList(outside.map((i) => `${sessions[i]?.name} (${at(i)})`))}.`
  const runs = Object.entries(RULE_WORDS)
    .filter(([rule]) => rule !== '1')
    .flatMap(([rule, words]) => {
      const ends = state.points.flatMap(({ rules }, i) => (rules.includes(Number(rule)) ? [i] : []))
      const [first, last] = [ends[0], ends.at(-1)]
      if (first === undefined || last === undefined) return []
      const when = first === last ? `on ${at(first)}` : `between ${at(first)} and ${at(last)}`
      return [`${words}, ending ${when}`]
    })
  const found =
    runs.length > 0 ? ` Runs that chance seldom makes: ${runs.join('; ')}.` : state.runs ? ' No run stands out.' : ''
  const { since } = state
  const now =
    since === null
      ? ' Its last session still belongs to one: it is not in control.'
      : since === 0
        ? ' It has been in control all along.'
        : ` It has been in control since session ${sessions[since]?.name} (${at(since)}).`
  return beyond + found + now
}
