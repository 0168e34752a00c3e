import type { PlannedRoster } from '../problem';
import type { Proof } from '../proof';
import type {
  LocalDate,
  PersonId,
  RosterId,
  RunId,
  ShiftKindId,
  SkillId,
  TeamId,
  UserId,
  VersionId,
} from '../units';
import type { RunState } from './views';

/** The plan of one team for one period. */
export interface Roster {
  readonly id: RosterId;
  readonly teamId: TeamId;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly closedAtUtc: number | null;
}

/** One numbered version of a roster; a draft while `publishedAtUtc` is null. */
export interface Version {
  readonly id: VersionId;
  readonly rosterId: RosterId;
  readonly number: number;
  readonly publishedAtUtc: number | null;
  readonly publishedByName: string | null;
  readonly confirmBy: LocalDate | null;
  readonly runId: RunId | null;
  readonly proof: Proof | null;
}

/** One person on one shift, as it is kept: instants and paid minutes never change with the kind. */
export interface KeptShift {
  readonly id: string;
  readonly personId: PersonId;
  readonly date: LocalDate;
  readonly shiftKindId: ShiftKindId;
  readonly skillId: SkillId;
  readonly startsAtUtc: number;
  readonly endsAtUtc: number;
  readonly paidMinutes: number;
  readonly isPinned: boolean;
}

/** A kept shift with the version it belongs to. */
export interface VersionShift extends KeptShift {
  readonly versionId: VersionId;
  readonly isPublished: boolean;
}

/** A run without its large documents: the problem, the roster and the knots. */
export interface Run {
  readonly id: RunId;
  readonly rosterId: RosterId;
  readonly teamId: TeamId;
  readonly number: number;
  readonly state: RunState;
  readonly limitSeconds: number;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly startedAtUtc: number;
  readonly endedAtUtc: number | null;
  readonly startedBy: UserId;
  readonly startedByName: string;
  readonly proof: Proof | null;
  readonly boundCents: number | null;
  readonly shortageBoundMinutes: number | null;
  readonly isProvenOptimal: boolean;
  readonly failure: string | null;
}

/** How a run ended, as its row keeps it. A roster left out keeps the one that is there. */
export interface RunEnd {
  readonly state: Exclude<RunState, 'running'>;
  readonly endedAtUtc: number;
  readonly roster?: PlannedRoster;
  readonly proof?: Proof | null;
  readonly boundCents?: number | null;
  readonly shortageBoundMinutes?: number | null;
  readonly isProvenOptimal?: boolean;
  readonly failure?: string | null;
}
