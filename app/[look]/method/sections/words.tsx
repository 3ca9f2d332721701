import { HOUSE_WORDS } from '../house-words'
import { MethodSection, Prose } from '../parts'
import { WordsTable } from '../words-table'

export function WordsSection({ number }: { number: number }) {
  return (
    <MethodSection id="words" number={number} title="Words that stand for numbers">
      <Prose>
        <p>
          Where a page says something in words, a number decides which. These are the numbers, read from the constants
          the code decides by. Most are house: another sensible choice would move a device from one word to the next,
          never its figure.
        </p>
      </Prose>
      <WordsTable caption="Words and the numbers they hold for" rows={HOUSE_WORDS} />
    </MethodSection>
  )
}
