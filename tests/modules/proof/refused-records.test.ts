import { describe, expect, it } from 'vitest';
import type { BoundRecord, ProblemPerson } from '@/modules/problem';
import { proveBound } from '@/modules/proof';
import { buildProblem } from '@/tests/support/problem-builder';
import { early, emptyRecord, nothing, oneEarly, slice } from './bound-of';

describe('a record that proves nothing is refused', () => {
  const problem = buildProblem({
    dayCount: 2,
    kinds: [early, { id: 'Mid', startMinute: 600, endMinute: 1000 }],
    people: [{}, { isOutside: true }],
    floors: [
      { priceCentsPerHour: 3000 },
      { startMinute: 1440 + 420, endMinute: 1440 + 900, counting: 'shared', floorId: 'shared' },
    ],
    ceilings: [{ priceCentsPerHour: 100 }],
    teamRules: [
      {
        id: 'pair',
        name: 'Pair',
        kind: 'together',
        personIds: ['ione', 'person-2'],
        priceCents: 5,
      },
      { id: 'apart', name: 'Apart', kind: 'apart', personIds: ['ione', 'person-2'], priceCents: 5 },
      { id: 'free', name: 'Free', kind: 'mostFree', personIds: ['ione'], most: 0, priceCents: 5 },
      { id: 'pay', name: 'Pay', kind: 'budget', mostCents: 5, priceCents: 5 },
    ],
    fairness: [
      { kind: 'spread', measure: 'nights', priceCents: 500 },
      { kind: 'share', measure: 'nights', steps: [{ above: 1, priceCents: 5 }] },
    ],
  });
  const piece = { startMinute: 420, endMinute: 600 };
  const spread = { term: 0, personId: 'ione', mostCents: 0, leastCents: 0 };

  it('but this one proves something', () => {
    const found = proveBound(
      problem,
      {
        shortage: [{ priority: 1, centsPerMinute: 3 }],
        surplusCentsPerMinute: 0,
        slices: [
          slice(piece),
          slice({ startMinute: 600, endMinute: 900 }),
          slice({ of: 'ceiling', id: 'ceiling-1', ...piece }),
          slice({ of: 'shared', id: 'shared', startMinute: 1440 + 600, endMinute: 1440 + 900 }),
        ],
        teamRules: [
          { ruleId: 'pair', at: 3, cents: 1 },
          { ruleId: 'apart', at: 600, cents: 1 },
          { ruleId: 'free', at: 1, cents: 1 },
          { ruleId: 'pay', at: null, cents: -1 },
        ],
        spreads: [{ ...spread, mostCents: 500, leastCents: 500 }],
      },
      nothing,
    );
    expect(found.kind).toBe('bound');
  });

  it.each<[string, Partial<BoundRecord>, string]>([
    [
      'a priority without floors',
      { shortage: [{ priority: 2, centsPerMinute: 1 }] },
      'prices firm floors of priority 2, which the problem does not have',
    ],
    [
      'a priority twice',
      {
        shortage: [
          { priority: 1, centsPerMinute: 1 },
          { priority: 1, centsPerMinute: 1 },
        ],
      },
      'prices a priority twice',
    ],
    [
      'firm ceilings that are none',
      { surplusCentsPerMinute: 1 },
      'prices firm ceilings, which the problem does not have',
    ],
    [
      'a skill nobody asks for',
      { slices: [slice({ ...piece, skillId: 'vet' })] },
      'prices seated cover (vet) from minute 420 to 600, where the problem asks for nothing',
    ],
    [
      'a floor that is not there',
      { slices: [slice({ ...piece, of: 'shared', id: 'gone' })] },
      'prices shared cover (gone) from minute 420 to 600, where the problem asks for nothing',
    ],
    [
      'a slice beyond its window',
      { slices: [slice({ startMinute: 300, endMinute: 600 })] },
      'prices seated cover (nurse) from minute 300 to 600, where the problem asks for nothing',
    ],
    [
      'an empty slice',
      { slices: [slice({ startMinute: 500, endMinute: 500 })] },
      'prices seated cover (nurse) from minute 500 to 500, where the problem asks for nothing',
    ],
    [
      'a slice within which a shift starts',
      { slices: [slice()] },
      'prices seated cover (nurse) from minute 420 to 900, within which a shift starts or ends',
    ],
    [
      'slices that overlap',
      { slices: [slice(piece), slice({ startMinute: 599, endMinute: 600 })] },
      'prices seated cover (nurse) from minute 599 to 600 twice',
    ],
    [
      'a rule that is not there',
      { teamRules: [{ ruleId: 'gone', at: null, cents: 1 }] },
      'prices the rule gone at null, which the problem does not have',
    ],
    [
      'a minute at which no shift starts',
      { teamRules: [{ ruleId: 'apart', at: 421, cents: 1 }] },
      'prices the rule Apart at 421, which the problem does not have',
    ],
    [
      'a day beyond the period',
      { teamRules: [{ ruleId: 'free', at: 2, cents: 1 }] },
      'prices the rule Free at 2, which the problem does not have',
    ],
    [
      'a budget by the day',
      { teamRules: [{ ruleId: 'pay', at: 0, cents: 1 }] },
      'prices the rule Pay at 0, which the problem does not have',
    ],
    [
      'a row of a rule twice',
      {
        teamRules: [
          { ruleId: 'pair', at: 0, cents: 1 },
          { ruleId: 'pair', at: 0, cents: 1 },
        ],
      },
      'prices a rule that joins people twice',
    ],
    [
      'a share term as a spread',
      { spreads: [{ ...spread, term: 1 }] },
      'prices the part of ione in fairness term 1, which the problem does not have',
    ],
    [
      'outside cover in a spread',
      { spreads: [{ ...spread, personId: 'person-2' }] },
      'prices the part of person-2 in fairness term 0, which the problem does not have',
    ],
    [
      'a person twice in a spread',
      { spreads: [spread, spread] },
      'prices the part of a person in fairness twice',
    ],
  ])('%s', (_, record, fault) => {
    expect(proveBound(problem, { ...emptyRecord, ...record }, nothing)).toEqual({
      kind: 'refused',
      sentence: `The record of the bound ${fault}.`,
    });
  });

  it('a shift that nobody who counts may be on cuts no slice', () => {
    const kinds = [early, { id: 'Mid', startMinute: 600, endMinute: 1000, postSkillIds: ['desk'] }];
    const cover = { counting: 'shared' as const, floorId: 'shared', skillId: 'nurse' };
    const seenBy = (person: Partial<ProblemPerson>) => {
      const world = oneEarly({ kinds, people: [person], floors: [{}, cover] });
      const slices = [slice(), slice({ of: 'shared', id: 'shared' })];
      return slices.map(
        (one) => proveBound(world, { ...emptyRecord, slices: [one] }, nothing).kind,
      );
    };
    expect(seenBy({})).toEqual(['bound', 'bound']);
    expect(seenBy({ skillIds: ['nurse', 'desk'] })).toEqual(['bound', 'refused']);
    expect(seenBy({ skillIds: ['desk'] })).toEqual(['bound', 'bound']);
    const away = [{ startMinute: 950, endMinute: 990, reason: 'Leave' }];
    expect(seenBy({ skillIds: ['nurse', 'desk'], absences: away })).toEqual(['bound', 'bound']);
  });

  it('for a person who has no lawful line, by name', () => {
    const overworked = oneEarly({ people: [{ minimumMinutes: 481 }] });
    expect(proveBound(overworked, emptyRecord, nothing)).toEqual({
      kind: 'refused',
      sentence: 'Ione Baptisto has no lawful line at all.',
    });
  });
});
