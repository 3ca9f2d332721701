/** What the editor says to a typical reader, and what to keep in mind there. No device is named: picks are computed. */
export type ReaderWords = { paragraphs: readonly string[]; cautions: readonly string[] }

const FRONT_LIGHT =
  'A front light mixes its own colour into the page, which our instrument does not see; whiteness and tint are those of the page with the light off.'
const BANDS = 'The light we assume is a band, not a measurement: a lamp may easily give half of it or twice as much.'

const WORDS: Readonly<Record<string, ReaderWords>> = {
  'dim-bedroom': {
    paragraphs: [
      'One dim lamp across a bedroom leaves about five lux on the page, a fiftieth of what a reading lamp over the shoulder gives. Dark ink stays as dark against its page as ever, but the eye sees less of the difference, so a lighter page and a blacker ink are worth more here than at a desk.',
      'Weigh two things. A front light makes up for the lamp, and then the pages draw close together; if you would rather do without one, add “front light: must not” in the quiz and watch the order change. And small type asks for more contrast than large type does: try your usual size before you decide that the page is at fault.',
    ],
    cautions: [FRONT_LIGHT, BANDS],
  },
  'shared-bed': {
    paragraphs: [
      'With the lights off there is nothing for a page to give back. Whatever you see comes from the front light, so a device without one cannot be read at all, and one whose light is lit gives every page much the same brightness. What is left to choose by is how it lies in one hand, and the colour of what it shines.',
      'For the person beside you the lowest setting matters more than the highest. We measure and publish it, in cd/m² on a white page, on each device’s own page; the fit does not score it, because how dim is dim enough is not for us to say. Look it up for the devices at the top of this list.',
    ],
    cautions: [
      FRONT_LIGHT,
      'We do not rate sleep. Whether a light in the evening suits you is between you, the person beside you and, if it troubles you, a professional.',
    ],
  },
  'train-and-cafe': {
    paragraphs: [
      'A carriage by day gives a page some 200 lux, a café in the evening a quarter of that, and on the move the hand decides before the eye does: a device that is held in one hand for half an hour should weigh little, and one that is to go into a coat pocket should be small. That is why size and weight stand first in these answers, and why there is a limit on both.',
      'Buttons to turn the page are worth trying if you hold a rail with the other hand. They are not in these answers; it takes one click in the quiz to make them a must.',
    ],
    cautions: [
      BANDS,
      'A lamp behind your head shows as a bright spot on a glossy page. The sphere counts that spot as lightness and cannot tell glossy from matte, so try the device under a lamp if you can.',
    ],
  },
  'office-papers': {
    paragraphs: [
      'A report laid out for a sheet of paper wants a page near the size of that sheet: on less one reads by pushing a window about. A desk by day gives most pages light enough, and what is left is how the page looks beside the paper it stands in for. So whiteness and size share the first place here.',
      'Be wary of the whiteness figure on its own. It rises with blueness faster than with lightness, and every page here lies outside the limits the formula is vouched for. Our score gives nothing for a page bluer than the white you asked for; the figure in the table is there because people look for it.',
    ],
    cautions: [
      'Which file formats a device opens, and how well it reflows or crops them, is not in the fit. Check it against your own files.',
      BANDS,
    ],
  },
  'colour-comics': {
    paragraphs: [
      'Colour on these pages comes from a filter over a grey one, and the filter keeps back much of the light: a colour page is a darker page. That is why the fits below stand lower than those of other readers. Each is scored between the same two reference pages as everybody’s, with nothing taken off for being in colour and nothing added.',
      'So ask first whether it must be colour. If black and white will do for most of what you read, take the limit away and see what the darker page costs you. If it must, light is the best help: by a window the difference shrinks, in a dim room the front light has to make it up.',
    ],
    cautions: [
      'The figures are of the white and the black of the page. How rich or true the colours in between are, we do not measure.',
      FRONT_LIGHT,
    ],
  },
  'margin-notes': {
    paragraphs: [
      'Whoever writes on a page wants room at its edge, so size comes first, and then a page pale enough that a thin grey line stands out. The pen itself is a must in these answers; devices whose maker does not say whether they take one stay in the list, with a note.',
      'What a pen feels like, how soon the line follows it, and how notes get out of the device again: none of that is in the fit, and for you it may outweigh all that is. Choose among the first few here by trying them. The budget in these answers is a plain guess; near misses are named below with what they cost more.',
    ],
    cautions: [
      'Prices are as we saw them on the day noted on each device’s page. Some pens are sold apart.',
      'Pen, texture and delay are not measured here.',
    ],
  },
  'balcony-and-garden': {
    paragraphs: [
      'In the open there is more light than the eye needs for ordinary type, and lightness nearly stops counting: see in the table how few points being clear in your light is worth. Daylight shows something else instead. A tint that a bedside lamp hides is plain to see beside a sheet of paper in the shade.',
      'The garden brings water, so these answers ask for a device rated to be dropped into it. Devices for which nobody states a rating stay in the list with a note; none is known to fail. A matte surface matters more than any figure here when the sun is behind you, and we cannot measure it yet.',
    ],
    cautions: [
      'Water codes describe new devices in still, fresh water. They promise nothing about soap, salt, chlorine or age.',
      'Keep batteries out of the full sun and charge them as the maker says.',
    ],
  },
  'more-light': {
    paragraphs: [
      'Some eyes want two or three times the light that others read by. We ask that and nothing more: no age and no diagnosis. In the computation it raises the contrast the eye needs, so that light pages with dark ink pull ahead; large type gives some of it back, and so does a lamp moved nearer to the page: at half the distance it gives about four times the light.',
      'If you can, try a unit with your own type size and your own lamp before you buy. How bold the letters can be made, whether it reads aloud and whether its menus grow with the type are not in the fit; reading aloud can be made a must in the quiz.',
    ],
    cautions: [
      'This is not medical advice. Sudden changes in sight, pain or haloes belong to an eye-care professional.',
      'The model of contrast was fitted to people in a laboratory. Readers with low vision may differ from it by a great deal.',
    ],
  },
}

/** @throws Error for a reader without words: each needs its own. */
export function wordsFor(slug: string): ReaderWords {
  const words = WORDS[slug]
  if (!words) throw new Error(`There are no words for the reader ${slug}`)
  return words
}
