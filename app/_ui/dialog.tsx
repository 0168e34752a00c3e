'use client';

import type { ReactNode } from 'react';
import { Button } from './button';
import { DialogFrame } from './dialog-frame';

interface Props {
  /** The question, e.g. "Publish the roster of 1–28 February?". */
  readonly title: string;
  /** What will happen, with what is still short or open. */
  readonly children: ReactNode;
  /** Keeps the word of the button that asked: "Publish". */
  readonly confirmLabel: string;
  readonly cancelLabel?: string;
  readonly onConfirm: () => void;
  readonly isOpen: boolean;
  readonly onOpenChange: (isOpen: boolean) => void;
}

/** Asks once before something that cannot be taken back. Escape and Cancel close it unchanged. */
export function AskDialog(props: Props) {
  const { title, children, confirmLabel, cancelLabel = 'Cancel', onConfirm } = props;
  return (
    <DialogFrame
      role="alertdialog"
      title={title}
      isOpen={props.isOpen}
      onOpenChange={props.onOpenChange}
    >
      {(close) => (
        <>
          <div className="mt-3 text-body">{children}</div>
          <div className="mt-6 flex flex-wrap justify-end gap-2">
            <Button onClick={close}>{cancelLabel}</Button>
            <Button
              look="primary"
              onClick={() => {
                close();
                onConfirm();
              }}
            >
              {confirmLabel}
            </Button>
          </div>
        </>
      )}
    </DialogFrame>
  );
}
