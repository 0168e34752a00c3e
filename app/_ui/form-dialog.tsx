'use client';

import type { ReactNode } from 'react';
import { Dialog, Heading, Modal, ModalOverlay } from 'react-aria-components';

interface Props {
  /** What the form is for, e.g. "Add a floor". */
  readonly title: string;
  readonly children: ReactNode;
  readonly isOpen: boolean;
  readonly onOpenChange: (isOpen: boolean) => void;
}

/**
 * A form in front of the sheet. Escape closes it unchanged; a click beside it does not, so that nothing
 * typed is lost by a slip.
 */
export function FormDialog({ title, children, isOpen, onOpenChange }: Props) {
  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={onOpenChange}
      className="fixed inset-0 z-30 grid justify-items-center overflow-y-auto bg-recess/85 p-4 desk:place-items-center phone:p-0"
    >
      <Modal className="w-full max-w-[42rem] border-3 border-ink bg-paper phone:min-h-dvh phone:border-x-0">
        <Dialog className="p-6 outline-none phone:p-4">
          <Heading slot="title" className="text-verdict font-[660]">
            {title}
          </Heading>
          {children}
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
}
