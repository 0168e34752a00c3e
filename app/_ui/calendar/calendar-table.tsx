import type { CalendarFrame } from '@/modules/roster';
import { type DateRange, formatDay } from '@/modules/units';
import { Table } from '../table';
import { blockTimes, endsNote } from './block-words';
import type { Block } from './blocks';

interface Props {
  readonly label: string;
  readonly blocks: readonly Block[];
  readonly range: DateRange;
  readonly holidays: CalendarFrame['holidays'];
  readonly audience: 'own' | 'team';
}

/** The same shifts as the calendar, one line each. */
export function CalendarTable({ label, blocks, range, holidays, audience }: Props) {
  const rows = blocks
    .filter(({ date }) => range.from <= date && date <= range.to)
    .flatMap((block) => block.entries.map((entry) => ({ block, entry })));
  if (rows.length === 0) return <p className="line-group py-4">No shifts on these days.</p>;
  return (
    <Table label={label}>
      <thead>
        <tr>
          <th scope="col">Date</th>
          <th scope="col">Shift</th>
          <th scope="col">Time</th>
          {audience === 'team' ? <th scope="col">Person</th> : null}
          <th scope="col">Post</th>
          <th scope="col">State</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ block, entry }) => (
          <tr key={entry.id}>
            <th scope="row" className="whitespace-nowrap">
              {formatDay(block.date)}
              <Holiday name={holidays.find(({ date }) => date === block.date)?.name} />
            </th>
            <td>{block.kindName}</td>
            <td className="whitespace-nowrap">
              {[blockTimes(block), endsNote(block)].filter(Boolean).join(', ')}
            </td>
            {audience === 'team' ? <td>{entry.personName}</td> : null}
            <td>{entry.skillName}</td>
            <td>{entry.isPublished ? 'published' : 'draft'}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

const Holiday = ({ name }: { readonly name: string | undefined }) =>
  name ? <span className="font-normal text-ink2">, {name}</span> : null;
