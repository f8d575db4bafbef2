import type { HTMLAttributes, ReactNode, TdHTMLAttributes, ThHTMLAttributes } from 'react';
import { classNames } from './class-names';

interface TableProps {
  /** Said to screen readers; shown above the table when `showCaption`. */
  readonly caption: string;
  readonly showCaption?: boolean;
  readonly head: ReactNode;
  readonly children: ReactNode;
  readonly className?: string;
}

/** Rows of like things under hairlines. Wide tables scroll sideways within themselves. */
export function Table({ caption, showCaption, head, children, className }: TableProps) {
  return (
    <div className={classNames('overflow-x-auto', className)} tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-left">
        <caption className={showCaption ? 'pb-2 text-left font-heading text-lg font-semibold' : 'sr-only'}>
          {caption}
        </caption>
        <thead className="border-b border-edge">{head}</thead>
        <tbody>{children}</tbody>
      </table>
    </div>
  );
}

export function TableRow(props: HTMLAttributes<HTMLTableRowElement>) {
  return <tr {...props} className={classNames('border-b border-rule', props.className)} />;
}

export function TableHead(props: ThHTMLAttributes<HTMLTableCellElement>) {
  return (
    <th
      scope="col"
      {...props}
      className={classNames('lettering py-1.5 pr-4 text-sm font-medium text-graphite', props.className)}
    />
  );
}

interface TableCellProps extends TdHTMLAttributes<HTMLTableCellElement> {
  /** A measure or count: fixed-width and set to the right. */
  readonly figure?: boolean;
}

export function TableCell({ figure, className, ...rest }: TableCellProps) {
  return (
    <td
      {...rest}
      className={classNames('py-2 pr-4 align-middle', figure && 'figure text-right', className)}
    />
  );
}
