import { Button } from '@/app/_ui/button';
import { Table } from '@/app/_ui/table';
import type { FakeMailSummary } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { sentWords } from './mail-words';

interface Props {
  readonly mails: readonly FakeMailSummary[];
  readonly zone: Zone;
  readonly openName: string | null;
  readonly onOpen: (name: string) => void;
}

/** To whom, about what, when; each opens in full. */
export function MailTable({ mails, zone, openName, onOpen }: Props) {
  return (
    <Table label="Mails kept" maxHeight="44rem" holdsFirstColumn={false}>
      <thead>
        <tr>
          <th scope="col">Subject</th>
          <th scope="col">To</th>
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
                className="text-left"
              >
                {subject || 'No subject'}
              </Button>
            </th>
            <td>{to}</td>
            <td className="whitespace-nowrap">{sentWords(sentAtUtc, zone)}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
