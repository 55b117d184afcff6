import { clsx } from 'clsx';
import type { ComponentProps, ReactNode } from 'react';

type TableProps = Omit<ComponentProps<'table'>, 'children'> & {
  /** What the table shows; read out, and the name of the part that scrolls. */
  label: string;
  children: ReactNode;
};

/**
 * A table that alone scrolls sideways on a narrow screen, with its first column held in place. Units stand in the
 * headers.
 */
export const Table = ({ label, className, children, ...rest }: TableProps) => (
  // A group, not a landmark: the sheet around it is one already.
  // biome-ignore lint/a11y/useSemanticElements: a fieldset is for controls.
  // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reachable by keyboard (WCAG 2.1.1).
  <div role="group" aria-label={label} tabIndex={0} className="relative overflow-x-auto print:overflow-visible">
    <table
      className={clsx(
        'w-full border-collapse text-[0.9375rem]',
        'max-md:[&_tr>*:first-child]:sticky max-md:[&_tr>*:first-child]:left-0 max-md:[&_tr>*:first-child]:z-10 max-md:[&_tr>*:first-child]:min-w-24 max-md:[&_tr>*:first-child]:bg-sheet max-md:[&_tr>*:first-child]:pr-3',
        '[&_tbody_tr:last-child>*]:border-b-0 [&_tr>*:first-child]:pl-0 [&_tr>*:last-child]:pr-0',
        className,
      )}
      {...rest}
    >
      {children}
    </table>
  </div>
);

type CellProps = { numeric?: boolean };

export const Th = ({ numeric = false, scope = 'col', className, ...rest }: ComponentProps<'th'> & CellProps) => (
  <th
    scope={scope}
    className={clsx(
      scope === 'col'
        ? 'border-b-2 border-ink py-1.5 align-bottom text-sm font-medium text-ink-2'
        : 'border-b border-rule-2 py-2 font-normal',
      'px-2.5',
      numeric ? 'text-right whitespace-nowrap' : 'text-left',
      className,
    )}
    {...rest}
  />
);

export const Td = ({ numeric = false, className, ...rest }: ComponentProps<'td'> & CellProps) => (
  <td
    className={clsx(
      'border-b border-rule-2 px-2.5 py-2',
      numeric ? 'text-right whitespace-nowrap' : 'text-left',
      className,
    )}
    {...rest}
  />
);
