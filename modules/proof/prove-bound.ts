import type { BoundRecord, Problem } from '../problem';
import { cheapestLine } from './bound/cheapest-line';
import { coverGroups } from './bound/cover-groups';
import { findRecordFault } from './bound/find-record-fault';
import { priceCover } from './bound/price-cover';
import { noUnitPrices, priceSpreads } from './bound/price-spreads';
import { priceTeamRules } from './bound/price-team-rules';
import { readCoverWorth } from './bound/worth';
import type { Proof } from './proof';

/** What a record proves: whole cents that no roster can cost less than, or why it proves nothing. */
export type BoundProof =
  | { readonly kind: 'bound'; readonly boundCents: number }
  | { readonly kind: 'refused'; readonly sentence: string };

/**
 * Reckons a lower bound of the cost anew from the problem and the multipliers of a record alone. It holds
 * for every roster that breaks no rule, firm rules of the team included, and is short and in surplus on
 * firm floors and ceilings by at most the given figures. Lagrangian relaxation (Geoffrion, Mathematical
 * Programming Study 2, 1974, 82-114): what joins people is priced by its multiplier, and then every person
 * takes the cheapest line and every slice of time the number of people that suits it best.
 */
export function proveBound(
  problem: Problem,
  record: BoundRecord,
  figures: Pick<Proof, 'shortageByPriority' | 'surplusMinutes'>,
): BoundProof {
  const groups = coverGroups(problem, record);
  const fault = findRecordFault(problem, record, groups);
  if (fault) return { kind: 'refused', sentence: fault };
  const cover = priceCover(problem, record, groups);
  const teamRules = priceTeamRules(problem, record);
  if (teamRules.impossibleRule !== null) {
    return refused(`No roster can keep the rule ${teamRules.impossibleRule}.`);
  }
  const spreads = priceSpreads(problem, record);
  const allowed = allowedCents(record, figures);
  const worth = readCoverWorth(problem, record, groups);
  let [cents, magnitude] = [
    cover.cents + teamRules.cents + spreads.cents - allowed,
    cover.magnitude + teamRules.magnitude + spreads.magnitude + allowed,
  ];
  for (const person of problem.people) {
    const line = cheapestLine(problem, person, {
      cover: worth,
      teamWorth: teamRules.worthOf.get(person.id),
      payWorth: teamRules.payWorth,
      units: spreads.unitPricesOf.get(person.id) ?? noUnitPrices,
    });
    if (line === null) return refused(`${person.name} has no lawful line at all.`);
    cents += line;
    magnitude += Math.abs(line);
  }
  return { kind: 'bound', boundCents: wholeCents(cents - cover.roundedSums / 2, magnitude) };
}

const refused = (sentence: string): BoundProof => ({ kind: 'refused', sentence });

/** What the multipliers charge for the shortage and surplus that the rosters in question may have. */
const allowedCents = (
  record: BoundRecord,
  { shortageByPriority, surplusMinutes }: Pick<Proof, 'shortageByPriority' | 'surplusMinutes'>,
): number =>
  record.shortage.reduce((sum, { priority, centsPerMinute }) => {
    const minutes = shortageByPriority.find((one) => one.priority === priority)?.minutes ?? 0;
    return sum + centsPerMinute * minutes;
  }, record.surplusCentsPerMinute * surplusMinutes);

/**
 * Every roster costs whole cents and never less than none, so the bound may be rounded up, once the error
 * that the arithmetic can have made is taken off: a few units in the last place for each of some thousand
 * terms.
 */
const wholeCents = (cents: number, magnitude: number): number =>
  Math.max(0, Math.ceil(cents - 1e-3 - magnitude * 1e-12));
