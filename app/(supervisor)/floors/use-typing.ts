'use client';

import { useState } from 'react';
import { readPeople } from './need-changes';

/** A number while it is typed. */
export interface Typed {
  readonly text: string;
  /** Whether the number that stood there was opened: typing replaces it. */
  readonly isOpened: boolean;
  readonly problem: string | null;
  /** Once a number was refused, leaving the field no longer saves what is left in it. */
  readonly wasRefused: boolean;
}

/** Typing into the active cell; `onRead` gets the number of people once it is finished. */
export function useTyping(onRead: (people: number) => void) {
  const [typed, setTyped] = useState<Typed | null>(null);
  return {
    typed,
    open: (text: string, isOpened: boolean) =>
      setTyped({ text, isOpened, problem: null, wasRefused: false }),
    type: (text: string) => setTyped((before) => before && { ...before, text, problem: null }),
    cancel: () => setTyped(null),
    /** Ends typing and says whether it did: an empty field changes nothing, a wrong one stays open. */
    finish: (): boolean => {
      if (!typed) return false;
      const read = readPeople(typed.text);
      const isEmpty = typed.text.trim() === '';
      if ('problem' in read && !isEmpty) {
        setTyped({ ...typed, problem: read.problem, wasRefused: true });
        return false;
      }
      setTyped(null);
      if ('people' in read) onRead(read.people);
      return true;
    },
  };
}
