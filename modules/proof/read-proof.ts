import type { Proof, ProvenPerson } from './proof';

/** What the first version of the program did not look at; its problems had none of it. */
const unknownAtFirst = {
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
} satisfies Partial<Proof>;

type AddedField = keyof typeof unknownAtFirst | 'shortageByPriority';

/** A proof as it may have been stored by an earlier version of the program. */
export type StoredProof = Omit<Proof, AddedField | 'people'> &
  Partial<Pick<Proof, AddedField>> & {
    readonly people: readonly (Omit<ProvenPerson, 'refusedWishes'> & Partial<ProvenPerson>)[];
  };

/** A stored proof as one of today. All firm floors of the first version had the first priority. */
export const readProof = (stored: StoredProof): Proof => ({
  ...unknownAtFirst,
  shortageByPriority: [{ priority: 1, minutes: stored.shortageMinutes }],
  ...stored,
  people: stored.people.map((person) => ({ refusedWishes: 0, ...person })),
});
