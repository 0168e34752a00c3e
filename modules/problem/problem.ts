import { z } from 'zod';
import { centsSchema, localDateSchema } from '../units';
import { fairnessTermSchema, wishSchema } from './fairness';
import { type ProblemRules, problemRulesSchema } from './problem-rules';
import { teamRuleSchema } from './team-rules';

/*
 * One document holds everything the product knows about one period of one team. The model builder
 * and the proof both read it, and nothing else: what is not in here cannot influence a roster.
 *
 * Time axis: minutes that truly elapse from the first local midnight of the period (minute 0), so
 * that a night of a clock change is as long as it is. History has negative minutes.
 */

const minute = z.int();
const dayIndex = z.int().min(0);

/** Version of the document; `readProblem` brings older ones up to it. */
export const problemVersion = 2;

/** A calendar day of the period. `startMinute` is its local midnight on the time axis. */
export const problemDaySchema = z.strictObject({
  date: localDateSchema,
  startMinute: minute,
  isHoliday: z.boolean(),
});

export const problemSkillSchema = z.strictObject({ id: z.string(), name: z.string() });

/** A shift kind on one day: half-open interval [startMinute, endMinute) on the time axis. */
export const problemShiftSchema = z.strictObject({
  /** Position in `problem.shifts`; assignments refer to it. */
  index: z.int().min(0),
  kindId: z.string(),
  kindName: z.string(),
  /** The day on which it starts: a shift belongs to that day. */
  dayIndex,
  startMinute: minute,
  endMinute: minute,
  /** Elapsed minutes less the unpaid break. */
  paidMinutes: z.int().min(0),
  /** Paid minutes that fall in the night window of the pay rules, by the clock. */
  nightMinutes: z.int().min(0),
  weekendMinutes: z.int().min(0),
  holidayMinutes: z.int().min(0),
  /** Counts as a Night for the rules on nights. */
  isNight: z.boolean(),
  /** Skills in which a person may be posted on it; null means any skill. */
  postSkillIds: z.array(z.string()).nullable(),
});

/**
 * A floor on one day: least `people` on duty over [startMinute, endMinute). On the first day: beyond
 * those still on duty from the period before, so one floor may stand here in several pieces.
 */
export const problemFloorSchema = z.strictObject({
  floorId: z.string(),
  dayIndex,
  startMinute: minute,
  endMinute: minute,
  /** The skill needed; null means anybody on duty counts. */
  skillId: z.string().nullable(),
  people: z.int().min(0).max(999),
  /**
   * seated: a person counts once, in the post they hold; floors of one skill whose windows overlap
   * add up. shared: everybody on duty who holds the skill counts, and each floor stands alone.
   */
  counting: z.enum(['seated', 'shared']),
  /** null: firm, must hold. Otherwise wished: the price of one missing person for one hour. */
  priceCentsPerHour: centsSchema.nullable(),
  /**
   * Which firm floors go first when not all can hold: shortage on priority 1 is made least before any
   * on priority 2 is looked at. Of no account for wished floors.
   */
  priority: z.int().min(1).max(9),
});

/**
 * Most `people` useful over [startMinute, endMinute). Each ceiling stands alone: seated counts people
 * in the post of the skill (any post without one), shared everybody on duty who holds the skill.
 */
export const problemCeilingSchema = z.strictObject({
  ceilingId: z.string(),
  dayIndex,
  startMinute: minute,
  endMinute: minute,
  skillId: z.string().nullable(),
  people: z.int().min(0).max(999),
  counting: z.enum(['seated', 'shared']),
  /** null: firm. Otherwise the price of one person too many for one hour. */
  priceCentsPerHour: centsSchema.nullable(),
});

const neighbouringShiftSchema = z.strictObject({
  /** -1 is the day before the period; the number of days is the day after it. */
  dayIndex: z.int(),
  startMinute: minute,
  endMinute: minute,
  isNight: z.boolean(),
});

const pinSchema = z.strictObject({
  dayIndex,
  /** The shift to keep, or null to keep the day free. */
  shiftIndex: z.int().min(0).nullable(),
  postSkillId: z.string().nullable(),
});

export const problemPersonSchema = z.strictObject({
  id: z.string(),
  name: z.string(),
  /** Home skill first. Only skills that are valid through the period. */
  skillIds: z.array(z.string()).min(1),
  payCentsPerHour: centsSchema,
  /** contract: contract hours are paid in any case. hours: worked hours and credited leave are paid. */
  paidBy: z.enum(['contract', 'hours']),
  /** Hours the contract gives in this period, leave included. */
  contractMinutes: z.int().min(0),
  /** Minutes of leave that count as worked towards the contract. */
  creditMinutes: z.int().min(0),
  /** Least and most of (worked paid minutes + creditMinutes); equal for an exact contract. */
  minimumMinutes: z.int().min(0),
  maximumMinutes: z.int().min(0),
  mayWorkNights: z.boolean(),
  /** Leave and other times at which the person cannot be on duty, half-open. */
  absences: z.array(z.strictObject({ startMinute: minute, endMinute: minute, reason: z.string() })),
  /** Shifts of the days before the period, oldest first, so that rest and runs cross the border. */
  history: z.array(neighbouringShiftSchema),
  /** Shifts already published for the days after the period, oldest first, for the same reason. */
  following: z.array(neighbouringShiftSchema),
  pins: z.array(pinSchema),
  /** Limits of this person instead of the team's; null: the team's. Read with `rulesOf`. */
  rules: problemRulesSchema.nullable(),
  /** Most shifts of a kind in the period. */
  kindLimits: z.array(z.strictObject({ kindId: z.string(), most: z.int().min(0) })),
  wishes: z.array(wishSchema),
  /**
   * Outside cover: a place that may be filled from outside at its price. It has no contract hours, keeps
   * rules like everybody, and fairness leaves it out.
   */
  isOutside: z.boolean(),
});

/** Overtime beyond so many overtime minutes of the period is paid at a percentage of the rate. */
export const overtimeStepSchema = z.strictObject({
  overMinutes: z.int().min(0),
  /** 150 means one and a half times the ordinary rate. */
  percent: z.int().min(100).max(1000),
});

/** Premiums add up and are percentages of the ordinary rate; overtime goes by steps. */
export const problemPaySchema = z.strictObject({
  nightPercent: z.int().min(0).max(1000),
  weekendPercent: z.int().min(0).max(1000),
  holidayPercent: z.int().min(0).max(1000),
  /** The first begins at 0; both figures rise from step to step. */
  overtimeSteps: z
    .array(overtimeStepSchema)
    .min(1)
    .refine(isRising, 'Overtime steps begin at 0 minutes and rise in minutes and percent.'),
});

export const problemSchema = z.strictObject({
  version: z.literal(problemVersion),
  teamName: z.string(),
  zone: z.string(),
  currency: z.string(),
  days: z.array(problemDaySchema).min(1).max(366),
  skills: z.array(problemSkillSchema),
  shifts: z.array(problemShiftSchema),
  floors: z.array(problemFloorSchema),
  ceilings: z.array(problemCeilingSchema),
  people: z.array(problemPersonSchema),
  rules: problemRulesSchema,
  teamRules: z.array(teamRuleSchema),
  pay: problemPaySchema,
  fairness: z.array(fairnessTermSchema),
});

export type Problem = z.infer<typeof problemSchema>;
export type ProblemPerson = z.infer<typeof problemPersonSchema>;
export type ProblemShift = z.infer<typeof problemShiftSchema>;
export type ProblemCeiling = z.infer<typeof problemCeilingSchema>;
export type ProblemPay = z.infer<typeof problemPaySchema>;
export type ProblemFloor = z.infer<typeof problemFloorSchema>;

/** One person on one shift in one post: the atom of a roster. */
export const assignmentSchema = z.strictObject({
  personId: z.string(),
  shiftIndex: z.int().min(0),
  postSkillId: z.string(),
});
export type PlannedAssignment = z.infer<typeof assignmentSchema>;

/** A roster of a problem: at most one assignment for each person and day. */
export type PlannedRoster = readonly PlannedAssignment[];

/** The limits a person keeps: their own, or the team's. */
export const rulesOf = (problem: Problem, person: ProblemPerson): ProblemRules =>
  person.rules ?? problem.rules;

function isRising(steps: readonly z.infer<typeof overtimeStepSchema>[]): boolean {
  return steps.every((step, index) => {
    const before = steps[index - 1];
    if (!before) return step.overMinutes === 0;
    return step.overMinutes > before.overMinutes && step.percent >= before.percent;
  });
}
