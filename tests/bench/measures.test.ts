import { describe, expect, it } from 'vitest';
import { gapOf, ratioTo } from './bench-result';
import { BestSoFar } from './best-so-far';
import { numberOption, readOptions, secondsOption } from './command-line';
import { boundFigureOf, figureOf } from './figure';
import { fittedExponent } from './growth';
import { cbc, glpsol } from './outside-programs';

describe('the best so far', () => {
  const best = new BestSoFar();
  best.see({ seconds: 0.5, objective: null, bound: 500 });
  best.see({ seconds: 2, objective: 900, bound: 500 });
  best.see({ seconds: 4, objective: 950, bound: 790 });
  best.see({ seconds: 12, objective: 800, bound: 700 });

  it('is null before the first roster and never gets worse', () => {
    expect(best.objectiveAt(1)).toBeNull();
    expect(best.objectiveAt(4)).toBe(900);
    expect(best.readings(20)).toEqual({ '3': 900, '10': 900 });
    expect(best.readings(60)).toEqual({ '3': 900, '10': 900, '30': 800, '60': 800 });
  });

  it('tells when a gap was first proven', () => {
    expect(best.secondsToGap(0.5)).toBe(2);
    expect(best.secondsToGap(0.0125)).toBe(12);
    expect(best.secondsToGap(0.001)).toBeNull();
  });
});

describe('figures derived from results', () => {
  it('have gaps and ratios only where both sides are known', () => {
    expect(gapOf({ objective: 800, bound: 790 })).toBe(0.0125);
    expect(gapOf({ objective: null, bound: 790 })).toBeNull();
    expect(ratioTo(607, 607)).toBe(1);
    expect(ratioTo(600, 1200)).toBe(0.5);
    expect(ratioTo(600, null)).toBeNull();
  });

  it('find the exponent of a power', () => {
    const cubes = [10, 20, 40].map((people) => ({ people, seconds: 0.002 * people ** 3 }));
    expect(fittedExponent(cubes)).toBeCloseTo(3, 9);
    expect(fittedExponent(cubes.slice(0, 1))).toBeNull();
  });
});

describe('the options of a command', () => {
  const read = (...args: string[]) => readOptions(args, ['file', 'seconds'], ['quick']);

  it('are read in both spellings', () => {
    expect(read('--file', 'a.txt', '--seconds=5', '--quick')).toEqual({
      file: 'a.txt',
      seconds: '5',
      quick: 'yes',
    });
  });

  it.each([
    [['--files', 'a.txt'], '--files is unknown; the options are --file, --seconds, --quick.'],
    [['a.txt'], '"a.txt" is no option; the options are --file, --seconds, --quick.'],
    [['--file'], '--file needs a value.'],
    [['--quick=no'], '--quick takes no value.'],
  ])('refuse %j in a sentence', (args, sentence) => {
    expect(() => read(...args)).toThrow(sentence);
  });

  it.each(['0', '1e3', 'ten', '-5', '3601'])('refuse %s seconds', (seconds) => {
    expect(() => numberOption({ seconds }, 'seconds', secondsOption)).toThrow(
      `--seconds is "${seconds}"; it must be a number from 1 to 3600.`,
    );
  });

  it('have standards', () => {
    expect(numberOption({}, 'seconds', secondsOption)).toBe(60);
    expect(numberOption({ seconds: '2.5' }, 'seconds', secondsOption)).toBe(2.5);
  });
});

describe('the words of native solvers', () => {
  it('tell what CBC found on the way and at the end', () => {
    const found =
      'Cbc0012I Integer solution of 612 found by rounding after 10 iterations (1.43 seconds)';
    expect(cbc.readLine(found)).toEqual({ objective: 612 });
    const nodes =
      'Cbc0010I After 100 nodes, 50 on tree, 1e+50 best solution, best possible 598.5 (2.00 seconds)';
    expect(cbc.readLine(nodes)).toEqual({ bound: 598.5 });
    const stopped =
      'Result - Stopped on time limit\n\nObjective value:   612.00000000\nLower bound:   599.1\n';
    expect(cbc.readResult('', stopped)).toEqual({ objective: 612, bound: 599.1 });
    const solved = 'Result - Optimal solution found\n\nObjective value:   607.00000000\n';
    expect(cbc.readResult('', solved)).toEqual({ objective: 607, bound: 607 });
    const none =
      'Result - Stopped on time limit\n\nNo feasible solution found\nLower bound:   599.1\n';
    expect(cbc.readResult('', none)).toEqual({ objective: null, bound: 599.1 });
  });

  it('tell what GLPK found on the way and at the end', () => {
    const line = '+  1234: mip =   6.120000000e+02 >=   5.980000000e+02   2.3% (10; 3)';
    expect(glpsol.readLine(line)).toEqual({ objective: 612, bound: 598 });
    const none = '+  1234: mip =     not found yet >=              -inf        (1; 0)';
    expect(glpsol.readLine(none)).toEqual({ objective: null, bound: null });
    expect(glpsol.readResult('s mip 10 12 f 612\n', line)).toEqual({ objective: 612, bound: 598 });
    expect(glpsol.readResult('s mip 10 12 o 607\n', line)).toEqual({ objective: 607, bound: 607 });
    expect(glpsol.readResult('s mip 10 12 u 0\n', none)).toEqual({ objective: null, bound: null });
  });
});

describe('figures of costs and bounds', () => {
  const euros = { fixedCents: 100_000, missedMinuteCents: 5000, isWhole: false };
  const points = { fixedCents: 0, missedMinuteCents: 0, isWhole: true };

  it('leave fixed pay out and weigh missing minutes', () => {
    expect(figureOf(123_456, 0, euros)).toBe(234.56);
    expect(figureOf(123_456, 2, euros)).toBe(334.56);
    expect(figureOf(null, 2, euros)).toBeNull();
  });

  it('round bounds up where every figure is whole', () => {
    expect(boundFigureOf(60_620, 0, points)).toBe(607);
    expect(boundFigureOf(60_700.000_01, 0, points)).toBe(607);
    expect(boundFigureOf(123_456, 0, euros)).toBe(234.56);
  });
});
