'use client';

import {
  Dialog as AriaDialog,
  Heading,
  Modal,
  ModalOverlay,
} from 'react-aria-components/Modal';
import type { ReactNode } from 'react';

/** A question that must be answered before the work goes on. */
export function Dialog({
  title,
  isOpen,
  onClose,
  role = 'dialog',
  wide = false,
  children,
}: {
  title: string;
  isOpen: boolean;
  onClose: () => void;
  role?: 'dialog' | 'alertdialog';
  wide?: boolean;
  children: ReactNode;
}) {
  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={(open) => !open && onClose()}
      isDismissable={role === 'dialog'}
      className="fixed inset-0 z-50 flex items-start justify-center overflow-y-auto bg-ink/55 p-4 pt-[12vh] max-wide:pt-4"
    >
      <Modal className={`w-full ${wide ? 'max-w-2xl' : 'max-w-md'}`}>
        <AriaDialog
          role={role}
          className="flex flex-col gap-4 rounded-[4px] border border-line bg-panel p-5 outline-none"
        >
          <Heading slot="title" className="wide-letter text-title font-semibold">
            {title}
          </Heading>
          {children}
        </AriaDialog>
      </Modal>
    </ModalOverlay>
  );
}
