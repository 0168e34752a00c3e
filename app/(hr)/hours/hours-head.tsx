/** The two header lines: groups, then columns. Its order is that of `HoursRow` and `HoursFoot`. */
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
        <th scope="col">Person</th>
        <th scope="col">Staff no.</th>
        <th scope="col" data-figure>
          Contract
        </th>
        <th scope="col">Against contract</th>
        <th scope="col" data-figure className={groupStart}>
          Planned
        </th>
        <th scope="col" data-figure>
          Worked
        </th>
        <th scope="col" data-figure>
          Difference
        </th>
        <th scope="col" data-figure className={groupStart}>
          Night
        </th>
        <th scope="col" data-figure>
          Weekend
        </th>
        <th scope="col" data-figure>
          Holiday
        </th>
        <th scope="col" data-figure className={groupStart}>
          Leave
        </th>
      </tr>
    </thead>
  );
}

/** The hairline that sets a group of columns apart. */
export const groupStart = 'border-l border-l-rule!';
const group = `${groupStart} text-center! font-normal! text-ink2`;
