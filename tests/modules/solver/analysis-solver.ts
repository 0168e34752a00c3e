import loadHighs from 'highs';
import type { AnalysisTools } from '@/modules/solver/analysis-tools';
import { solveLinearModel } from '@/modules/solver/highs-adapter';
import { openHighsSession } from '@/modules/solver/highs-session';

const highs = await loadHighs();

/** Everything an analysis works with, in this thread and without anybody who stops it. */
export const realTools: AnalysisTools = {
  solve: (model, name, options) => solveLinearModel(highs, model, name, options),
  open: (model, name) => openHighsSession(highs, model, name),
  isStopRequested: () => false,
  clock: () => performance.now(),
};
