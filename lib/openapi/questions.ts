/** Questions for `POST /api/v1/match` that work. */
export const QUESTIONS = {
  defaults: { summary: 'Nothing answered: every default, each named in the answer', value: {} },
  bed: {
    summary: 'Novels in bed by a small lamp, for at most £300, between 6 and 8 inches',
    value: {
      edition: 'latest',
      spots: [{ lux: 80, hours: 7, frontLight: true }],
      lightNeed: 'usual',
      text: 'normal',
      preferredWhite: 'neutral',
      aims: [['clarity'], ['whiteness', 'tint'], ['handling']],
      reads: { novels: 3, articles: 1 },
      hold: 'two-hands',
      limits: { budget: 30_000, currency: 'GBP', minDiagonal: 6, maxDiagonal: 8 },
    },
  },
}
