import type { Board, BoardKind } from '@/modules/roster';
import type { LocalDate } from '@/modules/units';
import { graphicStateOf, type ShortPlace, shortPlaces } from '../floor-graphic';

/** One skill on one shift of one day. */
export interface DayLine {
  readonly skillName: string;
  readonly names: readonly string[];
  /** People that this shift still needs so that the floor holds. */
  readonly short: number;
}

export interface DayShift {
  readonly kind: BoardKind;
  readonly lines: readonly DayLine[];
  readonly short: number;
}

export interface DayCover {
  readonly shifts: readonly DayShift[];
  /** Shortages at hours that no shift kind fits. */
  readonly others: readonly ShortPlace[];
}

const anybody = 'Anybody';

/** Who is on which shift of a day, by kind and skill, and what each shift still needs. */
export function coverOfDay(board: Board, date: LocalDate): DayCover {
  const isPlanned = graphicStateOf(board.lanes, board.proof !== null) === 'cover';
  const places = isPlanned ? shortPlaces(board).filter((place) => place.date === date) : [];
  const kindNames = new Set(board.kinds.map(({ name }) => name));
  const shifts = board.kinds.flatMap((kind) => {
    const place = places.find(({ shiftName }) => shiftName === kind.name);
    const lines = linesOf(board, date, kind, place);
    const short = lines.reduce((sum, line) => sum + line.short, 0);
    return lines.length > 0 ? [{ kind, lines, short }] : [];
  });
  return { shifts, others: places.filter(({ shiftName }) => !kindNames.has(shiftName)) };
}

function linesOf(
  board: Board,
  date: LocalDate,
  kind: BoardKind,
  place: ShortPlace | undefined,
): DayLine[] {
  const cells = board.cells.filter((cell) => cell.date === date && cell.kindId === kind.id);
  const lines = board.skills.map(({ id, name }) => ({
    skillName: name,
    names: cells
      .filter(({ postSkillId }) => postSkillId === id)
      .flatMap(({ personId }) => board.people.find((person) => person.id === personId)?.name ?? []),
    short: missingOf(place, name),
  }));
  const forAnybody = { skillName: anybody, names: [], short: missingOf(place, null) };
  return [...lines, forAnybody].filter(({ names, short }) => names.length > 0 || short > 0);
}

const missingOf = (place: ShortPlace | undefined, skillName: string | null): number =>
  place?.missing.find((one) => one.skillName === skillName)?.people ?? 0;
