'use client';

import { type KeyboardEvent, useLayoutEffect, useRef } from 'react';
import { readFinishingKey } from './grid-keys';
import type { FloorGrid } from './use-floor-grid';
import type { Typed } from './use-typing';

interface Props {
  readonly grid: FloorGrid;
  readonly typed: Typed;
  /** What the cell is called. */
  readonly name: string;
}

const typedProblemId = 'typed-problem';

/**
 * The field inside a cell while its number is typed. Enter and leaving it save, Escape does not; after a
 * refusal only Enter does.
 */
export function NumberEditor({ grid, typed, name }: Props) {
  const field = useRef<HTMLInputElement>(null);
  useLayoutEffect(() => {
    field.current?.focus();
    if (typed.isOpened) field.current?.select();
  }, [typed.isOpened]);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Escape') return grid.cancel();
    const step = readFinishingKey(event);
    if (!step) return;
    event.preventDefault();
    grid.finish(step);
  };
  return (
    <input
      ref={field}
      type="text"
      inputMode="numeric"
      autoComplete="off"
      aria-label={name}
      aria-invalid={typed.problem ? true : undefined}
      aria-describedby={typed.problem ? typedProblemId : undefined}
      value={typed.text}
      onChange={(event) => grid.typing.type(event.target.value)}
      onKeyDown={onKeyDown}
      onBlur={() => (typed.wasRefused && !typed.problem ? grid.cancel() : grid.finish(null))}
      className="h-8 w-full bg-lift text-center font-[660] outline-[2.5px]! outline-act! outline-offset-[-2.5px]! aria-invalid:outline-short! phone:h-11 phone:text-[1rem]"
    />
  );
}

/** Below the table, where no edge cuts it off: why a typed number was not taken. */
export function TypedProblem({ typed }: { readonly typed: Typed | null }) {
  if (!typed?.problem) return null;
  return (
    <p id={typedProblemId} role="alert" className="font-[640] text-short">
      <span aria-hidden="true">! </span>
      {typed.text}: {typed.problem}
    </p>
  );
}
