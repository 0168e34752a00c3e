import { formatInstant } from '@/app/_ui/clock';
import { graphicStateOf } from '@/app/_ui/floor-graphic';
import type { Board } from '@/modules/roster';

/** The line under a roster's title: its version, where it comes from, and what is missing to begin. */
export function leadOf(board: Board): string {
  const state = graphicStateOf(board.lanes, board.proof !== null);
  if (state === 'no-floors') {
    return 'No floors yet: nothing says how many people are needed. Set floors for these dates first.';
  }
  if (state === 'no-roster') {
    return 'Floors are set, nothing is planned yet. A run finds out whether they can be held and plans the cheapest roster.';
  }
  return `${versionWords(board)}${runWords(board)}`;
}

function versionWords({ version, zone }: Board): string {
  if (version.publishedAtUtc === null) return `Draft ${version.number}.`;
  const at = formatInstant(version.publishedAtUtc, zone);
  const by = version.publishedByName ? ` by ${version.publishedByName}` : '';
  return `Version ${version.number}, published ${at}${by}.`;
}

function runWords({ run, proof, version, isRunCurrent }: Board): string {
  const checked =
    proof && proof.breaches.length === 0 ? ' Re-checked by separate code: 0 problems.' : '';
  if (!run) return checked;
  const isStale = version.publishedAtUtc === null && !isRunCurrent;
  const changed = isStale ? ' Floors, people or rules have changed since.' : '';
  return ` Made by run ${run.number}.${changed}${checked}`;
}
