import { SPOTS } from '@/lib/method/spots'
import { OWN_NUMBERS } from '@/lib/quiz/fields'
import { OwnSpotFields } from './own-spot-fields'
import { SpotRow } from './spot-row'
import type { StepProps } from './step-body'

/** Step 2: hours in each of the listed spots, darkest first, and spots of one's own. */
export function SpotsStep({ text, error }: StepProps) {
  const own = OWN_NUMBERS.filter((n) => text(`own${n}`) || text(`own${n}.name`) || text(`own${n}.lux`))
  const blank = OWN_NUMBERS.find((n) => !own.includes(n))
  return (
    <div>
      <div className="border-t border-rule">
        {SPOTS.map((spot) => (
          <SpotRow key={spot.slug} spot={spot} text={text} error={error} />
        ))}
        {own.map((n) => (
          <OwnSpotFields key={n} n={n} text={text} error={error} />
        ))}
      </div>
      {blank && <OwnSpotFields n={blank} text={text} error={error} blank />}
      <p className="mt-4 max-w-[58ch] text-note text-soft">
        Light levels are bands, not measurements: the middle of what is common in such a place. If you know better,
        change the light of a spot, or estimate it from what you can see there or from the lamp.
      </p>
    </div>
  )
}
