import type { CSSProperties } from 'react';
import { paper, small } from './paper';
import type { ShiftFacts } from './roster-facts';

const head: CSSProperties = {
  ...small,
  fontWeight: 'normal',
  textAlign: 'left',
  padding: '4px 8px 4px 0',
  borderBottom: `2px solid ${paper.ink}`,
};
const cell: CSSProperties = {
  padding: '7px 8px 7px 0',
  borderBottom: `1px solid ${paper.rule}`,
  fontSize: 14,
  lineHeight: 1.4,
  verticalAlign: 'top',
};
const right: CSSProperties = { textAlign: 'right', whiteSpace: 'nowrap', paddingRight: 0 };

/** Every shift with its date, times and post in words. */
export function ShiftList({ shifts }: { readonly shifts: readonly ShiftFacts[] }) {
  return (
    <table width="100%" cellPadding={0} cellSpacing={0}>
      <thead>
        <tr>
          <th scope="col" style={head}>
            Date
          </th>
          <th scope="col" style={head}>
            Shift and post
          </th>
          <th scope="col" style={{ ...head, ...right }}>
            Hours
          </th>
        </tr>
      </thead>
      <tbody>
        {shifts.map(({ date, day, name, time, post, notes, hours }) => (
          <tr key={date}>
            <td style={{ ...cell, whiteSpace: 'nowrap' }}>{day}</td>
            <td style={cell}>
              <strong>{name}</strong> {time}
              <br />
              <span style={small}>{[post, ...notes].join('. ')}</span>
            </td>
            <td style={{ ...cell, ...right }}>{hours}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
