'use client';

import { Toast as Radix } from 'radix-ui';
import { createContext, useCallback, useContext, useMemo, useRef, useState, type ReactNode } from 'react';
import { classNames } from './class-names';
import { IconButton } from './button';
import { Icon, type IconName } from './icon';

export interface ToastMessage {
  readonly text: string;
  readonly kind?: 'plain' | 'ok' | 'error';
  /** What the one button does: `Undo`, `Try again`. */
  readonly action?: { readonly label: string; readonly run: () => void };
  /** Milliseconds on show; an action gets longer, an error stays until closed. */
  readonly duration?: number;
}

type Shown = ToastMessage & { readonly id: number };

const ToastContext = createContext<((message: ToastMessage) => void) | null>(null);

/** Holds the notes that come up in the corner and read themselves to screen readers. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<readonly Shown[]>([]);
  const next = useRef(0);
  const show = useCallback((message: ToastMessage) => {
    next.current += 1;
    const id = next.current;
    setShown((now) => [...now.slice(-2), { ...message, id }]);
  }, []);
  const remove = useCallback((id: number) => setShown((now) => now.filter((one) => one.id !== id)), []);
  const value = useMemo(() => show, [show]);
  return (
    <ToastContext.Provider value={value}>
      <Radix.Provider swipeDirection="right" label="Note">
        {children}
        {shown.map((toast) => (
          <Note key={toast.id} toast={toast} onClose={() => remove(toast.id)} />
        ))}
        <Radix.Viewport className="fixed right-0 bottom-0 z-50 flex w-full flex-col gap-2 p-4 outline-none sm:max-w-md" />
      </Radix.Provider>
    </ToastContext.Provider>
  );
}

/** `const toast = useToast(); toast({ text: 'Project deleted', action: { label: 'Undo', run } })` */
export function useToast(): (message: ToastMessage) => void {
  const show = useContext(ToastContext);
  if (!show) throw new Error('useToast needs a ToastProvider above it');
  return show;
}

const marks: Record<NonNullable<ToastMessage['kind']>, { icon: IconName; className: string }> = {
  plain: { icon: 'info', className: 'text-primary' },
  ok: { icon: 'check', className: 'text-ok' },
  error: { icon: 'error', className: 'text-error' },
};

function Note({ toast, onClose }: { toast: Shown; onClose: () => void }) {
  const mark = marks[toast.kind ?? 'plain'];
  const duration = toast.duration ?? (toast.kind === 'error' ? Infinity : toast.action ? 10_000 : 5_000);
  return (
    <Radix.Root
      duration={duration}
      type={toast.kind === 'error' ? 'foreground' : 'background'}
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      className="appear flex items-center gap-3 rounded border border-edge bg-sheet py-2 pr-2 pl-4"
    >
      <Icon name={mark.icon} className={classNames('shrink-0', mark.className)} />
      <Radix.Description className="grow">{toast.text}</Radix.Description>
      {toast.action ? (
        <Radix.Action
          altText={toast.action.label}
          onClick={toast.action.run}
          className="min-h-control rounded px-3 font-medium text-primary underline underline-offset-4 hover:bg-well touch:min-h-touch"
        >
          {toast.action.label}
        </Radix.Action>
      ) : null}
      <Radix.Close asChild>
        <IconButton icon="close" label="Close" tooltip="none" />
      </Radix.Close>
    </Radix.Root>
  );
}
