import type { RosterModel, WorkColumn } from '../../model';

/**
 * One column for each shift and post to fill: those that serve more missing minutes of firm floors than any
 * other that serves the same floor.
 */
export function openShifts(
  model: RosterModel,
  values: Float64Array,
  inWindow: readonly WorkColumn[],
): WorkColumn[] {
  const lacking = lackingRows(model, values);
  const offered = new Set(inWindow);
  const gains = new Map<string, { readonly work: WorkColumn; minutes: number }>();
  for (const { covering, startMinute, endMinute } of lacking) {
    const kinds = new Map(
      covering.filter((work) => offered.has(work)).map((one) => [keyOf(one), one]),
    );
    for (const [key, work] of kinds) {
      const gain = gains.get(key) ?? { work, minutes: 0 };
      gain.minutes += endMinute - startMinute;
      gains.set(key, gain);
    }
  }
  const best = lacking.map(({ covering }) =>
    Math.max(0, ...covering.map((work) => gains.get(keyOf(work))?.minutes ?? 0)),
  );
  return [...gains].flatMap(([key, { work, minutes }]) => {
    const isBest = lacking.some(
      ({ covering }, row) => minutes === best[row] && covering.some((one) => keyOf(one) === key),
    );
    return isBest ? [work] : [];
  });
}

/** Equal for columns of the same shift and post. */
export const keyOf = ({ shift, postSkillId }: WorkColumn): string =>
  `${shift.index} ${postSkillId}`;

/** Whether a column still serves a floor that lacks people. */
export const isOpen = (model: RosterModel, values: Float64Array, open: WorkColumn): boolean =>
  lackingRows(model, values).some(({ covering }) => covering.includes(open));

const lackingRows = ({ floors }: RosterModel, values: Float64Array) =>
  floors.filter(
    ({ covering, people, shorts }) =>
      shorts.some(({ priority }) => priority !== null) &&
      covering.filter(({ column }) => values[column] === 1).length < people,
  );
