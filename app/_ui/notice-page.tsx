import type { ReactNode } from 'react';
import { Brand } from './brand';

interface Props {
  readonly title: string;
  readonly children: ReactNode;
}

/** A sheet that only says something: not found, not allowed, broken. */
export function NoticePage({ title, children }: Props) {
  return (
    <div className="px-(--page) pt-3">
      <header>
        <Brand />
      </header>
      <main className="mt-9 max-w-[34rem]">
        <h1 className="text-title font-[640] phone:text-[1.5625rem]">{title}</h1>
        <div className="mt-2 space-y-4 text-body">{children}</div>
      </main>
    </div>
  );
}
