import { Button } from '@/app/_ui/button';
import { clockRange, hours } from '@/app/_ui/clock';
import { KindMark } from '@/app/_ui/kind-mark';
import { Table } from '@/app/_ui/table';
import { type Coverage, type ShiftKind, toneOf } from '@/modules/coverage';
import { DayLine, DayLineHead } from './day-line';
import { paidMinutes, sayPosts } from './kind-words';

interface Props {
  readonly coverage: Coverage;
  readonly onChange: (kind: ShiftKind) => void;
  readonly onRetire: (kind: ShiftKind) => void;
}

/** Every shift kind in use, with a brick at its true hours. */
export function KindsTable({ coverage, onChange, onRetire }: Props) {
  const { kinds, skills, team } = coverage;
  return (
    <Table label="Shift kinds">
      <thead>
        <tr>
          <th scope="col">Shift kind</th>
          <th scope="col" className="w-2/5">
            <span className="sr-only">Hours of the day</span>
            <DayLineHead dayStartsAtMinute={team.dayStartsAtMinute} />
          </th>
          <th scope="col">Times</th>
          <th scope="col" data-figure>
            Unpaid break
          </th>
          <th scope="col" data-figure>
            Paid
          </th>
          <th scope="col">Skills</th>
          <th scope="col">Night</th>
          <th scope="col">
            <span className="sr-only">Change or retire</span>
          </th>
        </tr>
      </thead>
      <tbody className="[&_td]:whitespace-nowrap [&>tr>*]:align-middle!">
        {kinds.map((kind) => (
          <tr key={kind.id}>
            <th scope="row">
              <span className="flex items-center gap-2">
                <KindMark kind={kind} tone={toneOf(kind, kinds)} />
                {kind.name}
              </span>
            </th>
            <td>
              <DayLine
                kind={kind}
                tone={toneOf(kind, kinds)}
                dayStartsAtMinute={team.dayStartsAtMinute}
              />
            </td>
            <td className="figures">{clockRange(kind.startMinute, kind.endMinute)}</td>
            <td data-figure>{kind.unpaidBreakMinutes} min</td>
            <td data-figure>{hours(paidMinutes(kind))}</td>
            <td>{sayPosts(kind, skills)}</td>
            <td>{kind.isNight ? 'Night' : <span className="text-ink3">no</span>}</td>
            <td>
              <span className="flex justify-end gap-4">
                <Button
                  look="quiet"
                  aria-label={`Change ${kind.name}`}
                  onClick={() => onChange(kind)}
                >
                  Change…
                </Button>
                <Button
                  look="quiet"
                  aria-label={`Retire ${kind.name}`}
                  onClick={() => onRetire(kind)}
                >
                  Retire…
                </Button>
              </span>
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
