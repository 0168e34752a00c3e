import type { BoundRecord, Problem } from '@/modules/problem';
import { type Proof, proveBound } from '@/modules/proof';
import { buildProblem, type ProblemSketch } from '@/tests/support/problem-builder';

type Figures = Pick<Proof, 'shortageByPriority' | 'surplusMinutes'>;

/** Neither shortage nor surplus. */
export const nothing: Figures = { shortageByPriority: [], surplusMinutes: 0 };

/** Every multiplier 0. */
export const emptyRecord: BoundRecord = {
  shortage: [],
  surplusCentsPerMinute: 0,
  slices: [],
  teamRules: [],
  spreads: [],
};

/** A slice of a record; unless said otherwise seated cover by a nurse from 07:00 to 15:00, worth nothing. */
export const slice = (
  change: Partial<BoundRecord['slices'][number]> = {},
): BoundRecord['slices'][number] => ({
  of: 'seated',
  skillId: 'nurse',
  id: null,
  startMinute: 420,
  endMinute: 900,
  cents: 0,
  ...change,
});

/** The bound in cents; throws when the record is refused. */
export function boundOf(
  problem: Problem,
  record: Partial<BoundRecord>,
  figures: Figures = nothing,
): number {
  const found = proveBound(problem, { ...emptyRecord, ...record }, figures);
  if (found.kind === 'refused') throw new Error(found.sentence);
  return found.boundCents;
}

/** One nurse paid by the hour, one day, an Early of eight hours: 200.00 to be there, or nothing. */
export const early = { id: 'Early', startMinute: 420, endMinute: 900 };
export const oneEarly = (sketch: ProblemSketch = {}): Problem =>
  buildProblem({
    dayCount: 1,
    kinds: [early],
    people: [{ paidBy: 'hours', minimumMinutes: 0 }],
    ...sketch,
  });
