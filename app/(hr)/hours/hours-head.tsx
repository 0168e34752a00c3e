/** The hairline that sets a group of columns apart. */
export const groupStart = 'border-l border-l-rule!';

interface Column {
  readonly head: string;
  readonly isFigure: boolean;
  readonly isGroupStart?: true;
}

/** The columns in the order of `HoursRow` and `HoursFoot`. */
const columns: readonly Column[] = [
  { head: 'Person', isFigure: false },
  { head: 'Staff no.', isFigure: false },
  { head: 'Contract', isFigure: true },
  { head: 'Against contract', isFigure: false },
  { head: 'Planned', isFigure: true, isGroupStart: true },
  { head: 'Worked', isFigure: true },
  { head: 'Difference', isFigure: true },
  { head: 'Night', isFigure: true, isGroupStart: true },
  { head: 'Weekend', isFigure: true },
  { head: 'Holiday', isFigure: true },
  { head: 'Leave', isFigure: true, isGroupStart: true },
];
const group = `${groupStart} text-center! font-normal! text-ink2`;

/** The two header lines: groups, then columns. */
export function HoursHead() {
  return (
    <thead>
      <tr>
        <td colSpan={4} />
        <th scope="colgroup" colSpan={3} className={group}>
          Hours
        </th>
        <th scope="colgroup" colSpan={3} className={group}>
          of which earn extra pay
        </th>
        <td className={groupStart} />
      </tr>
      <tr>
        {columns.map(({ head, isFigure, isGroupStart }) => (
          <th
            key={head}
            scope="col"
            data-figure={isFigure || undefined}
            className={isGroupStart ? groupStart : ''}
          >
            {head}
          </th>
        ))}
      </tr>
    </thead>
  );
}
