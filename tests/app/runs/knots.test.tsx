import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import { Knots } from '@/app/(supervisor)/runs/[runId]/knots';
import type { RunView } from '@/modules/roster';

const knot = {
  sentence: null,
  isMinimal: true,
  members: [
    { words: 'Vet Night on Thu 11 Feb needs 1', asksPerson: false },
    { words: "Bo's leave 8-14 Feb", asksPerson: true },
  ],
};

const draw = (change: Partial<RunView>): string => {
  const run = {
    shortageMinutes: 480,
    knots: { knots: [knot], isComplete: true },
    isLookingForKnots: false,
    mayWorkOut: true,
    ...change,
  } as RunView;
  return renderToStaticMarkup(
    <QueryClientProvider client={new QueryClient()}>
      <Knots run={run} />
    </QueryClientProvider>,
  );
};

test('each knot shows its members, whom to ask first, and whether it is proved smallest', () => {
  const page = draw({});
  expect(page).toContain('Knot 1: these 2 cannot all be met');
  expect(page).toContain('Vet Night on Thu 11 Feb needs 1');
  expect(page.match(/\(ask first\)/g)).toHaveLength(1);
  expect(page).toContain('Proved smallest');
  expect(page).toContain('Work out the ways out');
  const cut = draw({ knots: { knots: [{ ...knot, isMinimal: false }], isComplete: false } });
  expect(cut).toContain('Not proved smallest');
});

test('ways out are offered only to those who may work them out', () => {
  expect(draw({ mayWorkOut: false })).not.toContain('Work out the ways out');
});

test('the search is shown while it goes on, and nothing where every floor holds', () => {
  const looking = { knots: null, isLookingForKnots: true };
  expect(draw(looking)).toContain('Looking for what cannot be met together');
  expect(draw({ ...looking, shortageMinutes: 0 })).toBe('');
  expect(draw({ knots: null })).toBe('');
});
