import { shortDay } from '../modules/mail';
import {
  holidayLines,
  type PublishedRosterProps,
  sentencesOf,
  shiftFacts,
  weeksOf,
} from './roster-facts';

/** The plain-text twin of the mail: the same facts, for programs and people that want no HTML. */
export function publishedRosterText(props: PublishedRosterProps): string {
  const { title, greeting, summary, calendar, confirm, meaning, footer } = sentencesOf(props);
  const holidays = holidayLines(props);
  const blocks = [
    `Floorwright, ${props.organisationName}`,
    title,
    `${greeting}\n${summary}`,
    ...weekBlocks(props),
    ...(props.removedShifts.length ? [removedBlock(props)] : []),
    ...(holidays.length ? [`Holidays: ${holidays.join('; ')}`] : []),
    ...(calendar ? [calendar] : []),
    `See and confirm my shifts:\n${props.shiftsUrl}`,
    `${confirm} ${meaning}`,
    `--\n${footer}`,
  ];
  return `${blocks.join('\n\n')}\n`;
}

function weekBlocks(props: PublishedRosterProps): string[] {
  return weeksOf(props).flatMap(({ days, hours }) => {
    const worked = days.flatMap(({ shift }) => (shift ? [shiftFacts(shift, props.holidays)] : []));
    const [first] = worked;
    if (!first) return [];
    const lines = worked.map(({ day, name, time, post, hours: paid, notes }) =>
      [`  ${day}: ${name} ${time}, ${post}, ${paid}`, ...notes].join('. '),
    );
    const monday = shortDay(days[0]?.date ?? first.date);
    return [[`Week of ${monday}: ${hours}`, ...lines].join('\n')];
  });
}

function removedBlock(props: PublishedRosterProps): string {
  const lines = props.removedShifts
    .map((shift) => shiftFacts(shift, props.holidays))
    .map(({ day, name, time }) => `  ${day}: ${name} ${time}`);
  return ['No longer yours:', ...lines].join('\n');
}
