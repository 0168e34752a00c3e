import { describe, expect, it } from 'vitest';
import { gridDays, groupBoard, visitorNames } from '@/app/_ui/people-grid/board-rows';
import { cellLabel } from '@/app/_ui/people-grid/cell-label';
import type { BoardPerson } from '@/modules/roster';
import { proofWith, smallBoard } from './board-fixture';

describe('the columns of the grid', () => {
  it('are three days before the period and then its own, with today marked', () => {
    const days = gridDays(smallBoard());
    expect(days.map(({ dayIndex }) => dayIndex)).toEqual([-3, -2, -1, 0, 1, 2, 3, 4, 5, 6]);
    expect(days[0]).toMatchObject({ date: '2027-01-29', isWeekend: false });
    expect(days.filter(({ isToday }) => isToday).map(({ date }) => date)).toEqual(['2027-02-03']);
  });
});

describe('the groups of the grid', () => {
  it('follow home skills in the team order and number people through', () => {
    const groups = groupBoard(smallBoard());
    expect(
      groups.map(({ name, rows }) => [
        name,
        ...rows.map(({ index, person }) => `${index} ${person.name}`),
      ]),
    ).toEqual([
      ['Vet', '0 Noor Haldane', '1 Pavel Dristan'],
      ['Nurse'],
      ['Ward', '2 Petra Vanholt'],
    ]);
  });

  it('tell who works in a skill but stands in another group', () => {
    const board = smallBoard();
    const nurses = groupBoard(board).find(({ name }) => name === 'Nurse');
    expect(visitorNames(board, nurses?.visits ?? [])).toEqual(['Petra Vanholt']);
  });

  it('put floors for anybody first and people without a known skill last', () => {
    const lanes = [{ skillId: null, slots: [] }];
    const [first] = smallBoard().people;
    const stray: readonly BoardPerson[] = first
      ? [{ ...first, id: 'per_stray', skillIds: [] }]
      : [];
    const groups = groupBoard(smallBoard({ lanes, people: stray, cells: [] }));
    expect(groups.map(({ name }) => name)).toEqual(['Anybody', 'Without a skill']);
  });
});

describe('what a cell is called', () => {
  const board = smallBoard({
    proof: proofWith([{ personId: 'per_noor', date: '2027-02-01' }]),
  });
  const rows = groupBoard(board).flatMap((group) => group.rows);
  const days = gridDays(board);

  function label(name: string, date: string): string {
    const row = rows.find(({ person }) => person.name === name);
    const day = days.find((one) => one.date === date);
    if (!row || !day) throw new Error(`No cell of ${name} on ${date}`);
    return cellLabel(board, row, day);
  }

  it('is day, shift with times, post and what is wrong', () => {
    expect(label('Noor Haldane', '2027-02-01')).toBe(
      'Monday 1 February, Early 7 to 15, vet, rule problem: Rest is 8 h; the rule is 11 h.',
    );
  });

  it('says when somebody works in a second skill', () => {
    expect(label('Petra Vanholt', '2027-02-02')).toBe(
      'Tuesday 2 February, Night 23 to 7, nurse, in a second skill',
    );
  });

  it('says off, and that a day lies before the period', () => {
    expect(label('Noor Haldane', '2027-02-04')).toBe('Thursday 4 February, off');
    expect(label('Pavel Dristan', '2027-01-31')).toBe(
      'Sunday 31 January, before this period, Night 23 to 7, vet',
    );
  });

  it('says leave', () => {
    const [noor] = rows;
    const [, , , day] = days;
    if (!noor || !day) throw new Error('The board has no first row');
    const leave = [{ startsOn: '2027-01-30', endsOn: '2027-02-02' }];
    const away = {
      ...noor,
      cells: new Map(),
      breaches: new Map(),
      person: { ...noor.person, leave },
    };
    expect(cellLabel(board, away, day)).toBe('Monday 1 February, on leave');
  });
});
