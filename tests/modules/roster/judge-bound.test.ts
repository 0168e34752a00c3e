import { describe, expect, it } from 'vitest';
import type { BoundAnswer } from '@/modules/roster/bound-worker';
import { judgeBound } from '@/modules/roster/judge-bound';
import type { JobEnd } from '@/modules/solver';

const reckoned = (boundCents: number, plainCents = 9000): JobEnd<BoundAnswer> => ({
  kind: 'answered',
  answer: { proof: { kind: 'bound', boundCents }, plainCents, roundingCents: 2 },
});

/** A roster that costs 100.00, whose solver gives these bounds. */
const judge = (
  end: JobEnd<BoundAnswer> | null,
  { boundCents = 9900, recordedBoundCents = 9900 as number | null, shortageMinutes = 0 } = {},
) =>
  judgeBound(
    { boundCents, recordedBoundCents },
    { costCents: 10_000, shortageMinutes },
    end,
    'EUR',
  );

const refusedBecause = (finding: string) =>
  `The independent re-check refused the bound: ${finding} The draft is unchanged.`;

describe('a bound that is reckoned anew', () => {
  it.each([9898, 9900, 9950, 10_000])('stands when the record gives %i', (recheckedCents) => {
    const { bound, doubt } = judge(reckoned(recheckedCents));
    expect(doubt).toBeNull();
    expect(bound).toMatchObject({ recheckedCents, solverCents: 9900 });
    expect(bound.sentence).toMatch(/^No roster can cost less than €[\d.]+: reckoned anew from the/);
  });

  it('says whose bound it is when a search tree raised it', () => {
    const { bound, doubt } = judge(reckoned(9500), { recordedBoundCents: 9500 });
    expect(doubt).toBeNull();
    expect(bound.sentence).toBe(
      "No roster can cost less than €95.00: reckoned anew from the prices of the floors by separate code. The higher bound of €99.00 comes from the solver's search tree and was not reckoned anew.",
    );
  });

  it('speaks of rosters that cover as much when some floors are not held', () => {
    expect(judge(reckoned(9900), { shortageMinutes: 480 }).bound.sentence).toMatch(
      /^No roster as well covered can cost less than €99\.00/,
    );
  });

  it('is what people cost by themselves when the record gives less', () => {
    const { bound } = judge(reckoned(0), { recordedBoundCents: -500, boundCents: 9000 });
    expect(bound).toEqual({
      recheckedCents: 9000,
      solverCents: 9000,
      sentence:
        'No roster can cost less than €90.00: reckoned anew from the cheapest lawful plan of each person by separate code.',
    });
  });

  it('is refused above the cost of the roster', () => {
    expect(judge(reckoned(10_001)).doubt).toBe(
      refusedBecause('Reckoned anew it is 10001, above the cost of 10000 minor units.'),
    );
  });

  it('is refused below what the solver reckons from the same record, beyond rounding', () => {
    expect(judge(reckoned(9897)).doubt).toBe(
      refusedBecause(
        'The solver reckons 9900 minor units from its record, the re-check 9897; rounding explains 2 at most.',
      ),
    );
  });

  it('is refused when its record proves nothing', () => {
    const sentence = 'The record of the bound prices a priority twice.';
    const proof = { kind: 'refused', sentence } as const;
    const { doubt, bound } = judge({
      kind: 'answered',
      answer: { proof, plainCents: 0, roundingCents: 0 },
    });
    expect(doubt).toBe(refusedBecause(sentence));
    expect(bound).toMatchObject({ recheckedCents: null, solverCents: 9900 });
  });
});

describe('a bound that is not reckoned anew', () => {
  it.each<[string, JobEnd<BoundAnswer> | null, string]>([
    ['without a record', null, 'the solver kept no record of prices for it'],
    ['out of time', { kind: 'killed', wasStopped: false }, 'the time for it ran out'],
    ['after a stop', { kind: 'killed', wasStopped: true }, 'the run was stopped'],
    ['when its thread broke', { kind: 'broken', cause: null }, 'the re-check broke off'],
  ])('is kept and says so: %s', (_, end, reason) => {
    expect(judge(end)).toEqual({
      bound: {
        recheckedCents: null,
        solverCents: 9900,
        sentence: `The bound of €99.00 was not re-checked: ${reason}.`,
      },
      doubt: null,
    });
  });
});
