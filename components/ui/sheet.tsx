import { clsx } from 'clsx';
import { type ReactNode, useId } from 'react';

type SheetProps = {
  title: ReactNode;
  /** Said beside the title: the unit, what the marks mean. */
  aside?: ReactNode;
  /** Verbs under the content: show as table, export. */
  tools?: ReactNode;
  className?: string;
  children: ReactNode;
};

/** A white square sheet on the grey ground: one subject with a heading. Sheets do not lie inside sheets. */
export const Sheet = ({ title, aside, tools, className, children }: SheetProps) => {
  const id = useId();
  return (
    <section
      aria-labelledby={id}
      className={clsx('min-w-0 bg-sheet px-4 pt-4 pb-3 sm:px-6 sm:pt-5 print:border-t print:px-0', className)}
    >
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-0.5">
        <h2 id={id} className="text-lg font-semibold">
          {title}
        </h2>
        {aside ? <div className="text-sm text-ink-2">{aside}</div> : null}
      </div>
      {children}
      {tools ? (
        <div className="mt-3 flex flex-wrap gap-x-5 gap-y-1 border-t border-rule-2 pt-2.5 text-sm print:hidden">
          {tools}
        </div>
      ) : null}
    </section>
  );
};
