import { Button } from '@/app/_ui/button';
import { Table } from '@/app/_ui/table';
import type { FakeMailSummary } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { sentWords, subjectWords } from './mail-words';

interface Props {
  readonly mails: readonly FakeMailSummary[];
  readonly zone: Zone;
  readonly openName: string | null;
  readonly onOpen: (name: string) => void;
}

/** To whom, about what, when; each opens in full. On phones the subject stands below the address. */
export function MailTable({ mails, zone, openName, onOpen }: Props) {
  return (
    <Table label="Mails kept" maxHeight="calc(100dvh - 7rem)" holdsFirstColumn={false}>
      <thead>
        <tr>
          <th scope="col">To</th>
          <th scope="col" className="phone:hidden">
            Subject
          </th>
          <th scope="col">Sent</th>
        </tr>
      </thead>
      <tbody>
        {mails.map(({ name, to, subject, sentAtUtc }) => (
          <tr key={name} className={name === openName ? '*:bg-act-wash' : ''}>
            <th scope="row">
              <Button
                look="quiet"
                id={`mail-${name}`}
                aria-pressed={name === openName}
                onClick={() => onOpen(name)}
                className="text-left desk:whitespace-nowrap phone:[overflow-wrap:anywhere]"
              >
                {to}
              </Button>
              <span className="block font-normal desk:hidden">{subjectWords(subject)}</span>
            </th>
            <td className="phone:hidden">{subjectWords(subject)}</td>
            <td className="desk:whitespace-nowrap">{sentWords(sentAtUtc, zone)}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
