import type { SizingAnswer } from '../problem';
import type { SizingModel } from './sizing-model';

/** Solutions and bounds of the two stages of a sizing. */
export interface SizingFindings {
  /** By column, of stage two. */
  readonly values: ArrayLike<number>;
  /** By row, of the linear relaxation of stage two; null when that was not solved. */
  readonly rowDuals: ArrayLike<number> | null;
  readonly linearBound: number;
  readonly provenBound: number;
  readonly isProven: boolean;
}

/**
 * The answer in whole people and minutes. Missing people are reckoned anew from the people, without the
 * errors of the solver's arithmetic. The price of a floor is the sum of the duals of its slices.
 */
export function readSizing(model: SizingModel, findings: SizingFindings): SizingAnswer {
  const { problem } = model;
  const counts = model.people.map((column) => Math.round(findings.values[column] ?? 0));
  const shortages = findShortages(model, counts);
  const shortageMinutes = shortages.reduce((sum, { minutes }) => sum + minutes, 0);
  return {
    floorsHold: shortageMinutes === 0,
    shortageMinutes,
    shortages,
    people: problem.patterns.flatMap(({ id }, index) => {
      const count = counts[index] ?? 0;
      return count === 0 ? [] : [{ patternId: id, count }];
    }),
    objective: problem.patterns.reduce(
      (sum, { costCents }, index) =>
        sum + (counts[index] ?? 0) * (problem.objective === 'people' ? 1 : costCents),
      0,
    ),
    linearBound: findings.linearBound,
    provenBound: findings.provenBound,
    isProven: findings.isProven,
    floorPrices: problem.floors.map(({ floorId, weekday, label }, index) => ({
      floorId,
      weekday,
      label,
      price: (model.slices[index] ?? []).reduce(
        (sum, { row }) => sum + (findings.rowDuals?.[row] ?? 0),
        0,
      ),
    })),
  };
}

function findShortages(model: SizingModel, counts: readonly number[]): SizingAnswer['shortages'] {
  const cover = coverByRow(model, counts);
  return model.problem.floors.flatMap(({ floorId, weekday, label, people }, index) => {
    const slices = (model.slices[index] ?? []).map(({ row, minutes }) => ({
      missing: Math.max(0, people - (cover[row] ?? 0)),
      minutes,
    }));
    const minutes = slices.reduce((sum, slice) => sum + slice.missing * slice.minutes, 0);
    const most = Math.max(0, ...slices.map(({ missing }) => missing));
    return minutes === 0 ? [] : [{ floorId, weekday, label, people: most, minutes }];
  });
}

/** People on duty in each row, from whole people. */
function coverByRow({ linear, people }: SizingModel, counts: readonly number[]): number[] {
  const countOf = new Map(people.map((column, index) => [column, counts[index] ?? 0]));
  return linear.rowNames.map((_, row) =>
    linear.indices
      .subarray(linear.starts[row], linear.starts[row + 1])
      .reduce((sum, column) => sum + (countOf.get(column) ?? 0), 0),
  );
}
