/**
 * The colours of the pictures: the day theme's roles (app/styles/tokens.css), since a drawing knows no style sheet and
 * a picture is seen on grounds we do not choose. Text stands on `bench` alone; the booth carries nothing but sheets.
 */
export const PICTURE = {
  bench: '#f4f6f5',
  ink: '#14211c',
  soft: '#4a5a53',
  shade: '#0d5a43',
  brass: '#85590c',
  booth: '#7d7d7d',
} as const

/** The roles text is written in, each on `bench`. */
export const TEXT_ROLES = ['ink', 'soft', 'shade'] as const
