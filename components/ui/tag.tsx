import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';

export type TagTone = 'plain' | 'primary' | 'ok' | 'warning' | 'error' | 'tab';

const tones: Record<TagTone, string> = {
  plain: 'border-edge text-graphite',
  primary: 'border-primary text-primary',
  ok: 'border-ok bg-ok-wash text-ok',
  warning: 'border-warning bg-warning-wash text-warning',
  error: 'border-error bg-error-wash text-error',
  tab: 'border-tab bg-select text-tab-ink',
};

interface TagProps {
  readonly tone?: TagTone;
  readonly icon?: IconName;
  readonly children: ReactNode;
  readonly className?: string;
}

/** A state or a role in a word or two; the colour only repeats what the word says. */
export function Tag({ tone = 'plain', icon, children, className }: TagProps) {
  return (
    <span
      className={classNames(
        'lettering inline-flex items-center gap-1 rounded-sm border px-1.5 text-sm leading-5 whitespace-nowrap',
        tones[tone],
        className,
      )}
    >
      {icon ? <Icon name={icon} size={14} /> : null}
      {children}
    </span>
  );
}
