import fc from 'fast-check';
import { expect, it } from 'vitest';
import { buildPersonLines, buildRosterModel, firstEnd, hasLine, type Net } from '@/modules/model';
import { buildProblem } from '@/tests/support/problem-builder';
import { smallProblem } from '@/tests/support/random-problems';

/** Every net of a problem, once. */
const netsOf = (problem: Parameters<typeof buildRosterModel>[0]): Net[] => [
  ...new Set(buildPersonLines(problem, buildRosterModel(problem).works).map(({ net }) => net)),
];

const arcsOf = ({ next, groupCount }: Net, node: number): number[] =>
  Array.from(next.subarray(node * groupCount, (node + 1) * groupCount));

/** Nodes of each layer, the ends last. */
const layersOf = ({ layers, dayCount }: Net): number[][] =>
  Array.from({ length: dayCount + 1 }, (_, day) => {
    const first = layers[day] ?? 0;
    return Array.from({ length: (layers[day + 1] ?? 0) - first }, (_, index) => first + index);
  });

it('is as small as can be: every node is on a line, and no two have the same future', () => {
  fc.assert(
    fc.property(smallProblem, (problem) => {
      for (const net of netsOf(problem).filter(hasLine)) {
        const layers = layersOf(net);
        expect(layers[0]).toEqual([0]);
        layers.slice(0, -1).forEach((nodes, day) => {
          const futures = nodes.map((node) => arcsOf(net, node));
          expect(new Set(futures.map((arcs) => arcs.join())).size).toBe(nodes.length);
          expect(futures.every((arcs) => arcs.some((target) => target >= 0))).toBe(true);
          const reached = new Set(futures.flat().filter((target) => target >= 0));
          expect([...reached].sort((one, other) => one - other)).toEqual(layers[day + 1]);
        });
        const { minutes, nights, weekends } = net.ends;
        const ends = Array.from(minutes, (worked, end) => [worked, nights[end], weekends[end]]);
        expect(ends).toHaveLength(layers.at(-1)?.length ?? 0);
        expect(new Set(ends.map((counts) => counts.join())).size).toBe(ends.length);
      }
    }),
    { numRuns: 60 },
  );
});

it('joins a line of free choices into one node a day', () => {
  // Without rest or any limit, and with kinds that can be told apart by nothing but their hours.
  const sketch = { rules: { restMinutes: 0 }, people: [{ maximumMinutes: 100_000 }] };
  const [net] = netsOf(buildProblem({ dayCount: 7, ...sketch }));
  // The hours are to be known at the end: after d days 0 to d shifts of 480 minutes, and no more than that.
  expect(net && Array.from(net.layers)).toEqual([0, 1, 3, 6, 10, 15, 21, 28, 36]);
  expect(net && firstEnd(net)).toBe(28);
});
