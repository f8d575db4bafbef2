import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';

export type NoticeKind = 'info' | 'ok' | 'warning' | 'error';

const kinds: Record<NoticeKind, { icon: IconName; className: string; word: string }> = {
  info: { icon: 'info', className: 'border-primary bg-well', word: 'Note' },
  ok: { icon: 'check', className: 'border-ok bg-ok-wash', word: 'Done' },
  warning: { icon: 'warning', className: 'border-warning bg-warning-wash', word: 'Warning' },
  error: { icon: 'error', className: 'border-error bg-error-wash', word: 'Error' },
};

interface NoticeProps {
  readonly kind?: NoticeKind;
  readonly title?: ReactNode;
  readonly actions?: ReactNode;
  readonly children?: ReactNode;
  readonly className?: string;
}

/** A message that stays in the page: what it is, and what to do next. Errors are announced as they appear. */
export function Notice({ kind = 'info', title, actions, children, className }: NoticeProps) {
  const { icon, word, className: tone } = kinds[kind];
  return (
    <div
      role={kind === 'error' ? 'alert' : 'status'}
      className={classNames('flex gap-3 rounded border border-l-4 px-3.5 py-2.5', tone, className)}
    >
      <Icon name={icon} className="mt-0.5 shrink-0" />
      <div className="grid min-w-0 grow gap-1">
        <span className="sr-only">{word}: </span>
        {title ? <p className="font-medium">{title}</p> : null}
        {children}
        {actions ? <div className="flex flex-wrap gap-2 pt-1">{actions}</div> : null}
      </div>
    </div>
  );
}
