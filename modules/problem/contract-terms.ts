import { type Contract, findContract, type Person } from '../people';
import { addDays, type LocalDate } from '../units';

/** What a person's contracts give in one period. */
export interface ContractTerms {
  /** Pay, kind of pay and limits: the contract in force on the first day that has one. */
  readonly contract: Contract;
  readonly contractMinutes: number;
  readonly minimumMinutes: number;
  readonly maximumMinutes: number;
  /** Dates of the period, and the day after it, on which no contract is in force. */
  readonly datesWithout: readonly LocalDate[];
  readonly notes: readonly string[];
}

/**
 * Reads the terms of a period off dated contracts; null without any. Contract minutes: a seventh of
 * the weekly minutes for each date under contract, rounded once. A contract that changes within the
 * period gives its hours date by date, but pay and limits stay those of the first, and a note says so.
 */
export function readTerms(person: Person, dates: readonly LocalDate[]): ContractTerms | null {
  const contracts = dates.map((date) => findContract(person, date));
  const [contract] = contracts.filter((held) => held !== null);
  const last = dates.at(-1);
  if (!contract || last === undefined) return null;
  const weekly = contracts.reduce((sum, held) => sum + (held?.weeklyMinutes ?? 0), 0);
  const contractMinutes = Math.round(weekly / 7);
  const changed = contracts.find((held) => held !== null && held !== contract);
  return {
    contract,
    contractMinutes,
    minimumMinutes: Math.max(0, contractMinutes - contract.underMinutes),
    maximumMinutes: contractMinutes + contract.overtimeMinutes,
    datesWithout: [...dates, addDays(last, 1)].filter((date) => !findContract(person, date)),
    notes: changed
      ? [
          `${person.name}: the contract changes on ${changed.startsOn}; pay and limits of the first are used for the whole period.`,
        ]
      : [],
  };
}
