import { Section } from './section'

export function Money() {
  return (
    <Section id="money" title="Who pays">
      <ul>
        <li>The team does, out of its members’ subscriptions. Nobody who makes or sells a device is a member.</li>
        <li>
          No link on this site earns us anything. There are no affiliate links, no advertisements and no sponsored
          places; a price names no shop to buy from.
        </li>
        <li>No maker pays to be measured, to be measured sooner, or to be left out.</li>
        <li>The figures, the documents and the API are free to read and to use.</li>
      </ul>
    </Section>
  )
}

export function Conflicts() {
  return (
    <Section id="conflicts" title="Conflicts">
      <ul>
        <li>Nobody on the team works for, advises or holds shares in a maker of devices or of their displays.</li>
        <li>Whoever has worked for one in the five years before neither reads its devices nor writes about them.</li>
        <li>A maker sees figures of its device when everybody does. There is no preview.</li>
        <li>We take no gifts from makers; what arrives unasked goes back.</li>
      </ul>
    </Section>
  )
}
