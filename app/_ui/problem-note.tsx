import type { ReactNode } from 'react';
import { ApiProblem } from '../_api';

interface Props {
  /** What a call threw; nothing is drawn for null and undefined. */
  readonly problem: unknown;
  /** What was kept, e.g. "Your change is kept here." */
  readonly kept?: string;
  /** What to do: usually a button. */
  readonly action?: ReactNode;
}

/** An error beside its cause: what happened, what was kept, what to do. Read aloud at once. */
export function ProblemNote({ problem, kept, action }: Props) {
  if (!problem) return null;
  const { title, detail, fields } = describe(problem);
  return (
    <div role="alert" className="max-w-[46rem] border-[1.25px] border-short px-3 py-2 text-body">
      <p className="font-[660] text-short">
        <span aria-hidden="true">! </span>
        {title}
      </p>
      <p>{kept ? `${detail} ${kept}` : detail}</p>
      {fields.length > 1 ? (
        <ul className="mt-1 list-disc pl-5 text-second">
          {fields.map((field) => (
            <li key={`${field.path} ${field.message}`}>{field.message}</li>
          ))}
        </ul>
      ) : null}
      {action ? <div className="mt-2">{action}</div> : null}
    </div>
  );
}

function describe(problem: unknown) {
  if (!(problem instanceof ApiProblem)) {
    return {
      title: 'Something broke on this page',
      detail: 'Nothing was changed. Load the page again.',
      fields: [],
    };
  }
  const { title, message, fields } = problem;
  const detail =
    fields.length > 1 ? 'Each of these needs a look:' : (fields[0]?.message ?? message);
  return { title, detail, fields };
}
