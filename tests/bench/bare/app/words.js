const WORDS =
  'a about after again all always among an and another as at back because been before behind bench better between book both bright but by came chair clear close cold day desk door down each edge evening every far few first floor for from garden glass good green grey had hall hand harbour have he her here high him his home hour house how in ink into it its kettle lamp late leaf leave left less letter light like line little long look made many margin measure morning most move much name near new next night no north not of off old on once one only open or other our out over own page paper past place plain point quiet rain read right river room round sea second see shade sheet short side sit slow small so some stand still stone such table tell than that the their then there they thin this three through time to town tram turn two under up very wait walk wall warm was water way we well were west what when where which while white who wide window winter with wood word work year'.split(
    ' ',
  )

/** The same text for the same number of words, without a pattern a compressor could fold up. */
export function text(count) {
  let seed = 20261201
  const words = []
  for (let i = 0; i < count; i++) {
    seed = (Math.imul(seed, 1664525) + 1013904223) >>> 0
    words.push(WORDS[Math.floor((seed / 2 ** 32) * WORDS.length)])
  }
  return words.join(' ')
}
