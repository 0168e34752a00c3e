'use client';

import type { Board } from '@/modules/roster';
import { clockRange, hours, longDay } from '../clock';
import type { GridDay, PersonRow } from './board-rows';
import { Brick } from './brick';
import { isOnLeave } from './cell-label';
import { restAround } from './rest-around';

interface Props {
  readonly board: Board;
  readonly row: PersonRow | undefined;
  readonly day: GridDay | undefined;
}

/** What is known of the selected cell. It follows the focus and never takes it. */
export function Inspector({ board, row, day }: Props) {
  return (
    <section
      aria-label="Inspector"
      data-print="off"
      className="w-full max-w-[34rem] shrink-0 border-t-3 border-ink pt-3 wide:w-[17rem] wide:border-t-0 wide:border-l-[1.5px] wide:pt-0 wide:pl-4"
    >
      {row && day ? (
        <>
          <h2 className="text-head font-[660]">{row.person.name}</h2>
          <p className="text-second text-ink2">
            {skillNames(board, row).join(', ')}
            {row.person.mayWorkNights ? '' : ', no nights'}
          </p>
          <ShiftFacts board={board} row={row} day={day} />
          <PersonFacts row={row} />
        </>
      ) : (
        <p className="text-second text-ink2">
          Choose a day of a person to see times, post, rest and hours. Arrow keys move from day to
          day, Page Up and Page Down by a week.
        </p>
      )}
    </section>
  );
}

interface FactsProps {
  readonly board: Board;
  readonly row: PersonRow;
  readonly day: GridDay;
}

function ShiftFacts({ board, row, day }: FactsProps) {
  const cell = row.cells.get(day.date);
  const kind = board.kinds.find(({ id }) => id === cell?.kindId);
  const post = board.skills.find(({ id }) => id === cell?.postSkillId)?.name ?? '';
  const rest = cell ? restAround(row.cells.values(), cell) : null;
  const breaches = row.breaches.get(day.date) ?? [];
  return (
    <div className="mt-3 border-t-[1.5px] border-ink pt-2">
      <p className="text-body font-[660]">
        {longDay(day.date)}
        {day.holidayName ? (
          <span className="font-normal text-ink2">, {day.holidayName}</span>
        ) : null}
      </p>
      {cell && kind ? (
        <>
          <p className="mt-1 flex items-center gap-2">
            <Brick kind={kind} letter={kind.letter} className="min-h-6 min-w-5 px-1" />
            <span>
              {kind.name}{' '}
              <span className="figures text-ink2">
                {clockRange(kind.startMinute, kind.endMinute)}
              </span>
            </span>
          </p>
          <Facts
            facts={[
              [
                'Post',
                cell.postSkillId === row.person.skillIds[0] ? post : `${post}, second skill`,
              ],
              ['Paid', hours(cell.paidMinutes)],
              ['Rest before', restText(rest?.beforeMinutes)],
              ['Rest after', restText(rest?.afterMinutes)],
              ...(cell.isPinned ? [['Pinned', 'a run keeps it'] as const] : []),
            ]}
          />
        </>
      ) : (
        <p className="text-ink2">{isOnLeave(row, day) ? 'on leave' : 'off'}</p>
      )}
      {breaches.map((sentence) => (
        <p key={sentence} className="mt-2 border-[1.25px] border-short px-2 py-1 text-second">
          <strong className="font-[660] text-short">! Rule problem. </strong>
          {sentence}
        </p>
      ))}
    </div>
  );
}

function PersonFacts({ row: { person } }: { readonly row: PersonRow }) {
  return (
    <div className="mt-3 border-t border-rule pt-2">
      <h3 className="text-second font-[660]">Nights, weekends and hours of the period</h3>
      <Facts
        facts={[
          ['Nights', String(person.nights)],
          ['Weekends worked', String(person.weekends)],
          ['Planned', hours(person.plannedMinutes)],
          ...(person.creditMinutes > 0
            ? [['Leave counted', hours(person.creditMinutes)] as const]
            : []),
          ['Contract', hours(person.contractMinutes)],
          ['Overtime', hours(person.overtimeMinutes)],
        ]}
      />
    </div>
  );
}

function Facts({ facts }: { readonly facts: readonly (readonly [string, string])[] }) {
  return (
    <dl className="mt-1 text-second">
      {facts.map(([word, value]) => (
        <div key={word} className="flex justify-between gap-3 py-0.5">
          <dt className="text-ink2">{word}</dt>
          <dd className="text-right font-[640] tabular-nums">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

const restText = (minutes: number | null | undefined): string =>
  minutes === null || minutes === undefined ? 'no other shift near' : hours(minutes);

const skillNames = (board: Board, { person }: PersonRow): string[] =>
  person.skillIds.flatMap((id) => board.skills.find((skill) => skill.id === id)?.name ?? []);
