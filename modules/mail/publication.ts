import type { LocalDate, PersonId, RosterId, TeamId, UtcMilliseconds, VersionId } from '../units';

/** A shift as the mail and its calendar file tell it; `OwnShift` of the roster fits. */
export interface MailShift {
  /** The local date on which the shift starts. */
  readonly date: LocalDate;
  readonly kindName: string;
  readonly letter: string;
  readonly tone: 0 | 1 | 2 | 3;
  /** The post. */
  readonly skillName: string;
  readonly startsAtUtc: UtcMilliseconds;
  readonly endsAtUtc: UtcMilliseconds;
  /** Local minutes of the start date; the end may lie beyond 1440. */
  readonly startMinute: number;
  readonly endMinute: number;
  readonly paidMinutes: number;
}

/** One person's part of a published version. */
export interface PersonShifts {
  readonly personId: PersonId;
  readonly personName: string;
  /** E-mail address. One that cannot be used is kept as a failed mail and stops nobody else's. */
  readonly recipient: string;
  readonly shifts: readonly MailShift[];
  /** Shifts that an earlier published version gave and this one does not: dates off now. */
  readonly removedShifts?: readonly MailShift[];
  readonly nights: number;
  readonly weekends: number;
}

/** A version as it is about to be published, with everybody who is told of it. */
export interface Publication {
  readonly teamId: TeamId;
  readonly teamName: string;
  readonly organisationName: string;
  readonly rosterId: RosterId;
  readonly versionId: VersionId;
  /** 1 for the first; the calendar file's SEQUENCE is one less. */
  readonly versionNumber: number;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly zone: string;
  readonly confirmBy: LocalDate;
  readonly publishedAtUtc: UtcMilliseconds;
  readonly publishedByName: string;
  readonly holidays: readonly { readonly date: LocalDate; readonly name: string }[];
  readonly people: readonly PersonShifts[];
}

/** A mail ready for the outbox. */
export interface RenderedMail {
  readonly teamId: TeamId;
  readonly personId: PersonId;
  readonly versionId: VersionId;
  readonly recipient: string;
  readonly subject: string;
  readonly html: string;
  readonly text: string;
  /** RFC 5545 file; null when there is no shift to put in it. */
  readonly calendar: string | null;
}
