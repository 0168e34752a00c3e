import type { LeaveId, LocalDate, PersonId, SkillId, TeamId, UserId } from '../units';

/** A skill people hold and floors ask for, e.g. Nurse. */
export interface Skill {
  readonly id: SkillId;
  readonly teamId: TeamId;
  readonly name: string;
  /** Order in lists and drawings. */
  readonly position: number;
}

/** A skill of one person; it counts on dates before `expiresOn`. */
export interface HeldSkill {
  readonly skillId: SkillId;
  /** 0 is the home skill: the group in which the person stands on the roster. */
  readonly position: number;
  readonly expiresOn: LocalDate | null;
}

/** What a person and the employer agreed on, valid from `startsOn` to `endsOn` (null: open), both included. */
export interface Contract {
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate | null;
  readonly weeklyMinutes: number;
  /** Hours of a period may fall short of, or exceed, the contract by this much; both 0: exact. */
  readonly underMinutes: number;
  readonly overtimeMinutes: number;
  readonly payCentsPerHour: number;
  /** contract: contract hours are paid in any case. hours: worked hours and credited leave are paid. */
  readonly paidBy: 'contract' | 'hours';
  readonly mayWorkNights: boolean;
}

export interface Person {
  readonly id: PersonId;
  readonly teamId: TeamId;
  readonly userId: UserId | null;
  readonly name: string;
  readonly email: string;
  readonly staffNumber: string;
  readonly isActive: boolean;
  /** Home skill first. */
  readonly skills: readonly HeldSkill[];
  readonly contracts: readonly Contract[];
}

/** Approved time away: whole local days, both included. */
export interface Leave {
  readonly id: LeaveId;
  readonly personId: PersonId;
  readonly startsOn: LocalDate;
  readonly endsOn: LocalDate;
  /** Minutes that count as worked towards the contract, stated when the leave is granted. */
  readonly creditMinutes: number;
}

/** The contract that holds on a date, if any. */
export function findContract(person: Person, date: LocalDate): Contract | null {
  return (
    person.contracts.find(
      (contract) =>
        contract.startsOn <= date && (contract.endsOn === null || date <= contract.endsOn),
    ) ?? null
  );
}
