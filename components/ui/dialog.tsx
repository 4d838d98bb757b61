'use client';

import { X } from 'lucide-react';
import { Dialog as Radix } from 'radix-ui';
import { useRef, type ReactNode } from 'react';
import { classes } from './classes';

interface DialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  /** One or two sentences under the title; read out with it. */
  description?: ReactNode;
  /** The buttons, in reading order. */
  footer?: ReactNode;
  wide?: boolean;
  children?: ReactNode;
}

/** Holds the focus while it is open, and gives it back; Escape and the cross close it. */
export function Dialog({
  open,
  onOpenChange,
  title,
  description,
  footer,
  wide = false,
  children,
}: DialogProps) {
  // A key may have opened it, so there is no button that Radix would know of.
  const before = useRef<Element | null>(null);
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-[rgb(0_0_0/0.45)]" />
        <Radix.Content
          data-hotkeys="held"
          onOpenAutoFocus={() => (before.current = document.activeElement)}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            if (before.current instanceof HTMLElement) before.current.focus();
          }}
          {...(description ? {} : { 'aria-describedby': undefined })}
          className={classes(
            'fixed top-1/2 left-1/2 z-50 flex max-h-[calc(100dvh-32px)] w-[calc(100vw-32px)] -translate-x-1/2 -translate-y-1/2 flex-col border border-t-2 border-hair border-t-ink bg-leaf shadow-lift',
            wide ? 'max-w-3xl' : 'max-w-lg',
          )}
        >
          <Radix.Title className="p-4 pr-12 pb-2 text-lg font-semibold">{title}</Radix.Title>
          <div className="overflow-auto px-4 pb-4">
            {description && <Radix.Description className="mb-3 text-slate">{description}</Radix.Description>}
            {children}
          </div>
          {footer && <div className="flex flex-wrap gap-2 border-t border-hair p-4">{footer}</div>}
          {/* Last, so that the focus goes to what the dialog is for. */}
          <Radix.Close
            aria-label="Close"
            className="absolute top-4 right-4 rounded p-1 text-slate hover:bg-tint hover:text-ink"
          >
            <X aria-hidden="true" size={18} />
          </Radix.Close>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
