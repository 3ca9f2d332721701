import { CONTACT } from './contact'
import { Section } from './section'

export function Accessibility() {
  return (
    <Section id="accessibility" title="Accessibility">
      <p>
        We aim at WCAG 2.2, level AA. Every page works by keyboard and without JavaScript; every chart has its figures
        as a table and its points within reach of the arrow keys; nothing is said by colour alone.
      </p>
      <p>
        The paper theme at the foot of each page is for electronic-paper devices and for whoever likes thick black
        lines: no motion, no pale grey, patterns for colours, and numbered pages for long lists. The night theme is for
        a dark room. Pages are checked in all three themes by a program, which finds only part of what a person would;
        please write to <a href={`mailto:${CONTACT.corrections}`}>{CONTACT.corrections}</a> about the rest.
      </p>
    </Section>
  )
}
