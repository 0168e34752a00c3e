import { expect, it } from 'vitest';
import { proveRoster, readProof, type StoredProof } from '@/modules/proof';
import { assign, buildProblem } from '@/tests/support/problem-builder';

/** As the first version of the program stored it. */
const firstVersion: StoredProof = {
  costCents: 16_000,
  contractPayCents: 16_000,
  premiumPayCents: 0,
  overtimePayCents: 0,
  overtimeMinutes: 0,
  wishedShortageCents: 0,
  shortageMinutes: 480,
  wishedShortageMinutes: 0,
  shortages: [],
  breaches: [],
  checked: [{ rule: 'restMinutes', cases: 4 }],
  people: [{ personId: 'ione', workedMinutes: 480, overtimeMinutes: 0, nights: 0, weekends: 1 }],
};

it('a proof of the first version is read with nothing of what it did not look at', () => {
  expect(readProof(firstVersion)).toEqual({
    ...firstVersion,
    shortageByPriority: [{ priority: 1, minutes: 480 }],
    surplusMinutes: 0,
    pricedSurplusMinutes: 0,
    pricedSurplusCents: 0,
    surpluses: [],
    teamRuleUnits: 0,
    teamRuleCents: 0,
    refusedWishes: 0,
    refusedWishCents: 0,
    spreadCents: 0,
    shareCents: 0,
    people: [
      {
        personId: 'ione',
        workedMinutes: 480,
        overtimeMinutes: 0,
        nights: 0,
        weekends: 1,
        refusedWishes: 0,
      },
    ],
  });
});

it('a proof of today is read as it was stored', () => {
  const problem = buildProblem({ floors: [{ priority: 3 }], ceilings: [{ people: 0 }] });
  const proof = proveRoster(problem, [assign(problem, 'ione', 0, 'Day')]);
  expect(readProof(JSON.parse(JSON.stringify(proof)))).toEqual(proof);
});
