import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { requireActor } from '@/app/_session';
import { Shell } from '@/app/_ui/shell';
import { readBoard, readRun } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';
import { RunSheet } from './run-sheet';

export const metadata: Metadata = { title: 'Run' };

export default async function Page({ params }: PageProps<'/runs/[runId]'>) {
  const actor = await requireActor('rosters.read');
  const runId = idSchema('run').safeParse((await params).runId);
  const run = runId.success ? readRun(actor, runId.data) : null;
  if (!run?.ok) notFound();
  const board = readBoard(actor, run.value.rosterId);
  if (!board.ok) notFound();
  const { days, dayStartsAtMinute, kinds, skills, zone } = board.value;
  return (
    <Shell actor={actor}>
      <RunSheet start={run.value} frame={{ days, dayStartsAtMinute, kinds, skills, zone }} />
    </Shell>
  );
}
