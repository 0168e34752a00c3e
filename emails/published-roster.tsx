import { MailFrame } from './frame';
import { heading, paper, paragraph } from './paper';
import { publishedRosterText } from './published-roster-text';
import { type MailContent, renderDocument } from './render';
import {
  holidayLines,
  legendOf,
  type PublishedRosterProps,
  sentencesOf,
  shiftFacts,
  weeksOf,
} from './roster-facts';
import { ShiftList } from './shift-list';
import { WeeksGrid } from './weeks-grid';

/** The mail that tells a person their own shifts of a published version, in HTML and plain text. */
export async function publishedRosterMail(props: PublishedRosterProps): Promise<MailContent> {
  return {
    subject: sentencesOf(props).subject,
    html: await renderDocument(<PublishedRoster {...props} />),
    text: publishedRosterText(props),
  };
}

function PublishedRoster(props: PublishedRosterProps) {
  const words = sentencesOf(props);
  const holidays = holidayLines(props);
  const facts = props.shifts.map((shift) => shiftFacts(shift, props.holidays));
  return (
    <MailFrame title={words.title} organisationName={props.organisationName} footer={words.footer}>
      <h1 style={{ margin: '0 0 14px', fontSize: 25, lineHeight: 1.2 }}>{words.title}</h1>
      <p style={paragraph}>
        {words.greeting}
        <br />
        {words.summary}
      </p>
      {facts.length ? <WeeksGrid weeks={weeksOf(props)} legend={legendOf(props)} /> : null}
      {holidays.length ? (
        <p style={{ ...paragraph, marginTop: 8 }}>Holidays: {holidays.join('; ')}</p>
      ) : null}
      {facts.length ? <h2 style={heading}>Your shifts, one by one</h2> : null}
      {facts.length ? <ShiftList shifts={facts} /> : null}
      <RemovedShifts {...props} />
      <ShiftsButton url={props.shiftsUrl} />
      <p style={paragraph}>
        <strong>{words.confirm}</strong> {words.meaning}
      </p>
      {words.calendar ? <p style={paragraph}>{words.calendar}</p> : null}
    </MailFrame>
  );
}

function RemovedShifts({ removedShifts, holidays }: PublishedRosterProps) {
  if (!removedShifts.length) return null;
  return (
    <>
      <h2 style={heading}>No longer yours</h2>
      <ShiftList shifts={removedShifts.map((shift) => shiftFacts(shift, holidays))} />
    </>
  );
}

function ShiftsButton({ url }: { readonly url: string }) {
  return (
    <table role="presentation" cellPadding={0} cellSpacing={0} style={{ margin: '22px 0 16px' }}>
      <tbody>
        <tr>
          <td style={{ backgroundColor: paper.act }}>
            <a
              href={url}
              style={{
                display: 'inline-block',
                padding: '13px 24px',
                color: paper.sheet,
                fontSize: 16,
                fontWeight: 'bold',
                textDecoration: 'none',
              }}
            >
              See and confirm my shifts
            </a>
          </td>
        </tr>
      </tbody>
    </table>
  );
}
