import { formatNumber, formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { MODEL_RANGE, READING_ANCHORS } from '@/lib/vision/contrast-reserve'
import { MethodSection, Prose } from '../parts'

const { unitFloor, modelsForUnitSpread } = METHOD.figures

export function UnknownsSection({ number }: { number: number }) {
  return (
    <MethodSection id="unknowns" number={number} title="What we do not know">
      <Prose>
        <h3 className="pt-2">About the page</h3>
        <ul>
          <li>
            <strong>How people see it.</strong> The sphere lights a page from everywhere and counts the mirror’s part of
            the light as lightness. People have a lamp in one place and tilt a glossy page away from it; our figures
            cannot tell a glossy page from a matte one.
          </li>
          <li>
            <strong>Other units.</strong> Most devices are known from few. Another unit or batch may differ by more than
            ours did; while fewer than {n(modelsForUnitSpread.value)} models have two units or more, the floor of{' '}
            {n(unitFloor.value.L)} L* on the spread between units is a guess of ours.
          </li>
          <li>
            <strong>Age.</strong> We measure units when they are new. Whether pages yellow or darken with years, sun or
            use we have not followed.
          </li>
          <li>
            <strong>Warmth.</strong> Every session is near the warmth of a room, and its temperature is written down. We
            have no figures for a cold balcony or a hot car, where electronic paper changes more slowly and may settle
            at another grey.
          </li>
          <li>
            <strong>Ghosting.</strong> We read a full white after a full refresh. After many quick page turns a page is
            a little darker and carries traces of what stood there; we do not measure by how much.
          </li>
          <li>
            <strong>How text is drawn.</strong> Ink is read as a full black area. Thin strokes, grey edges, fonts and
            bold settings decide how dark a letter really is; resolution stands for them in handling and nothing else
            does.
          </li>
          <li>
            <strong>Brighteners.</strong> Where a page glows under ultraviolet light, its whiteness depends on how much
            of it the lamp sends. The instruments read with ultraviolet included; your lamp may send none, or window
            light more. We have not seen a page that glows, and have not looked for it with a lamp made for that.
          </li>
        </ul>
        <h3 className="pt-2">About the bench</h3>
        <ul>
          <li>
            <strong>One bench.</strong> Nobody else has measured the same units. What all our readings share, the
            certificates put at a size; a mistake that all of them share would not show in any of our charts.
          </li>
          <li>
            <strong>Few instruments.</strong> The readings of each device come from one or two of them, and how two
            instruments differ is counted within the session’s part, not by itself.
          </li>
          <li>
            <strong>Independent channels.</strong> Doubts of W₁₀ and T₁₀ take errors of L*, a* and b* as independent.
            They are not quite; we have too few readings to say how far.
          </li>
        </ul>
        <h3 className="pt-2">About the light</h3>
        <ul>
          <li>
            <strong>Front lights.</strong> Their colour, their evenness and how they change with dimming are not seen by
            the sphere. A front light counts as the white of the page; the least setting is shown and not scored.
          </li>
          <li>The lights of the reading spots are bands. Your lamp may give half or twice as much.</li>
          <li>
            <strong>Your display.</strong> The sheets drawn here are right only on a display that is set as the web’s
            colours assume. On most they are near, on some far off; the figures do not depend on it.
          </li>
        </ul>
        <h3 className="pt-2">About the eye</h3>
        <ul>
          <li>
            <strong>The model’s reach.</strong> The threshold model was fitted to people in a laboratory, from{' '}
            {n(MODEL_RANGE.lowestAge)} to {n(MODEL_RANGE.highestAge)} years as we recall. We use it from{' '}
            {n(MODEL_RANGE.lowestLuminance)} to {formatNumber(MODEL_RANGE.highestLuminance)} cd/m² without having seen
            its authors’ own range; how it carries to the lowest light and to text on electronic paper is an assumption.
          </li>
          <li>
            <strong>The anchors.</strong> {n(READING_ANCHORS.spot)}, {n(READING_ANCHORS.fluent)} and{' '}
            {n(READING_ANCHORS.best)} times are for letters and from memory; people differ by more than devices do.
          </li>
          <li>
            <strong>Whiteness.</strong> No formula we know of was made for pages this dark. Which of two greys people
            call whiter we have not asked them.
          </li>
        </ul>
        <h3 className="pt-2">About the ranking</h3>
        <ul>
          <li>
            Every constant marked “house” we chose. Another sensible choice could put two near neighbours the other way
            round; that is why every result says what would change it.
          </li>
          <li>
            Specs come partly from the makers and partly from our own scales, shops and trials, each with its source and
            date. A maker’s claim that we have not tried stays a claim, and what is not stated stays not stated.
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
