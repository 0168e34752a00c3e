import { buildRosterModel, placeRoster } from '../../model';
import { type PlannedRoster, type Problem, type Requirement, requirementKey } from '../../problem';

/**
 * The members of a knot that are worth trying when there are too many: one of each kind in turn, floors at
 * which the roster is short before others.
 */
export function chooseMembers(
  problem: Problem,
  roster: PlannedRoster,
  members: readonly Requirement[],
  most: number,
): readonly Requirement[] {
  if (members.length <= most) return members;
  const short = shortFloors(problem, roster);
  const isShort = (member: Requirement): boolean => short.has(requirementKey(member));
  const ordered = [...members.filter(isShort), ...members.filter((member) => !isShort(member))];
  const kinds = [...new Set(ordered.map(({ kind }) => kind))].map((kind) =>
    ordered.filter((member) => member.kind === kind),
  );
  const longest = Math.max(...kinds.map(({ length }) => length));
  const turns = Array.from({ length: longest }, (_, turn) =>
    kinds.flatMap((ofKind) => ofKind[turn] ?? []),
  );
  return turns.flat().slice(0, most);
}

/** Keys of the firm floors that lack people in a roster. */
function shortFloors(problem: Problem, roster: PlannedRoster): Set<string> {
  const model = buildRosterModel(problem);
  const values = placeRoster(model, roster);
  const lacking = model.floors.filter(
    ({ covering, people }) => covering.filter(({ column }) => values[column] === 1).length < people,
  );
  return new Set(
    lacking.flatMap(({ floors }) =>
      floors.map(({ floorId, dayIndex }) => requirementKey({ kind: 'floor', floorId, dayIndex })),
    ),
  );
}
