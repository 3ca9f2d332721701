import { MethodSection, Prose } from '../parts'

export function UnknownsSection() {
  return (
    <MethodSection id="unknowns" number={8} title="What we do not know">
      <Prose>
        <ul>
          <li>
            The sphere counts the mirror’s part of the light as lightness. A reader would tilt a glossy page away from
            the lamp; our figures cannot tell a glossy page from a matte one.
          </li>
          <li>
            Most devices are known from few units. Another unit, batch or firmware may differ by more than ours did;
            that is what the floor on the spread between units is for.
          </li>
          <li>
            The colour and evenness of a front light are not seen by the sphere, and its least setting is not scored.
          </li>
          <li>
            The threshold model was fitted to people in a laboratory; how it carries to the lowest light and to text on
            electronic paper is an assumption of ours.
          </li>
          <li>The lights of the reading spots are bands. Your lamp may give half or twice as much.</li>
          <li>
            Every constant marked “house” we chose. Another sensible choice could put two near neighbours the other way
            round; that is why every result says what would change it.
          </li>
        </ul>
        <h3 className="pt-4">Cautions</h3>
        <p>
          This is not medical advice: sudden changes in sight, pain or haloes belong to an eye-care professional.
          Comfort, “eye strain” and sleep are not rated. Water-resistance codes describe new devices in fresh water.
          Batteries and chargers are to be used as their makers say. Where you live, consumer law comes before anything
          here.
        </p>
        <p>A change of any of this is a new method with a new number; old results keep theirs.</p>
      </Prose>
    </MethodSection>
  )
}
