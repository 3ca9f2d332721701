import { formatNumber } from '@/lib/format/number'
import { prepareAnswers, scoreDevice } from '@/lib/method/fit'
import { changeSentences } from '@/lib/quiz/changes'
import { missWords } from '@/lib/quiz/limit-words'
import { deviceOf, type Result, spotsOf } from '@/lib/quiz/result'

const MOST_MISSES = 4

/** What would put another device first, and which devices nearly made it. */
export function Changes({ result }: { result: Result }) {
  const { match, answers } = result
  const sentences = changeSentences(match.wouldChange, {
    spots: spotsOf(result),
    limits: answers.limits,
    devices: match.ranked.filter(({ unreadable }) => unreadable < 1).length,
    nameOf: (slug) => deviceOf(result, slug).name,
  })
  return (
    <section aria-labelledby="changes" className="min-w-0 print:flex print:gap-6 print:*:flex-1">
      {sentences.length > 0 && (
        <div>
          <h2 id="changes">What would change this</h2>
          <ul className="mt-4 grid list-disc gap-2 pl-5 print:mt-1 print:gap-0">
            {sentences.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </div>
      )}
      <NearMisses result={result} level={sentences.length > 0 ? 3 : 2} />
    </section>
  )
}

/**
 * Devices that fail one limit alone, best fit first: what they miss it by, and what their fit would be.
 * @param level of the heading, below the one it stands under
 */
export function NearMisses({ result, level }: { result: Result; level: 2 | 3 }) {
  const Heading = `h${level}` as const
  const { match, answers } = result
  const prepared = prepareAnswers(answers)
  const misses = match.nearMisses
    .map((miss) => ({ ...miss, device: deviceOf(result, miss.slug) }))
    .map((miss) => ({ ...miss, fit: scoreDevice(miss.device, prepared).fit }))
    .sort((one, other) => other.fit - one.fit)
  if (misses.length === 0) return null
  return (
    <div className="mt-8 first:mt-0 print:mt-0">
      <Heading className="text-h3">Nearly made it</Heading>
      <ul className="mt-3 grid list-disc gap-2 pl-5 print:mt-1 print:gap-0">
        {misses.slice(0, MOST_MISSES).map(({ device, limit, fit }) => (
          <li key={device.slug}>
            <b>{device.name}</b> {missWords(limit, device, answers.limits)}. Its fit would be {formatNumber(fit)}.
          </li>
        ))}
      </ul>
      {misses.length > MOST_MISSES && (
        <p className="mt-2 text-small text-soft">
          {misses.length - MOST_MISSES === 1
            ? 'One more fails one limit alone and would fit less well.'
            : `${formatNumber(misses.length - MOST_MISSES)} more fail one limit alone and would fit less well.`}
        </p>
      )}
    </div>
  )
}
