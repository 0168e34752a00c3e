import type { CSSProperties } from 'react';
import { bricks, paper, small } from './paper';
import type { DayFacts, WeekFacts } from './roster-facts';

const weekdays = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
const cell: CSSProperties = { padding: 1, verticalAlign: 'top', fontSize: 12, lineHeight: 1.3 };
const brick: CSSProperties = {
  border: `1px solid ${paper.ink}`,
  fontSize: 14,
  fontWeight: 'bold',
  textAlign: 'center',
  padding: '4px 0',
};

interface Props {
  readonly weeks: readonly WeekFacts[];
  readonly legend: readonly string[];
}

/** The weeks of the period with the date, the shift's letter and the holiday in each day's cell. */
export function WeeksGrid({ weeks, legend }: Props) {
  return (
    <>
      <table width="100%" cellPadding={0} cellSpacing={0} style={{ tableLayout: 'fixed' }}>
        <thead>
          <tr>
            {weekdays.map((name) => (
              <th key={name} scope="col" style={{ ...small, fontWeight: 'normal' }}>
                {name}
              </th>
            ))}
            <th
              scope="col"
              style={{ ...small, fontWeight: 'normal', textAlign: 'right', width: 40 }}
            >
              Hours
            </th>
          </tr>
        </thead>
        <tbody>
          {weeks.map(({ days, hours }) => (
            <tr key={days[0]?.date}>
              {days.map((day) => (
                <DayCell key={day.date} day={day} />
              ))}
              <td style={{ ...cell, fontSize: 13, textAlign: 'right', whiteSpace: 'nowrap' }}>
                <br />
                {hours}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p style={{ ...small, margin: '8px 0 0' }}>
        {legend.join(', ')}. A shift stands on the day it starts.
      </p>
    </>
  );
}

function DayCell({ day }: { readonly day: DayFacts }) {
  if (!day.isInPeriod) return <td style={cell} />;
  return (
    <td style={{ ...cell, ...(day.isWeekend ? { backgroundColor: paper.recess } : {}) }}>
      <div style={{ color: paper.ink2 }}>{day.label}</div>
      {day.shift ? (
        <div style={{ ...brick, ...bricks[day.shift.tone] }}>{day.shift.letter}</div>
      ) : (
        <div style={{ fontSize: 14, padding: '5px 0' }}>&nbsp;</div>
      )}
      {day.holidayName ? <div style={{ overflowWrap: 'anywhere' }}>{day.holidayName}</div> : null}
    </td>
  );
}
