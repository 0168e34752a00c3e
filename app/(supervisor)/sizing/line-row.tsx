import { useFormContext, useWatch } from 'react-hook-form';
import { Button } from '@/app/_ui/button';
import { clockRange } from '@/app/_ui/clock';
import type { ShiftKind } from '@/modules/coverage';
import type { Skill } from '@/modules/people';
import { weekdayNames } from '@/modules/units';
import { CellChoices, CellInput, CellSelect } from './cell';
import type { LineForm, SizingForm } from './sizing-form';

interface Props {
  readonly index: number;
  readonly kinds: readonly ShiftKind[];
  readonly skills: readonly Skill[];
  readonly onRemove: () => void;
}

/** The weekdays on which a run of days may begin. */
export const firstDays = weekdayNames.map((label, weekday) => ({ value: String(weekday), label }));

/** One line of the table: a pattern of work, every cell a field of its own. */
export function LineRow({ index, kinds, skills, onRemove }: Props) {
  const { line, cell } = useLineCells(index);
  return (
    <tr>
      <th scope="row">
        <CellInput {...cell('name', 'Pattern')} maxLength={60} className="w-36" />
      </th>
      <td>
        <CellSelect {...cell('shiftKindId', 'Shift kind')} className="w-48">
          {kinds.map((kind) => (
            <option key={kind.id} value={kind.id}>
              {kind.name} {clockRange(kind.startMinute, kind.endMinute)}
            </option>
          ))}
        </CellSelect>
      </td>
      <td>
        <CellSelect {...cell('skillId', 'Skill')} className="w-28">
          <option value="">None</option>
          {skills.map((skill) => (
            <option key={skill.id} value={skill.id}>
              {skill.name}
            </option>
          ))}
        </CellSelect>
      </td>
      <NumberCells cell={cell} />
      <td>
        <Button look="quiet" onClick={onRemove} aria-label={`Remove ${line}`}>
          Remove
        </Button>
      </td>
    </tr>
  );
}

/** Days, pay and limits of a line. */
function NumberCells({ cell }: { readonly cell: LineCell }) {
  const { label, error, ...days } = cell('startWeekdays', 'First day of the run');
  const count = { inputMode: 'numeric' } as const;
  const amount = { inputMode: 'decimal', className: 'w-20' } as const;
  return (
    <>
      <td>
        <CellInput {...cell('daysOn', 'Days on')} {...count} className="w-12" />
      </td>
      <td>
        <CellChoices label={label} error={error} choices={firstDays} field={days} />
      </td>
      <td>
        <CellInput {...cell('weekdayCents', 'Pay of a weekday')} {...amount} />
      </td>
      <td>
        <CellInput {...cell('saturdayCents', 'Pay of a Saturday')} {...amount} />
      </td>
      <td>
        <CellInput {...cell('sundayCents', 'Pay of a Sunday')} {...amount} />
      </td>
      <td>
        <CellInput {...cell('extraDayCents', 'Pay of an extra day')} {...amount} />
      </td>
      <td>
        <CellInput {...cell('mostPeople', 'Most people')} {...count} className="w-16" />
      </td>
      <td>
        <CellInput {...cell('mostPercent', 'Most percent')} {...count} className="w-14" />
      </td>
    </>
  );
}

type LineCell = ReturnType<typeof useLineCells>['cell'];

/** The name of a line for screen readers, and what a cell of it needs: registration, label and error. */
function useLineCells(index: number) {
  const { register, formState } = useFormContext<SizingForm>();
  const errors = formState.errors.lines?.[index];
  const name = useWatch<SizingForm, `lines.${number}.name`>({ name: `lines.${index}.name` });
  const line = name || `pattern ${index + 1}`;
  const cell = (field: Exclude<keyof LineForm, 'id'>, column: string) => ({
    ...register(`lines.${index}.${field}`),
    label: `${column}, ${line}`,
    error: errors?.[field]?.message,
  });
  return { line, cell };
}
