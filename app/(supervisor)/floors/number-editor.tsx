'use client';

import { type KeyboardEvent, useId, useLayoutEffect, useRef } from 'react';
import { readFinishingKey } from './grid-keys';
import type { FloorGrid } from './use-floor-grid';
import type { Typed } from './use-typing';

interface Props {
  readonly grid: FloorGrid;
  readonly typed: Typed;
  /** What the cell is called. */
  readonly name: string;
}

/** The field inside a cell while its number is typed. Leaving it saves, Escape does not. */
export function NumberEditor({ grid, typed, name }: Props) {
  const field = useRef<HTMLInputElement>(null);
  const problemId = useId();
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
    <>
      <input
        ref={field}
        type="text"
        inputMode="numeric"
        autoComplete="off"
        aria-label={name}
        aria-invalid={typed.problem ? true : undefined}
        aria-describedby={typed.problem ? problemId : undefined}
        value={typed.text}
        onChange={(event) => grid.typing.type(event.target.value)}
        onKeyDown={onKeyDown}
        onBlur={() => grid.finish(null)}
        className="h-8 w-full bg-lift text-center font-[660] outline-[2.5px]! outline-act! outline-offset-[-2.5px]! aria-invalid:outline-short! phone:h-11 phone:text-[1rem]"
      />
      {typed.problem ? (
        <p
          id={problemId}
          role="alert"
          className="absolute top-full right-0 z-2 w-56 border-[1.25px] border-short bg-paper p-2 text-left text-second font-[640] text-short"
        >
          <span aria-hidden="true">! </span>
          {typed.problem}
        </p>
      ) : null}
    </>
  );
}
