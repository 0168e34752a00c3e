'use client';

import type { ReactNode } from 'react';
import { Dialog, Heading, Modal, ModalOverlay } from 'react-aria-components';

interface Props {
  readonly title: string;
  /** alertdialog: a question that interrupts. dialog: a form. */
  readonly role: 'alertdialog' | 'dialog';
  readonly isOpen: boolean;
  readonly onOpenChange: (isOpen: boolean) => void;
  readonly children: (close: () => void) => ReactNode;
}

/** A sheet over the page that holds the keyboard until it closes; Escape closes it. */
export function DialogFrame({ title, role, isOpen, onOpenChange, children }: Props) {
  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={onOpenChange}
      isDismissable
      className="fixed inset-0 z-30 grid place-items-center overflow-y-auto bg-recess/85 p-4"
    >
      <Modal className="w-full max-w-[34rem] border-3 border-ink bg-paper">
        <Dialog role={role} className="p-6 outline-none">
          {({ close }) => (
            <>
              <Heading slot="title" className="text-verdict font-[660]">
                {title}
              </Heading>
              {children(close)}
            </>
          )}
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
}
