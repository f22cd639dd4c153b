import { scaleThreshold } from 'd3-scale';
import { schemeBrBG } from 'd3-scale-chromatic';

/** ColorBrewer's BrBG in eight classes: three browns under target, three teals over; safe for the common kinds of colour blindness. */
const colours = [0, 1, 2, 4, 5, 6].map((index) => schemeBrBG[8][index]);

/** Dose ÷ target: where one step ends and the next begins. */
export const doseBreaks = [0.25, 0.5, 1, 2, 4] as const;

export interface DoseStep {
  readonly label: string;
  readonly colour: string;
  /** Under target: drawn hatched too. */
  readonly under: boolean;
}

export const doseSteps: readonly DoseStep[] = [
  { label: '< ¼×', colour: colours[0], under: true },
  { label: '¼–½×', colour: colours[1], under: true },
  { label: '½–1×', colour: colours[2], under: true },
  { label: '1–2×', colour: colours[3], under: false },
  { label: '2–4×', colour: colours[4], under: false },
  { label: '> 4×', colour: colours[5], under: false },
];

/** The step a dose ratio falls in; a ratio of exactly 1 is met. */
export const doseStepOf = scaleThreshold<number, DoseStep>()
  .domain([...doseBreaks])
  .range([...doseSteps]);

/** 2.31 → `2.31×`; nothing at all → `none`; 0.002 → `< 0.01×`. */
export function formatRatio(ratio: number): string {
  if (ratio === 0) return 'none';
  if (ratio < 0.01) return '< 0.01×';
  // Never round a miss up to a hit.
  if (ratio < 1 && ratio >= 0.995) return '0.99×';
  return ratio < 10 ? `${ratio.toFixed(2)}×` : `${Math.round(ratio)}×`;
}
