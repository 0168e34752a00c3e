import { describe, expect, it } from 'vitest';
import type { FairnessTerm, ProblemPerson, Wish } from '@/modules/problem';
import { type Proof, proveRoster } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

type Plan = readonly (readonly [personId: string, dayIndex: number, kindId: string])[];

const prove = (
  people: readonly Partial<ProblemPerson>[],
  plan: Plan,
  fairness: FairnessTerm[] = [],
): Proof => {
  const named = people.map((person, index) => ({
    id: ['ione', 'ravi', 'gwen', 'agency'][index] ?? '',
    contractMinutes: 0,
    payCentsPerHour: 0,
    ...person,
  }));
  const problem = buildProblem({ people: named, fairness });
  return proveRoster(
    problem,
    plan.map(([personId, dayIndex, kindId]) => assign(problem, personId, dayIndex, kindId)),
  );
};

/** Shifts 4 to 7 are Early, Day, Late and Night of day 1. */
describe('wishes', () => {
  const wish = (wants: Wish['wants'], shiftIndex: number | null): Wish => ({
    dayIndex: 1,
    shiftIndex,
    wants,
    priceCents: 700,
  });
  const nothing: Plan = [];
  const early: Plan = [['ione', 1, 'Early']];
  const late: Plan = [['ione', 1, 'Late']];
  const nightBefore: Plan = [['ione', 0, 'Night']];
  it.each([
    ['to work any shift: no shift', wish('on', null), nothing, 1],
    ['to work any shift: a shift', wish('on', null), late, 0],
    ['to work any shift: the night before runs into the day', wish('on', null), nightBefore, 1],
    ['to work a shift: that one', wish('on', 4), early, 0],
    ['to work a shift: another', wish('on', 4), late, 1],
    ['to work a shift: none', wish('on', 4), nothing, 1],
    ['for a day off: no shift', wish('off', null), nothing, 0],
    ['for a day off: a shift', wish('off', null), early, 1],
    ['for a day off: the night before runs into the day', wish('off', null), nightBefore, 0],
    ['against a shift: that one', wish('off', 4), early, 1],
    ['against a shift: another', wish('off', 4), late, 0],
  ])('%s', (_, asked, plan, refused) => {
    expect(prove([{ wishes: [asked] }], plan)).toMatchObject({
      refusedWishes: refused,
      refusedWishCents: refused * 700,
      costCents: refused * 700,
      breaches: [],
    });
  });

  it('are counted for each person, and two for one day count twice', () => {
    const proof = prove(
      [
        { wishes: [wish('on', 4), wish('off', 6)] },
        { wishes: [{ ...wish('off', null), priceCents: 0 }] },
        { wishes: [] },
      ],
      [...late, ['ravi', 1, 'Early']],
    );
    expect(proof.people.map(({ refusedWishes }) => refusedWishes)).toEqual([2, 1, 0]);
    expect(proof).toMatchObject({ refusedWishes: 3, refusedWishCents: 1400 });
  });
});

describe('fairness', () => {
  /** Ione: 3 nights, one of them on a Sunday; Ravi: one weekend; Gwen: nothing. */
  const plan: Plan = [
    ['ione', 0, 'Night'],
    ['ione', 3, 'Night'],
    ['ione', 6, 'Night'],
    ['ravi', 5, 'Early'],
    ['ravi', 6, 'Early'],
  ];
  const spread = (measure: 'nights' | 'weekends' | 'refusedWishes'): FairnessTerm => ({
    kind: 'spread',
    measure,
    priceCents: 100,
  });
  const off: Wish = { dayIndex: 5, shiftIndex: null, wants: 'off', priceCents: 0 };
  const [ione, ravi, gwen] = [{}, { wishes: [off] }, {}];
  const agency = { isOutside: true };

  it.each<[string, Partial<ProblemPerson>[], FairnessTerm[], number]>([
    ['nights from 3 to 0', [ione, ravi, gwen], [spread('nights')], 300],
    ['weekends from 1 to 0', [ione, ravi, gwen], [spread('weekends')], 100],
    ['weekends of two who have one each', [ione, ravi], [spread('weekends')], 0],
    ['wishes not granted', [ione, ravi, gwen], [spread('refusedWishes')], 100],
    ['one person alone', [ione, { ...ravi, isOutside: true }], [spread('nights')], 0],
    ['everybody from outside', [agency, agency], [spread('nights')], 0],
    ['terms add up', [ione, ravi, gwen], [spread('nights'), spread('weekends')], 400],
  ])('spread: %s', (_, people, fairness, cents) => {
    const known = plan.filter(([id]) => id !== 'ravi' || people.length > 1);
    const proof = prove(people, known, fairness);
    expect(proof).toMatchObject({ spreadCents: cents, shareCents: 0, costCents: cents });
  });

  it('outside cover is left out of a spread', () => {
    const people = [ione, ravi, gwen, agency];
    const busy: Plan = [0, 1, 2, 3, 4].map((day) => ['agency', day, 'Night'] as const);
    expect(prove(people, [...plan, ...busy], [spread('nights')]).spreadCents).toBe(300);
    expect(
      prove(
        [ione, agency],
        busy.map(([, ...rest]) => ['ravi', ...rest] as const),
        [spread('nights')],
      ).spreadCents,
    ).toBe(0);
  });

  it('a share costs by its steps, each person by themselves', () => {
    const share: FairnessTerm = {
      kind: 'share',
      measure: 'nights',
      steps: [
        { above: 1, priceCents: 50 },
        { above: 2, priceCents: 200 },
      ],
    };
    // 3 nights: 2 x 50 + 1 x 200.
    const proof = prove([ione, ravi, gwen], plan, [share]);
    expect(proof).toMatchObject({ spreadCents: 0, shareCents: 300, costCents: 300 });
    expect(prove([{ isOutside: true }, ravi, gwen], plan, [share]).shareCents).toBe(0);
  });

  it('a share from the first unit on', () => {
    const share: FairnessTerm = {
      kind: 'share',
      measure: 'weekends',
      steps: [{ above: 0, priceCents: 30 }],
    };
    expect(prove([ione, ravi, gwen], plan, [share]).shareCents).toBe(60);
  });
});
