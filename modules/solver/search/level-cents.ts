import { levelWeight, type RosterModel } from '../../model';

/** What some values of the levels weigh in the blend, in cents. */
export const levelCents = ({ levels }: RosterModel, values: readonly number[]): number =>
  values.reduce((sum, value, level) => sum + value * levelWeight(levels, level), 0);
