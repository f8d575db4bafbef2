'use client';

import { AlertDialog as RadixAlert, Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { Button, IconButton } from './button';
import { classNames } from './class-names';

const veil = 'fixed inset-0 z-40 bg-veil';
const sheet =
  'appear fixed inset-x-0 bottom-0 z-50 flex max-h-[92dvh] w-full flex-col border border-rule bg-sheet ' +
  'sm:inset-auto sm:top-1/2 sm:left-1/2 sm:max-h-[86dvh] sm:-translate-x-1/2 sm:-translate-y-1/2 sm:rounded-lg';
const widths = { narrow: 'sm:max-w-md', regular: 'sm:max-w-xl', wide: 'sm:max-w-4xl' } as const;

interface DialogProps {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly title: ReactNode;
  /** What it is for, in a sentence; read with the title. */
  readonly description?: ReactNode;
  readonly width?: keyof typeof widths;
  /** The buttons, the one that goes on last. */
  readonly actions?: ReactNode;
  readonly children?: ReactNode;
}

/** A sheet laid over the page; Esc and the cross lay it aside, focus goes back to where it came from. */
export function Dialog(props: DialogProps) {
  const { open, onOpenChange, title, description, width = 'regular', actions, children } = props;
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className={veil} />
        <Radix.Content
          className={classNames(sheet, widths[width])}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <header className="flex items-start gap-4 border-b border-rule px-5 pt-4 pb-3">
            <div className="grow">
              <Radix.Title className="text-xl">{title}</Radix.Title>
              {description ? (
                <Radix.Description className="text-graphite">{description}</Radix.Description>
              ) : null}
            </div>
            <Radix.Close asChild>
              <IconButton icon="close" label="Close" tooltip="none" />
            </Radix.Close>
          </header>
          <div className="grow overflow-y-auto px-5 py-4">{children}</div>
          {actions ? <DialogActions>{actions}</DialogActions> : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

interface ConfirmDialogProps {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly title: ReactNode;
  readonly description: ReactNode;
  /** Says what will be done: `Sign out everywhere`, never `OK`. */
  readonly confirm: string;
  readonly danger?: boolean;
  readonly onConfirm: () => void;
}

/** Asks before what cannot be undone; focus starts on the way back. Where an undo exists, use a toast instead. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const { open, onOpenChange, title, description, confirm, danger, onConfirm } = props;
  return (
    <RadixAlert.Root open={open} onOpenChange={onOpenChange}>
      <RadixAlert.Portal>
        <RadixAlert.Overlay className={veil} />
        <RadixAlert.Content className={classNames(sheet, widths.narrow)}>
          <div className="grid gap-2 px-5 pt-4 pb-5">
            <RadixAlert.Title className="text-xl">{title}</RadixAlert.Title>
            <RadixAlert.Description className="text-graphite">{description}</RadixAlert.Description>
          </div>
          <DialogActions>
            <RadixAlert.Cancel asChild>
              <Button>Leave it</Button>
            </RadixAlert.Cancel>
            <RadixAlert.Action asChild>
              <Button variant={danger ? 'danger' : 'primary'} onClick={onConfirm}>
                {confirm}
              </Button>
            </RadixAlert.Action>
          </DialogActions>
        </RadixAlert.Content>
      </RadixAlert.Portal>
    </RadixAlert.Root>
  );
}

function DialogActions({ children }: { children: ReactNode }) {
  return (
    <footer className="flex flex-wrap justify-end gap-2 border-t border-rule px-5 py-3">{children}</footer>
  );
}
