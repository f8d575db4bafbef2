import Link from 'next/link';
import type { ComponentProps } from 'react';
import { classNames } from '@/components/ui/class-names';

/** A link within text. */
export function TextLink({ className, ...rest }: ComponentProps<typeof Link>) {
  return (
    <Link
      {...rest}
      className={classNames(
        'font-medium text-primary underline underline-offset-4 hover:text-primary-hover',
        className,
      )}
    />
  );
}
