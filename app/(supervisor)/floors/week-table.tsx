import type { CoverStep } from '@/app/_ui/floor-graphic/cover-steps';
import { Table } from '@/app/_ui/table';
import { weekLines } from './normal-week';

interface Props {
  readonly steps: readonly CoverStep[];
  readonly dayStartsAtMinute: number;
}

/** The numbers of the drawing; days that are alike share their lines. */
export function WeekTable({ steps, dayStartsAtMinute }: Props) {
  return (
    <div className="max-w-[28rem] py-3">
      <Table label="People needed in a normal week" maxHeight="18rem">
        <thead>
          <tr>
            <th scope="col">Days</th>
            <th scope="col">Time</th>
            <th scope="col" data-figure>
              People
            </th>
          </tr>
        </thead>
        <tbody>
          {weekLines(steps, dayStartsAtMinute).map(({ days, times, people }) => (
            <tr key={`${days} ${times}`}>
              <th scope="row">{days}</th>
              <td className="figures">{times}</td>
              <td data-figure>{people}</td>
            </tr>
          ))}
        </tbody>
      </Table>
    </div>
  );
}
