import styles from './gloom.module.css'

/**
 * The dark that falls on a page: a picture of the light, never of the page's measured colour.
 * @param gloom 0 as measured, 1 black
 */
export function Gloom({ gloom }: { gloom: number }) {
  return (
    <span
      aria-hidden="true"
      className={`${styles.gloom} absolute inset-0 transition-opacity duration-200 paper:hidden`}
      // To three decimals: a browser keeps no more, and what the server wrote must be what it reads back.
      style={{ opacity: Number((0.93 * gloom).toFixed(3)) }}
    />
  )
}
