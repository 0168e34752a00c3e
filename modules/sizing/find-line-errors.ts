import type { ShiftKind } from '../coverage';
import type { Skill } from '../people';
import { type FieldError, weekdayNames } from '../units';
import type { SizingInput, SizingLine } from './sizing-input';

interface Known {
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
}

/** What in the lines does not fit the team or the span: field, line and what to do about it. */
export function findLineErrors(input: SizingInput, known: Known): FieldError[] {
  return input.lines.flatMap((line, index) => [
    ...findTwinError(line, index, input.lines),
    ...findKindErrors(line, index, known),
    ...(input.span === 'week' ? [] : findDayErrors(line, index, input.span)),
  ]);
}

function findTwinError(
  line: SizingLine,
  index: number,
  lines: readonly SizingLine[],
): FieldError[] {
  const first = lines.findIndex(({ id }) => id === line.id);
  if (first === index) return [];
  const message = `"${line.name}" has the same id as line ${first + 1}. Give each line its own.`;
  return [{ path: `lines.${index}.id`, message }];
}

function findKindErrors(line: SizingLine, index: number, known: Known): FieldError[] {
  const kind = known.kinds.find(({ id }) => id === line.shiftKindId);
  const skill = known.skills.find(({ id }) => id === line.skillId);
  const errors: FieldError[] = [];
  if (!kind) {
    const message = `"${line.name}" names no shift kind this team has in use. Choose one from the list.`;
    errors.push({ path: `lines.${index}.shiftKindId`, message });
  }
  if (line.skillId !== null && !skill) {
    const message = `"${line.name}" names no skill of this team. Choose one from the list.`;
    errors.push({ path: `lines.${index}.skillId`, message });
  }
  if (kind && skill && kind.skillIds && !kind.skillIds.includes(skill.id)) {
    const message = `"${line.name}": nobody is posted as ${skill.name} on ${kind.name}. Choose another skill or shift kind.`;
    errors.push({ path: `lines.${index}.skillId`, message });
  }
  return errors;
}

/** One weekday that repeats takes patterns of one day that may begin on it. */
function findDayErrors(line: SizingLine, index: number, weekday: number): FieldError[] {
  const errors: FieldError[] = [];
  if (line.daysOn !== 1) {
    const message = `"${line.name}" lasts ${line.daysOn} days. For one weekday write 1, or size the whole week.`;
    errors.push({ path: `lines.${index}.daysOn`, message });
  }
  if (!line.startWeekdays.includes(weekday)) {
    const message = `"${line.name}" never begins on ${weekdayNames[weekday]}. Allow that day, or remove the line.`;
    errors.push({ path: `lines.${index}.startWeekdays`, message });
  }
  return errors;
}
