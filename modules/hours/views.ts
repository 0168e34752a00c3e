import type { PayRules } from '../rules';
import type { LocalDate, PersonId } from '../units';

/** Planned and worked minutes of one person on one local date, counted where the shift starts. */
export interface HoursDay {
  readonly date: LocalDate;
  readonly shift: string;
  readonly post: string;
  readonly plannedMinutes: number;
  /** null: no worked time recorded (yet). */
  readonly workedMinutes: number | null;
  readonly nightMinutes: number;
  readonly weekendMinutes: number;
  readonly holidayMinutes: number;
  readonly reason: string;
}

export interface HoursPerson {
  readonly personId: PersonId;
  readonly name: string;
  readonly staffNumber: string;
  readonly homeSkill: string;
  readonly contractMinutes: number;
  readonly leaveMinutes: number;
  readonly plannedMinutes: number;
  readonly workedMinutes: number;
  /** Worked less planned, over days with a record. */
  readonly differenceMinutes: number;
  readonly nightMinutes: number;
  readonly weekendMinutes: number;
  readonly holidayMinutes: number;
  readonly days: readonly HoursDay[];
}

export interface PublishedPeriod {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
}

/** What HR sees of a date range: published rosters only. */
export interface HoursView {
  readonly teamName: string;
  readonly from: LocalDate;
  readonly to: LocalDate;
  readonly today: LocalDate;
  /** Published periods that share a day with the range, earliest first. */
  readonly periods: readonly PublishedPeriod[];
  /** Every published period of the team, earliest first. */
  readonly allPeriods: readonly PublishedPeriod[];
  /** What night, weekend and holiday hours are and add. */
  readonly payRules: PayRules;
  readonly people: readonly HoursPerson[];
}
