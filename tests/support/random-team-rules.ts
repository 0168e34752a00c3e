import fc from 'fast-check';
import type { TeamRule } from '@/modules/problem';

const ids = ['ione', 'person-2', 'person-3'];

/** One rule among the first people of a problem with so many shifts, firm or priced. */
export const teamRule = (peopleCount: number, shiftCount: number): fc.Arbitrary<TeamRule> => {
  const members = fc.subarray(ids.slice(0, peopleCount), { minLength: 2 });
  const common = {
    name: fc.constant('a rule of the team'),
    priceCents: fc.constantFrom(null, 0, 1500),
  };
  return fc.oneof(
    fc.record({
      ...common,
      id: fc.constant('together'),
      kind: fc.constant('together' as const),
      personIds: fc.constant<[string, string]>(['ione', 'person-2']),
    }),
    fc.record({
      ...common,
      id: fc.constant('apart'),
      kind: fc.constant('apart' as const),
      personIds: members,
    }),
    fc.record({
      ...common,
      id: fc.constant('mostFree'),
      kind: fc.constant('mostFree' as const),
      personIds: members,
      most: fc.integer({ min: 0, max: 1 }),
    }),
    fc.record({
      ...common,
      id: fc.constant('budget'),
      kind: fc.constant('budget' as const),
      priceCents: fc.constantFrom(null, 0, 2),
      mostCents: fc.constantFrom(30_000, 100_000),
    }),
    fc.record({
      ...common,
      id: fc.constant('linear'),
      kind: fc.constant('linear' as const),
      terms: fc.array(
        fc.record({
          personId: fc.constantFrom(...ids.slice(0, peopleCount)),
          shiftIndex: fc.integer({ min: 0, max: shiftCount - 1 }),
          coefficient: fc.integer({ min: -2, max: 3 }),
        }),
        { minLength: 1, maxLength: 5 },
      ),
      least: fc.constantFrom(null, 1, 2),
      most: fc.constantFrom(null, 2, 3),
    }),
  );
};
