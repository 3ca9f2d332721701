import type { Lab } from '@/lib/method/types'

/** What one picture says: at most one number, and one to three sheets beside the control paper. Plain text throughout. */
export type Picture = {
  title: string
  line: string
  /** The number large, with its unit or doubt, and what it is. */
  figure: { value: string; doubt: string; label: string }
  sheets: readonly { page: Lab; ink: Lab }[]
  paper: Lab
  foot: string
}

/** Pixels; what those who show such pictures ask for. */
export const WIDTH = 1200
export const HEIGHT = 630
