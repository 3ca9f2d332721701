import Link from 'next/link'
import { Section } from './section'

const CAUTIONS = [
  'This is not medical advice. Sudden changes in sight, pain or haloes belong to an eye-care professional.',
  'Comfort, “eye strain” and sleep are not rated. We know of no figure that would.',
  'Light levels are bands, not measurements. Your lamp may give half or twice as much.',
  'Colours are approximate on your display; the figure beside a drawn page is the measurement, the drawing is not.',
  'Water-resistance codes describe new devices in fresh water, not soap, salt, chlorine or age.',
  'Batteries and chargers are to be used as their makers say.',
  'Where you live, consumer law comes before anything here: what you may return, and what a seller owes you.',
]

export function Cautions() {
  return (
    <Section id="keep-in-mind" title="What our figures cannot say">
      <ul>
        {CAUTIONS.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
      <p>
        What we do not know is listed at the{' '}
        <Link href="/method#unknowns" prefetch={false}>
          end of the method
        </Link>
        .
      </p>
    </Section>
  )
}
