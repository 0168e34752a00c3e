import type { OrganisationId, TeamId, Zone } from '../units';

/** What other modules and screens need to know of a team. */
export interface TeamInfo {
  readonly id: TeamId;
  readonly organisationId: OrganisationId;
  readonly organisationName: string;
  readonly name: string;
  /** IANA zone: every local minute of the team is read in it. */
  readonly zone: Zone;
  /** Where a drawn day begins, e.g. 420 for 07:00. */
  readonly dayStartsAtMinute: number;
  readonly periodDays: number;
  /** Days of notice promised between publishing and the first shift. */
  readonly noticeDays: number;
  /** ISO 4217. */
  readonly currency: string;
  readonly locale: string;
}
