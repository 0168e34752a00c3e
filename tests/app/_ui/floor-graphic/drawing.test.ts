import { describe, expect, it } from 'vitest';
import { coverSteps } from '@/app/_ui/floor-graphic/cover-steps';
import { columnEdges } from '@/app/_ui/floor-graphic/day-axis';
import { graphicStateOf, layOut } from '@/app/_ui/floor-graphic/drawing';
import { labelledShortages } from '@/app/_ui/floor-graphic/sentence';
import { at, lane, nurse, vet, week } from './cover-fixture';

const width = 700;
const height = 100;

function draw(words: ReturnType<typeof week>, options: Partial<Parameters<typeof layOut>[0]> = {}) {
  return layOut({
    steps: coverSteps(words.lanes),
    shortages: labelledShortages(words),
    edges: columnEdges(words.days, words.dayStartsAtMinute),
    width,
    height,
    state: 'cover',
    ...options,
  });
}

const baseline = 99.25;
const personHeight = (highest: number) => baseline / (highest * 1.08);
const rounded = (value: number) => Math.round(value * 100) / 100;

describe('the floor graphic', () => {
  it('is linear from zero: hold stands on the baseline, short on hold, spare on the floor', () => {
    const words = week(lane(vet, [at(0, 7), at(0, 19), 3, 2], [at(0, 19), at(1, 7), 1, 4]));
    const one = personHeight(4);
    const y = (people: number) => rounded(baseline - people * one);
    const drawing = draw(words);
    expect(drawing.hold).toBe(`M0 ${y(0)}V${y(2)}H50V${y(0)}ZM50 ${y(0)}V${y(1)}H100V${y(0)}Z`);
    expect(drawing.short).toBe(`M0 ${y(2)}V${y(3)}H50V${y(2)}Z`);
    expect(drawing.spare).toBe(`M50 ${y(1)}V${y(4)}H100V${y(1)}Z`);
    expect(drawing.floorLine).toBe(`M0 ${y(3)}H50V${y(1)}H100`);
  });

  it('cuts off what lies outside the columns and draws the night before the period nowhere', () => {
    const drawing = draw(week(lane(vet, [0, at(0, 7), 5, 5], [at(0, 7), at(1, 7), 1, 1])));
    expect(drawing.floorLine.startsWith('M0 ')).toBe(true);
    expect(drawing.floorLine).not.toContain('V');
  });

  it('joins the same shortage of two skills into one shape', () => {
    const words = week(
      lane(vet, [at(0, 7), at(0, 15), 1, 0], [at(0, 15), at(0, 23), 1, 1]),
      lane(nurse, [at(0, 7), at(0, 15), 1, 1], [at(0, 15), at(0, 23), 1, 0]),
    );
    expect(draw(words).short.match(/M/g)).toHaveLength(1);
  });

  it('labels each skill and shift once, above the line, and drops labels under 60 px', () => {
    const words = week(
      lane(vet, [at(3, 23), at(4, 7), 1, 0]),
      lane(nurse, [at(4, 15), at(4, 23), 2, 1]),
    );
    const labels = draw(words).labels;
    expect(labels.map(({ text }) => text)).toEqual(['−1', '−1']);
    const line = baseline - personHeight(2);
    expect(labels[0]?.y).toBe(rounded(line - 7));
    expect(draw(words, { height: 59 }).labels).toEqual([]);
  });

  it('lifts a label over neighbours that its words would run into', () => {
    const words = week(lane(vet, [at(0, 7), at(0, 10), 1, 0], [at(0, 10), at(0, 23), 3, 3]));
    const line = baseline - personHeight(3) * 3;
    expect(draw(words).labels[0]?.y).toBe(rounded(line - 7));
  });

  it('moves a label that would touch the one before it up a row', () => {
    const words = week(
      lane(vet, [at(0, 9), at(0, 17), 1, 0]),
      lane(nurse, [at(0, 9), at(0, 17), 1, 0]),
    );
    const [first, second] = draw(words).labels;
    expect(second?.y).toBe(rounded((first?.y ?? 0) - 12));
  });

  it('draws course lines at whole persons inside the cover, unless they are under 6 px', () => {
    const words = week(lane(vet, [at(0, 7), at(1, 7), 3, 3], [at(1, 7), at(2, 7), 1, 1]));
    expect(draw(words).courses.match(/M0 /g)).toHaveLength(2);
    expect(draw(words).courses).not.toContain('H200');
    expect(draw(words, { height: 18 }).courses).toBe('');
  });

  it.each([
    [29, 2, 4],
    [30, 2.5, 5],
    [90, 2.5, 5],
    [91, 3, 6],
  ])('at a height of %d has a line of %d and a hatch of %d', (graphicHeight, line, pitch) => {
    const drawing = draw(week(), { height: graphicHeight });
    expect([drawing.lineWidth, drawing.hatchPitch]).toEqual([line, pitch]);
  });

  it('shows only the line without a roster, and only the baseline without floors', () => {
    const words = week(lane(vet, [at(0, 7), at(1, 7), 1, 0]));
    expect(draw(words, { state: 'no-roster' })).toMatchObject({ hold: '', short: '', labels: [] });
    expect(draw(words, { state: 'no-roster' }).floorLine).not.toBe('');
    expect(draw(words, { state: 'no-floors' }).floorLine).toBe('');
  });

  it('shares one scale with other graphics when told the highest stack', () => {
    const words = week(lane(vet, [at(0, 7), at(1, 7), 1, 1]));
    expect(draw(words, { highest: 4 }).top).toEqual({
      people: 1,
      y: rounded(baseline - personHeight(4)),
    });
  });
});

describe('the state of a graphic', () => {
  it('needs floors before a roster, and a roster before cover', () => {
    const floors = [lane(vet, [0, 60, 1, 0])];
    expect(graphicStateOf([lane(vet, [0, 60, 0, 0])], true)).toBe('no-floors');
    expect(graphicStateOf(floors, false)).toBe('no-roster');
    expect(graphicStateOf(floors, true)).toBe('cover');
  });
});
