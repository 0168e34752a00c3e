import { type CaseResult, gapOf, ratioTo } from './bench-result';

/** Columns of the table: heading, width, cell. */
const columns: readonly (readonly [string, number, (result: CaseResult) => string])[] = [
  ['case', 9, ({ name }) => name],
  ['people', 7, ({ people }) => String(people)],
  ...[3, 10, 30].map(
    (seconds) =>
      [
        `${seconds} s`,
        11,
        ({ engine }: CaseResult) => figureWords(engine.at[String(seconds)]),
      ] as const,
  ),
  ['end', 11, ({ engine }) => figureWords(engine.objective)],
  ['bound', 11, ({ engine }) => figureWords(engine.bound)],
  ['gap', 8, ({ engine }) => percentWords(gapOf(engine))],
  ['missed', 8, ({ engine }) => hourWords(engine.missedMinutes)],
  ['first', 7, ({ engine }) => secondWords(engine.secondsToFirst)],
  ['to 1 %', 7, ({ engine }) => secondWords(engine.secondsToGap['0.01'])],
  ['to .1 %', 7, ({ engine }) => secondWords(engine.secondsToGap['0.001'])],
  ['MB', 6, ({ engine }) => String(engine.peakMegabytes ?? '-')],
  ['best known', 18, ({ engine, bestKnown }) => ratioWords(engine.objective, bestKnown)],
  ['highs', 18, ({ engine, highs }) => otherWords(engine.objective, highs)],
  ['cbc', 18, ({ engine, cbc }) => otherWords(engine.objective, cbc)],
  ['glpsol', 18, ({ engine, glpsol }) => otherWords(engine.objective, glpsol)],
];

/** The headings of the table. */
export const headings = (): string => columns.map(([name, width]) => cell(name, width)).join('');

/** One case as a line below the headings. */
export const rowOf = (result: CaseResult): string =>
  columns.map(([, width, words]) => cell(words(result), width)).join('');

/** What the columns mean. */
export const legend = [
  'Figures are points of an open instance, or euros beyond fixed pay; missing minutes weigh far more.',
  'first: seconds to a roster with every floor held. to 1 %, to .1 %: seconds to a proven gap.',
  'Ratios (engine by other, below 1 is better for the engine) stand behind the figures of others.',
];

const cell = (text: string, width: number): string => text.padStart(width - 1).padEnd(width);

const figureWords = (value: number | null | undefined): string => {
  if (value === null || value === undefined) return '-';
  return Number.isInteger(value) ? String(value) : value.toFixed(2);
};

const percentWords = (share: number | null): string =>
  share === null ? '-' : `${(share * 100).toFixed(2)} %`;

const secondWords = (seconds: number | null | undefined): string =>
  seconds === null || seconds === undefined ? '-' : seconds.toFixed(1);

const hourWords = (minutes: number | null): string =>
  minutes === null ? '-' : `${(minutes / 60).toFixed(minutes % 60 === 0 ? 0 : 1)} h`;

function ratioWords(engine: number | null, other: number | null | undefined): string {
  const ratio = ratioTo(engine, other);
  return `${figureWords(other)}${ratio === null ? '' : ` (${ratio.toFixed(3)})`}`;
}

/** A missing solver and one that found nothing are told in few words. */
function otherWords(
  engine: number | null,
  other: { readonly objective: number | null; readonly failure: string | null } | undefined,
): string {
  if (!other) return '-';
  if (other.objective === null) return (other.failure ?? 'none').slice(0, 16);
  return ratioWords(engine, other.objective);
}
