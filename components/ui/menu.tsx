'use client';

import { DropdownMenu as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';

interface MenuProps {
  /** The button that opens it. */
  readonly trigger: ReactNode;
  readonly align?: 'start' | 'end';
  readonly children: ReactNode;
}

/** A short list of what can be done. */
export function Menu({ trigger, align = 'end', children }: MenuProps) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          align={align}
          sideOffset={4}
          collisionPadding={8}
          className="appear z-50 min-w-52 rounded border border-edge bg-sheet py-1"
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

const itemClass =
  'flex min-h-9 cursor-pointer items-center gap-2.5 px-3 outline-none touch:min-h-touch ' +
  'data-[highlighted]:bg-well data-[disabled]:opacity-55';

interface MenuItemProps {
  readonly icon?: IconName;
  readonly keys?: string;
  readonly danger?: boolean;
  readonly disabled?: boolean;
  readonly asChild?: boolean;
  readonly onSelect?: () => void;
  readonly children: ReactNode;
}

export function MenuItem({ icon, keys, danger, disabled, asChild, onSelect, children }: MenuItemProps) {
  return (
    <Radix.Item
      className={classNames(itemClass, danger && 'text-error')}
      disabled={disabled ?? false}
      asChild={asChild ?? false}
      {...(onSelect ? { onSelect } : {})}
    >
      {asChild ? (
        children
      ) : (
        <>
          {icon ? <Icon name={icon} size={18} /> : null}
          <span className="grow">{children}</span>
          {keys ? <kbd className="figure text-sm text-graphite">{keys}</kbd> : null}
        </>
      )}
    </Radix.Item>
  );
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return <Radix.Label className="lettering px-3 py-1.5 text-sm text-graphite">{children}</Radix.Label>;
}

export function MenuRule() {
  return <Radix.Separator className="my-1 border-t border-rule" />;
}

interface MenuChoiceProps<Value extends string> {
  readonly value: Value;
  readonly options: readonly { readonly value: Value; readonly label: string; readonly icon?: IconName }[];
  readonly onChange: (value: Value) => void;
}

/** One of a few within a menu; the chosen one carries a tick. */
export function MenuChoice<Value extends string>({ value, options, onChange }: MenuChoiceProps<Value>) {
  return (
    <Radix.RadioGroup value={value} onValueChange={(next) => onChange(next as Value)}>
      {options.map((option) => (
        <Radix.RadioItem key={option.value} value={option.value} className={itemClass}>
          {option.icon ? <Icon name={option.icon} size={18} /> : null}
          <span className="grow">{option.label}</span>
          <Radix.ItemIndicator>
            <Icon name="check" size={16} />
          </Radix.ItemIndicator>
        </Radix.RadioItem>
      ))}
    </Radix.RadioGroup>
  );
}
