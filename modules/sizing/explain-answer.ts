import type { SizingAnswer } from '../problem';
import { formatHours } from '../units';

/** Writes an objective value for people: a number of people, or money. */
type FormatValue = (value: number) => string;

/** Differences below this are rounding of the solver's floating-point numbers. */
const tolerance = 1e-6;

/**
 * Says in words how the linear bound and the whole-number answer belong together, and why the bound
 * cannot simply be rounded up where the two differ. `format` writes people or money.
 */
export function explainBound(
  answer: Pick<SizingAnswer, 'objective' | 'linearBound' | 'provenBound' | 'isProven'>,
  objective: 'people' | 'pay',
  format: FormatValue,
): string {
  const { objective: value, linearBound, provenBound, isProven } = answer;
  if (!isProven) {
    return `The search ended before it was done: ${format(value)} is the best found, and less than ${format(provenBound)} is impossible.`;
  }
  const gap = value - linearBound;
  if (gap <= tolerance * Math.max(1, Math.abs(value))) {
    return 'The bound and the whole-number answer are the same: nothing smaller exists.';
  }
  if (objective === 'people' && gap < 1) {
    return `If people could be split into parts, ${format(linearBound)} would do; ${format(value)} is the next whole number. Rounding up each pattern's part by itself would take more people than that, so the whole-number answer is searched for.`;
  }
  return `If people could be split into parts, ${format(linearBound)} would do. Whole people take ${format(gap)} more: no set of whole people reaches the bound, and rounding parts up adds people that others make needless. The search has ruled out everything below ${format(value)}.`;
}

/** One missing stretch in plain words, e.g. `Mon, Nurse 07:00–15:00: short 2, 16 h missing`. */
export function explainShortage({
  label,
  people,
  minutes,
}: Pick<SizingAnswer['shortages'][number], 'label' | 'people' | 'minutes'>): string {
  return `${label}: short ${people}, ${formatHours(minutes)} h missing`;
}
