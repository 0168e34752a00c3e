import type { Proof } from '../proof';
import type {
  LocalDate,
  PersonId,
  RosterId,
  RunId,
  ShiftKindId,
  SkillId,
  TeamId,
  VersionId,
} from '../units';
import type { KnotsView } from './knot-views';

/** A line of the list of periods. */
export interface RosterSummary {
  readonly id: RosterId;
  readonly teamId: TeamId;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly state: 'draft' | 'published' | 'closed';
  /** Number of the newest version, drafts included. */
  readonly versionNumber: number;
  readonly hasFloors: boolean;
  /** Planned shifts of the newest version. */
  readonly shiftCount: number;
  /** Missing person-minutes on firm floors, null when nothing is planned yet. */
  readonly shortageMinutes: number | null;
  /** People with shifts in the newest published version and how many confirmed it; before: everybody, 0. */
  readonly confirmedCount: number;
  readonly peopleCount: number;
}

/** What publishing answers. */
export interface PublishedRoster extends RosterSummary {
  /** Sentences on what was published although it is not as promised, e.g. short notice. */
  readonly warnings: readonly string[];
}

/** Need and cover over one stretch of time, half-open, on the axis of `Board.days`. */
export interface CoverSlot {
  readonly startMinute: number;
  readonly endMinute: number;
  readonly need: number;
  readonly have: number;
}

/** Cover of one skill (null: floors for anybody) over the period; slots touch and never overlap. */
export interface CoverLane {
  readonly skillId: SkillId | null;
  readonly slots: readonly CoverSlot[];
}

export interface BoardKind {
  readonly id: ShiftKindId;
  readonly name: string;
  readonly letter: string;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly isNight: boolean;
  /** Darkness of the brick by lateness: 0 early, 1 day, 2 late, 3 night. */
  readonly tone: 0 | 1 | 2 | 3;
}

export interface BoardCell {
  readonly personId: PersonId;
  readonly date: LocalDate;
  readonly kindId: ShiftKindId;
  readonly postSkillId: SkillId;
  /** True hours on the axis of `Board.days`. */
  readonly startMinute: number;
  readonly endMinute: number;
  readonly paidMinutes: number;
  readonly isPinned: boolean;
}

export interface BoardPerson {
  readonly id: PersonId;
  readonly name: string;
  /** Home skill first. */
  readonly skillIds: readonly SkillId[];
  readonly contractMinutes: number;
  readonly plannedMinutes: number;
  readonly creditMinutes: number;
  readonly overtimeMinutes: number;
  readonly nights: number;
  readonly weekends: number;
  readonly mayWorkNights: boolean;
  readonly leave: readonly { readonly startsOn: LocalDate; readonly endsOn: LocalDate }[];
  readonly confirmedAtUtc: number | null;
}

/** Everything the roster page draws. Minutes count from the first local midnight of the period. */
export interface Board {
  readonly rosterId: RosterId;
  readonly teamId: TeamId;
  readonly teamName: string;
  readonly organisationName: string;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly zone: string;
  readonly currency: string;
  readonly today: LocalDate;
  readonly dayStartsAtMinute: number;
  readonly version: {
    readonly id: VersionId;
    readonly number: number;
    readonly publishedAtUtc: number | null;
    readonly publishedByName: string | null;
    readonly confirmBy: LocalDate | null;
  };
  readonly days: readonly {
    readonly date: LocalDate;
    readonly startMinute: number;
    readonly endMinute: number;
    readonly holidayName: string | null;
    readonly isWeekend: boolean;
  }[];
  readonly skills: readonly { readonly id: SkillId; readonly name: string }[];
  readonly kinds: readonly BoardKind[];
  readonly people: readonly BoardPerson[];
  readonly cells: readonly BoardCell[];
  /** Shifts on the three days before the period, drawn pale. */
  readonly cellsBefore: readonly BoardCell[];
  readonly lanes: readonly CoverLane[];
  /** Re-check of this version; null while nothing is planned. Money fields are 0 without `pay.read`. */
  readonly proof: Proof | null;
  readonly mayEdit: boolean;
  readonly maySeePay: boolean;
  /** Set when publishing today gives people less notice than the team promises. */
  readonly noticeWarning: string | null;
  /** Sentences on people, kinds and pins that a run of this period has to leave out. */
  readonly notes: readonly string[];
  readonly activeRunId: RunId | null;
  /** The run that made this version, with its proven bound. */
  readonly run: RunSummary | null;
  /** False once floors, people or rules changed after that run: its bound says nothing about today's. */
  readonly isRunCurrent: boolean;
}

export type RunState = 'running' | 'done' | 'stopped' | 'failed' | 'interrupted';

export interface RunSummary {
  readonly id: RunId;
  readonly rosterId: RosterId;
  readonly number: number;
  readonly state: RunState;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly startedAtUtc: number;
  readonly endedAtUtc: number | null;
  readonly startedByName: string;
  readonly limitSeconds: number;
  readonly bestCostCents: number | null;
  readonly boundCents: number | null;
  readonly shortageMinutes: number | null;
  readonly shortageBoundMinutes: number | null;
  readonly isProvenOptimal: boolean;
  readonly failure: string | null;
}

/** One report of a running run, also what the event stream sends as JSON. */
export interface RunEvent {
  readonly sequence: number;
  readonly elapsedMs: number;
  /** 1: can the floors be held? 2: what is the cheapest roster? */
  readonly stage: 1 | 2;
  readonly shortageMinutes: number | null;
  readonly shortageBoundMinutes: number | null;
  readonly bestCostCents: number | null;
  readonly boundCents: number | null;
}

/** Everything the run page draws. */
export interface RunView extends RunSummary {
  readonly currency: string;
  readonly events: readonly RunEvent[];
  readonly peopleCount: number;
  readonly dayCount: number;
  /** Floor person-shifts by skill: needed and placed minutes. */
  readonly bySkill: readonly {
    readonly skillId: SkillId | null;
    readonly name: string;
    readonly neededMinutes: number;
    readonly missingMinutes: number;
  }[];
  readonly lanes: readonly CoverLane[];
  readonly axisMinutes: number;
  readonly proof: Proof | null;
  readonly shortageLines: readonly string[];
  readonly rules: readonly {
    readonly label: string;
    readonly limit: string;
    readonly source: string;
  }[];
  /** Why the floors cannot all be held; null when they can be, and when nobody looked. */
  readonly knots: KnotsView | null;
  /** The roster stands, and what stands in the way of the floors is being looked for. */
  readonly isLookingForKnots: boolean;
  /** Whether ways out can be worked out: against a roster, by somebody who may change it. */
  readonly mayWorkOut: boolean;
  readonly mayStop: boolean;
}

/** A shift of a person for their own pages, the mail and the calendar. */
export interface OwnShift {
  readonly date: LocalDate;
  readonly kindName: string;
  readonly letter: string;
  readonly tone: 0 | 1 | 2 | 3;
  readonly skillName: string;
  readonly startsAtUtc: number;
  readonly endsAtUtc: number;
  /** Local minutes of the start date; the end may lie beyond 1440. */
  readonly startMinute: number;
  readonly endMinute: number;
  readonly paidMinutes: number;
  /** Names of the others in the same post on the same shift. */
  readonly withNames: readonly string[];
}

/** What a member of staff sees of one published period. */
export interface OwnPeriod {
  readonly rosterId: RosterId;
  readonly versionId: VersionId;
  readonly versionNumber: number;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  readonly confirmBy: LocalDate | null;
  readonly confirmedAtUtc: number | null;
  readonly contractMinutes: number;
  readonly plannedMinutes: number;
  readonly nights: number;
  readonly weekends: number;
  readonly shifts: readonly OwnShift[];
  readonly leave: readonly { readonly startsOn: LocalDate; readonly endsOn: LocalDate }[];
}

export interface OwnShifts {
  readonly personName: string;
  readonly teamName: string;
  readonly zone: string;
  readonly dayStartsAtMinute: number;
  readonly today: LocalDate;
  /** Minute of the local day now. */
  readonly nowMinute: number;
  readonly weeklyMinutes: number;
  readonly periods: readonly OwnPeriod[];
  readonly holidays: readonly { readonly date: LocalDate; readonly name: string }[];
}

/** One shift on a calendar page. */
export interface CalendarEntry {
  readonly id: string;
  readonly personId: PersonId;
  readonly personName: string;
  readonly kindName: string;
  readonly letter: string;
  readonly tone: 0 | 1 | 2 | 3;
  readonly skillName: string;
  readonly date: LocalDate;
  readonly startsAtUtc: number;
  readonly endsAtUtc: number;
  readonly isPublished: boolean;
}

/** What a calendar page draws around the shifts of a team. */
export interface CalendarFrame {
  readonly zone: string;
  readonly dayStartsAtMinute: number;
  readonly today: LocalDate;
  /** Minute of the local day now. */
  readonly nowMinute: number;
  readonly periods: readonly {
    readonly startsOn: LocalDate;
    readonly endsOn: LocalDate;
    readonly isPublished: boolean;
  }[];
  readonly holidays: readonly { readonly date: LocalDate; readonly name: string }[];
}
