import { describe, expect, it } from 'vitest';
import { coverSteps, dailySteps, stretchesOf } from '@/app/_ui/floor-graphic/cover-steps';
import { columnEdges } from '@/app/_ui/floor-graphic/day-axis';
import { at, lane, nurse, vet, week } from './cover-fixture';

describe('cover of several lanes', () => {
  it('never nets skills: a spare nurse does not hide a missing vet', () => {
    const [step] = coverSteps([lane(vet, [0, 60, 1, 0]), lane(nurse, [0, 60, 1, 2])]);
    expect(step).toMatchObject({ need: 2, hold: 1, short: 1, spare: 1 });
  });

  it('cuts where any lane changes and joins equal neighbours', () => {
    const steps = coverSteps([
      lane(vet, [0, 60, 1, 1], [60, 120, 1, 1]),
      lane(nurse, [0, 90, 2, 2], [90, 120, 1, 1]),
    ]);
    expect(steps.map(({ startMinute, endMinute, need }) => [startMinute, endMinute, need])).toEqual(
      [
        [0, 90, 3],
        [90, 120, 2],
      ],
    );
  });

  it('does not count people twice when floors for anybody stand beside those for skills', () => {
    const [step] = coverSteps([lane(nurse, [0, 60, 2, 3]), lane(null, [0, 60, 4, 3])]);
    expect(step).toMatchObject({ need: 4, hold: 3, short: 1, spare: 0 });
  });

  it('draws floors for anybody alone as they are, whatever posts people hold', () => {
    const [step] = coverSteps([lane(nurse, [0, 60, 0, 5]), lane(null, [0, 60, 4, 5])]);
    expect(step).toMatchObject({ need: 4, hold: 4, short: 0, spare: 1 });
  });

  it('keeps a missing skill even when there are people enough', () => {
    const [step] = coverSteps([
      lane(vet, [0, 60, 1, 0]),
      lane(nurse, [0, 60, 2, 4]),
      lane(null, [0, 60, 4, 4]),
    ]);
    expect(step).toMatchObject({ need: 4, hold: 3, short: 1, spare: 1 });
  });

  it('has no steps without lanes', () => {
    expect(coverSteps([])).toEqual([]);
  });
});

describe('daily totals', () => {
  it('count person-hours in the column of the day, nights included', () => {
    const words = week(lane(vet, [at(0, 23), at(1, 7), 1, 0], [at(1, 7), at(1, 15), 2, 1]));
    const days = dailySteps(words.lanes, columnEdges(words.days, words.dayStartsAtMinute));
    expect(days).toHaveLength(7);
    expect(days[0]).toMatchObject({ need: 8, hold: 0, short: 8 });
    expect(days[1]).toMatchObject({ need: 16, hold: 8, short: 8 });
    expect(days[2]).toMatchObject({ need: 0, short: 0 });
  });
});

describe('stretches of a lane', () => {
  const cover = lane(vet, [0, 60, 1, 0], [60, 120, 2, 1], [120, 180, 2, 0], [240, 300, 1, 3]);

  it('join neighbours with the same number missing', () => {
    expect(stretchesOf(cover, 'short')).toEqual([
      { skillId: vet, startMinute: 0, endMinute: 120, people: 1 },
      { skillId: vet, startMinute: 120, endMinute: 180, people: 2 },
    ]);
  });

  it('tell what is spare', () => {
    expect(stretchesOf(cover, 'spare')).toEqual([
      { skillId: vet, startMinute: 240, endMinute: 300, people: 2 },
    ]);
  });
});
