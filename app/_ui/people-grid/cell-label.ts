import type { Board, BoardCell } from '@/modules/roster';
import { longDay, spokenClockRange } from '../clock';
import type { GridDay, PersonRow } from './board-rows';

/** Names of a board's kinds and skills, for labels. */
export type BoardWords = Pick<Board, 'kinds' | 'skills'>;

/** What a grid cell is called in full: `Friday 12 February, Early 7 to 15, nurse`. */
export function cellLabel(words: BoardWords, row: PersonRow, day: GridDay): string {
  const cell = row.cells.get(day.date);
  const parts = [longDay(day.date)];
  if (day.holidayName) parts.push(day.holidayName);
  if (day.dayIndex < 0) parts.push('before this period');
  if (cell) parts.push(shiftLabel(words, cell));
  if (isOnLeave(row, day)) parts.push('on leave');
  else if (!cell) parts.push('off');
  if (cell && cell.postSkillId !== row.person.skillIds[0]) parts.push('in a second skill');
  if (cell?.isPinned) parts.push('pinned');
  for (const sentence of row.breaches.get(day.date) ?? []) parts.push(`rule problem: ${sentence}`);
  return parts.join(', ');
}

/** `Early 7 to 15, nurse`. */
export function shiftLabel({ kinds, skills }: BoardWords, cell: BoardCell): string {
  const kind = kinds.find(({ id }) => id === cell.kindId);
  const post = skills.find(({ id }) => id === cell.postSkillId)?.name ?? '';
  if (!kind) return post;
  const time = spokenClockRange(kind.startMinute, kind.endMinute);
  return `${kind.name} ${time}, ${post.toLocaleLowerCase('en-GB')}`;
}

/** Whether the person is on leave on that day. */
export const isOnLeave = ({ person }: Pick<PersonRow, 'person'>, { date }: Pick<GridDay, 'date'>) =>
  person.leave.some(({ startsOn, endsOn }) => startsOn <= date && date <= endsOn);
