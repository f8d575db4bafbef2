'use client';

import { Slot } from 'radix-ui';
import type { ButtonHTMLAttributes, ReactNode, Ref } from 'react';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';
import { Spinner } from './spinner';
import { Tooltip } from './tooltip';

export type ButtonVariant = 'primary' | 'plain' | 'quiet' | 'danger' | 'tab' | 'bar';
export type ButtonSize = 'small' | 'regular' | 'large' | 'glove';

const variants: Record<ButtonVariant, string> = {
  primary: 'bg-primary text-primary-on border-transparent hover:bg-primary-hover',
  plain: 'bg-sheet text-ink border-edge hover:bg-well',
  quiet: 'bg-transparent text-ink border-transparent hover:bg-well',
  danger: 'bg-error text-error-on border-transparent hover:opacity-90',
  tab: 'bg-tab text-tab-on border-transparent hover:brightness-95',
  bar: 'bg-transparent text-bar-on border-transparent hover:bg-bar-rule ring-bar',
};

const sizes: Record<ButtonSize, string> = {
  small: 'min-h-8 px-3 text-sm touch:min-h-touch',
  regular: 'min-h-control px-4 text-base touch:min-h-touch',
  large: 'min-h-12 px-6 text-lg',
  glove: 'min-h-glove px-8 text-xl',
};

const squares: Record<ButtonSize, string> = {
  small: 'size-8 touch:size-11',
  regular: 'size-9 touch:size-11',
  large: 'size-12',
  glove: 'size-16',
};

const base =
  'inline-flex items-center justify-center gap-2 rounded border font-medium leading-tight select-none ' +
  'transition-colors disabled:opacity-55 aria-disabled:opacity-55';

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly variant?: ButtonVariant;
  readonly size?: ButtonSize;
  readonly icon?: IconName;
  /** Work is under way: a mark turns, further presses are ignored, focus stays. */
  readonly busy?: boolean;
  /** Give the looks to the one child (a link) instead of a button. */
  readonly asChild?: boolean;
  readonly ref?: Ref<HTMLButtonElement>;
}

/** One primary button a view; the rest are plain or quiet. */
export function Button(props: ButtonProps) {
  const {
    variant = 'plain',
    size = 'regular',
    icon,
    busy = false,
    asChild,
    className,
    children,
    ...rest
  } = props;
  const classes = classNames(base, variants[variant], sizes[size], className);
  if (asChild) {
    return (
      <Slot.Root className={classes} {...rest}>
        {children}
      </Slot.Root>
    );
  }
  return (
    <button
      type="button"
      className={classes}
      {...rest}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      {...(busy ? { onClick: (event) => event.preventDefault() } : {})}
    >
      {busy ? <Spinner /> : icon ? <Icon name={icon} size={18} /> : null}
      {children}
    </button>
  );
}

interface IconButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'children' | 'aria-label'> {
  readonly icon: IconName | ReactNode;
  /** Said to screen readers and shown as the tooltip. */
  readonly label: string;
  readonly variant?: ButtonVariant;
  readonly size?: ButtonSize;
  readonly tooltip?: 'top' | 'right' | 'bottom' | 'left' | 'none';
  readonly ref?: Ref<HTMLButtonElement>;
}

/** A button that shows only a pictogram; its words appear on hover and focus. */
export function IconButton(props: IconButtonProps) {
  const { icon, label, variant = 'quiet', size = 'regular', tooltip = 'bottom', className, ...rest } = props;
  const button = (
    <button
      type="button"
      aria-label={label}
      className={classNames(base, variants[variant], squares[size], 'shrink-0', className)}
      {...rest}
    >
      {typeof icon === 'string' ? <Icon name={icon as IconName} size={size === 'glove' ? 32 : 20} /> : icon}
    </button>
  );
  if (tooltip === 'none') return button;
  return (
    <Tooltip text={label} side={tooltip}>
      {button}
    </Tooltip>
  );
}
