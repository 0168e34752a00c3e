import { type CoverStep, coverSteps } from '@/app/_ui/floor-graphic/cover-steps';
import { type Floor, isInForce } from '@/modules/coverage';
import { coverLanes } from '@/modules/roster';
import { addDays, formatClock, type LocalDate, type SkillId, weekdayOf } from '@/modules/units';
import { columnNames } from './floor-rows';

const minutesPerDay = 1440;
const minutesPerWeek = 7 * minutesPerDay;
const flat = { startMinute: 0, endMinute: minutesPerWeek, need: 0, hold: 0, short: 0, spare: 0 };

/** A stretch of one day column with the people needed, for the table. */
export interface WeekLine {
  readonly days: string;
  readonly times: string;
  readonly people: number;
}

/**
 * People needed over a normal week without holidays: all floors together, minute 0 being the start of
 * Monday's column. What runs past the last column comes in again at the first. Each weekday is taken as
 * on its first date from `from` on, so that a floor which ends or begins later counts or not by that date.
 */
export function normalWeek(
  floors: readonly Floor[],
  skillIds: readonly SkillId[],
  dayStartsAtMinute: number,
  from: LocalDate,
): CoverStep[] {
  const windows = floors.flatMap((floor) =>
    floor.needs.slice(0, 7).flatMap((people, day) => {
      const date = addDays(from, (day - weekdayOf(from) + 7) % 7);
      if (people === 0 || !isInForce(floor, date)) return [];
      const start = day * minutesPerDay + floor.startMinute - dayStartsAtMinute;
      return aroundTheWeek(start, floor.endMinute - floor.startMinute).map((window) => ({
        ...window,
        floorId: floor.id,
        dayIndex: day,
        skillId: floor.skillId,
        people,
        counting: floor.counting,
        priceCentsPerHour: floor.priceCentsPerHour,
      }));
    }),
  );
  const lanes = coverLanes(windows, [], skillIds, minutesPerWeek);
  if (lanes.length === 0) return [flat];
  // Drawn as held: the picture shows what is asked for, not who is there.
  return coverSteps(
    lanes.map((lane) => ({
      ...lane,
      slots: lane.slots.map((slot) => ({ ...slot, have: slot.need })),
    })),
  );
}

/** `Monday to Friday 4 to 8, Saturday and Sunday 4 to 6`: least and most people of each day column. */
export function weekInWords(steps: readonly CoverStep[]): string {
  return joinDays((day) => {
    const needs = inColumn(steps, day).map(({ need }) => need);
    const [least, most] = [Math.min(...needs), Math.max(...needs)];
    return least === most ? `${most}` : `${least} to ${most}`;
  })
    .map(({ days, value }) => `${days} ${value}`)
    .join(', ');
}

/** The same week as lines of a table; days that are alike share their lines. */
export function weekLines(steps: readonly CoverStep[], dayStartsAtMinute: number): WeekLine[] {
  const linesOf = (day: number) =>
    inColumn(steps, day).map(({ start, end, need }) => ({
      times: `${formatClock(dayStartsAtMinute + start)}–${formatClock(dayStartsAtMinute + end)}`,
      people: need,
    }));
  return joinDays((day) => JSON.stringify(linesOf(day))).flatMap(({ days, first }) =>
    linesOf(first).map((line) => ({ days, ...line })),
  );
}

/** A window that may begin before Monday's column or end after Sunday's, as pieces inside the week. */
function aroundTheWeek(start: number, length: number) {
  const first = (start + minutesPerWeek) % minutesPerWeek;
  const end = first + length;
  const pieces = [{ startMinute: first, endMinute: Math.min(end, minutesPerWeek) }];
  if (end > minutesPerWeek) pieces.push({ startMinute: 0, endMinute: end - minutesPerWeek });
  return pieces;
}

function inColumn(steps: readonly CoverStep[], day: number) {
  const origin = day * minutesPerDay;
  return steps
    .filter((step) => step.startMinute < origin + minutesPerDay && step.endMinute > origin)
    .map(({ startMinute, endMinute, need }) => ({
      start: Math.max(0, startMinute - origin),
      end: Math.min(minutesPerDay, endMinute - origin),
      need,
    }));
}

/** Neighbouring days with the same value, named together. */
function joinDays(valueAt: (day: number) => string) {
  const groups: { first: number; last: number; value: string }[] = [];
  for (let day = 0; day < 7; day += 1) {
    const value = valueAt(day);
    const group = groups.at(-1);
    if (group?.value === value) group.last = day;
    else groups.push({ first: day, last: day, value });
  }
  return groups.map((group) => ({ ...group, days: nameDays(group.first, group.last) }));
}

function nameDays(first: number, last: number): string {
  if (first === last) return columnNames[first] ?? '';
  return `${columnNames[first]} ${last === first + 1 ? 'and' : 'to'} ${columnNames[last]}`;
}
