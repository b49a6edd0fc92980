/**
 * How often a cause shows a symptom or gives a finding, in words with one
 * number each. The anchors lie inside the bands of published word scales
 * (ICD-203; Rohrmann's frequency words, 2000); a tree may write a number in
 * place of a word where it has one.
 */
export const STRENGTHS = {
  always: 0.98,
  "nearly always": 0.93,
  usually: 0.8,
  often: 0.66,
  sometimes: 0.33,
  seldom: 0.12,
  "hardly ever": 0.05,
  never: 0.01,
} as const;

export type StrengthWord = keyof typeof STRENGTHS;

/** Relative weight of a cause among the engines it applies to: half-decade steps that people can tell apart. */
export const BASE_RATES = { common: 10, occasional: 3, rare: 1 } as const;

export type BaseRate = keyof typeof BASE_RATES;
