'use client';

import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

/** A modal sheet of paper: title, one idea, its buttons at the end. Esc and the veil close it. */
export function Dialog({
  open,
  onOpenChange,
  title,
  description,
  children,
  wide = false,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  description?: ReactNode;
  children: ReactNode;
  wide?: boolean;
}) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-black/40" />
        <Radix.Content
          className={`fixed left-1/2 top-1/2 z-50 max-h-[92dvh] w-[calc(100vw-24px)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto rounded-md border border-rule bg-panel p-5 text-ink shadow-lg ${wide ? 'max-w-2xl' : 'max-w-md'}`}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <Radix.Title className="font-condensed text-2xl font-semibold">{title}</Radix.Title>
          {description ? (
            <Radix.Description className="mt-1 text-ink-2">{description}</Radix.Description>
          ) : null}
          <div className="mt-4">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

export const DialogClose = Radix.Close;
