import type { Board, BoardCell, BoardPerson, CoverLane } from '@/modules/roster';
import { addDays, type LocalDate, weekdayOf } from '@/modules/units';

/** Days before the period that are drawn pale, so that rest and runs across the border can be judged. */
export const daysBefore = 3;

/** A column of the grid. `dayIndex` counts from the first day of the period, so days before are negative. */
export interface GridDay {
  readonly date: LocalDate;
  readonly dayIndex: number;
  readonly isWeekend: boolean;
  readonly holidayName: string | null;
  readonly isToday: boolean;
}

export interface PersonRow {
  /** Position among all people of the grid. */
  readonly index: number;
  readonly person: BoardPerson;
  readonly cells: ReadonlyMap<LocalDate, BoardCell>;
  /** Sentences on broken rules by date. */
  readonly breaches: ReadonlyMap<LocalDate, readonly string[]>;
}

/** People who share a home skill, with the cover of that skill and who comes from other groups. */
export interface BoardGroup {
  readonly skillId: CoverLane['skillId'];
  readonly name: string;
  readonly lane: CoverLane | null;
  readonly rows: readonly PersonRow[];
  /** Shifts in this skill of people who stand in another group. */
  readonly visits: readonly BoardCell[];
}

/** The columns of the grid: the days before the period, then its own. */
export function gridDays(board: Board): GridDay[] {
  const before = Array.from({ length: daysBefore }, (_, index) => index - daysBefore).map(
    (dayIndex) => {
      const date = addDays(board.startsOn, dayIndex);
      return { date, dayIndex, isWeekend: weekdayOf(date) >= 5, holidayName: null };
    },
  );
  const period = board.days.map(({ date, isWeekend, holidayName }, dayIndex) => ({
    date,
    dayIndex,
    isWeekend,
    holidayName,
  }));
  return [...before, ...period].map((day) => ({ ...day, isToday: day.date === board.today }));
}

/**
 * Groups people by home skill in the order of the team's skills. A lane for anybody stands first with no
 * people; people without a known skill stand last.
 */
export function groupBoard(board: Board): BoardGroup[] {
  const laneOf = (skillId: CoverLane['skillId']) =>
    board.lanes.find((lane) => lane.skillId === skillId) ?? null;
  const anybody = laneOf(null);
  const known = new Set(board.skills.map(({ id }) => id));
  const homeOf = new Map(board.people.map(({ id, skillIds }) => [id, skillIds[0] ?? null]));
  const rowOf = rowMaker(board);
  const groups: BoardGroup[] = anybody
    ? [{ skillId: null, name: 'Anybody', lane: anybody, rows: [], visits: [] }]
    : [];
  for (const { id, name } of board.skills) {
    const rows = board.people.filter((person) => person.skillIds[0] === id).map(rowOf);
    const visits = board.cells.filter(
      (cell) => cell.postSkillId === id && homeOf.get(cell.personId) !== id,
    );
    const lane = laneOf(id);
    if (rows.length > 0 || visits.length > 0 || lane) {
      groups.push({ skillId: id, name, lane, rows, visits });
    }
  }
  const others = board.people.filter(({ skillIds }) => !skillIds[0] || !known.has(skillIds[0]));
  if (others.length > 0) {
    groups.push({
      skillId: null,
      name: 'Without a skill',
      lane: null,
      rows: others.map(rowOf),
      visits: [],
    });
  }
  return groups;
}

/** Names of the people who visit a group, each once, by name. */
export function visitorNames(board: Board, visits: readonly BoardCell[]): string[] {
  const ids = new Set(visits.map(({ personId }) => personId));
  return board.people
    .filter(({ id }) => ids.has(id))
    .map(({ name }) => name)
    .sort();
}

function rowMaker(board: Board): (person: BoardPerson) => PersonRow {
  const cells = groupBy([...board.cellsBefore, ...board.cells], ({ personId }) => personId);
  const breaches = groupBy(board.proof?.breaches ?? [], ({ personId }) => personId);
  let index = 0;
  return (person) => {
    const own = groupBy(breaches.get(person.id) ?? [], ({ date }) => date);
    const row = {
      index,
      person,
      cells: new Map((cells.get(person.id) ?? []).map((cell) => [cell.date, cell])),
      breaches: new Map(
        [...own].map(([date, found]) => [date, found.map(({ sentence }) => sentence)]),
      ),
    };
    index += 1;
    return row;
  };
}

/** Map.groupBy, which Node 20 does not have. */
function groupBy<T>(values: readonly T[], keyOf: (value: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const value of values) {
    const key = keyOf(value);
    const group = groups.get(key);
    if (group) group.push(value);
    else groups.set(key, [value]);
  }
  return groups;
}
