import { addDays, formatClock, formatDay, type LocalDate } from '../units';
import type { Floor, FloorInput } from './floor';

/** The name of a floor in a sentence: `Vet 07:00–15:00`; without a skill `Anybody 07:00–15:00`. */
export function labelFloor(
  floor: Pick<FloorInput, 'skillId' | 'startMinute' | 'endMinute'>,
  skills: readonly { readonly id: string; readonly name: string }[],
): string {
  const skill = skills.find(({ id }) => id === floor.skillId);
  return `${skill?.name ?? 'Anybody'} ${formatClock(floor.startMinute)}–${formatClock(floor.endMinute)}`;
}

/** The dates of a floor in a sentence: `from Mon 1 Feb to Sun 28 Feb`, or `from Mon 1 Feb on`. */
export function sayDates(floor: Pick<FloorInput, 'effectiveFrom' | 'effectiveTo'>): string {
  const from = `from ${formatDay(floor.effectiveFrom)}`;
  return floor.effectiveTo === null ? `${from} on` : `${from} to ${formatDay(floor.effectiveTo)}`;
}

/**
 * Whether two floors ask for the same thing: skill, window and counting. A wished floor beside a firm
 * one is something else: "two at least, a third if it can be had".
 */
export function isSameCover(one: FloorInput, other: FloorInput): boolean {
  return (
    one.skillId === other.skillId &&
    one.startMinute === other.startMinute &&
    one.endMinute === other.endMinute &&
    one.counting === other.counting &&
    (one.priceCentsPerHour === null) === (other.priceCentsPerHour === null)
  );
}

/** A floor that asks for the same cover on at least one common date, or null. */
export function findDuplicate(floor: FloorInput, others: readonly Floor[]): Floor | null {
  return others.find((other) => isSameCover(floor, other) && sharesDates(floor, other)) ?? null;
}

/**
 * The last day a floor gets when it is continued through `to`, or null when nothing changes. Where the
 * same cover begins anew before `to`, it stops on the day before: the later numbers take over.
 */
export function continuedTo(
  floor: Floor,
  floors: readonly Floor[],
  to: LocalDate,
): LocalDate | null {
  const last = floor.effectiveTo;
  if (last === null) return null;
  const limits = floors
    .filter((other) => isSameCover(floor, other) && other.effectiveFrom > last)
    .map((other) => addDays(other.effectiveFrom, -1));
  const end = [to, ...limits].reduce((least, date) => (date < least ? date : least));
  return end > last ? end : null;
}

function sharesDates(one: FloorInput, other: FloorInput): boolean {
  return (
    (other.effectiveTo === null || one.effectiveFrom <= other.effectiveTo) &&
    (one.effectiveTo === null || other.effectiveFrom <= one.effectiveTo)
  );
}
