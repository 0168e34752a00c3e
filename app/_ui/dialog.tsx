'use client';

import type { ReactNode } from 'react';
import { Dialog, Heading, Modal, ModalOverlay } from 'react-aria-components';
import { Button } from './button';

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
    <ModalOverlay
      isOpen={props.isOpen}
      onOpenChange={props.onOpenChange}
      isDismissable
      className="fixed inset-0 z-30 grid place-items-center overflow-y-auto bg-recess/85 p-4"
    >
      <Modal className="w-full max-w-[34rem] border-3 border-ink bg-paper">
        <Dialog role="alertdialog" className="p-6 outline-none">
          {({ close }) => (
            <>
              <Heading slot="title" className="text-verdict font-[660]">
                {title}
              </Heading>
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
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
}
