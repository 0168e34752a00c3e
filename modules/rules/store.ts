import { eq } from 'drizzle-orm';
import { db } from '../../db/client';
import { organisations, teams } from '../../db/schema';
import type { OrganisationId, TeamId } from '../units';
import type { PayRules, RuleSet } from './rule-set';

/** The limits of a team; throws for an unknown team. */
export function readRuleSet(teamId: TeamId): RuleSet {
  const row = db()
    .select({
      restMinutes: teams.restMinutes,
      longestRunDays: teams.longestRunDays,
      longestRunNights: teams.longestRunNights,
      nightsPerPeriod: teams.nightsPerPeriod,
      weekendsPerPeriod: teams.weekendsPerPeriod,
      weekendCountsFridayNight: teams.weekendCountsFridayNight,
    })
    .from(teams)
    .where(eq(teams.id, teamId))
    .get();
  if (!row) throw new Error(`No team ${teamId}`);
  return row;
}

/** The premiums of an organisation; throws for an unknown one. */
export function readPayRules(organisationId: OrganisationId): PayRules {
  const row = db()
    .select({
      nightStartMinute: organisations.nightStartMinute,
      nightEndMinute: organisations.nightEndMinute,
      nightPercent: organisations.nightPercent,
      weekendPercent: organisations.weekendPercent,
      holidayPercent: organisations.holidayPercent,
      overtimePercent: organisations.overtimePercent,
    })
    .from(organisations)
    .where(eq(organisations.id, organisationId))
    .get();
  if (!row) throw new Error(`No organisation ${organisationId}`);
  return row;
}
