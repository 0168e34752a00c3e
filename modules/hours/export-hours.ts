import { inTransaction } from '../../db/client';
import type { Actor } from '../access';
import { recordAudit } from '../access/server';
import type { TextFile } from '../roster/server';
import { type DateRange, type Outcome, ok, type TeamId } from '../units';
import { readHours } from './read-hours';
import { writeHoursCsv } from './write-csv';

/** The hours of a range as a CSV file; who took it is kept on record. */
export function exportHoursCsv(actor: Actor, teamId: TeamId, range: DateRange): Outcome<TextFile> {
  const hours = readHours(actor, teamId, range);
  if (!hours.ok) return hours;
  const { teamName, from, to, today, people } = hours.value;
  const text = writeHoursCsv(people);
  inTransaction(() => {
    recordAudit({ actor, teamId, action: 'hours.export', subjectId: teamId, detail: { from, to } });
  });
  // Nothing is locked yet: the name says that the figures may still change.
  const fileName = `hours-${plain(teamName)}-${from}-to-${to}-open-as-of-${today}.csv`;
  return ok({ fileName, text });
}

/** Letters, figures and hyphens of ASCII: safe in every header and file system. */
const plain = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9 -]/g, '')
    .trim()
    .replace(/\s+/g, '-');
