'use client';

import { clsx } from 'clsx';
import { type ComponentProps, createContext, type ReactNode, useContext, useId } from 'react';

type FieldIds = { id: string; describedBy: string | undefined; invalid: boolean; required: boolean };
const FieldContext = createContext<FieldIds | null>(null);

type FieldProps = {
  label: ReactNode;
  hint?: ReactNode;
  /** Stands beside the label without being part of it: what its word means. */
  aside?: ReactNode;
  error?: ReactNode;
  required?: boolean;
  /** Keeps the label for screen readers only, where a heading already says it. */
  labelHidden?: boolean;
  className?: string;
  children: ReactNode;
};

/** A label, one control, a hint and what is wrong with what was typed, tied together for every reader. */
export const Field = ({
  label,
  hint,
  aside,
  error,
  required = false,
  labelHidden,
  className,
  children,
}: FieldProps) => {
  const id = useId();
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ') || undefined;
  return (
    <FieldContext value={{ id, describedBy, invalid: Boolean(error), required }}>
      <div className={clsx('flex min-w-0 flex-col gap-1', className)}>
        <div className={labelHidden ? 'sr-only' : 'flex items-center gap-1'}>
          <label htmlFor={id} className="font-medium">
            {label}
          </label>
          {aside}
        </div>
        {hint ? (
          <p id={`${id}-hint`} className="text-sm text-ink-2">
            {hint}
          </p>
        ) : null}
        {children}
        {error ? (
          <p id={`${id}-error`} role="alert" className="text-sm font-medium text-danger">
            {error}
          </p>
        ) : null}
      </div>
    </FieldContext>
  );
};

const useControl = () => {
  const field = useContext(FieldContext);
  return field
    ? {
        id: field.id,
        'aria-describedby': field.describedBy,
        'aria-invalid': field.invalid || undefined,
        required: field.required,
      }
    : {};
};

const CONTROL =
  'w-full min-w-0 border border-edge bg-sheet px-3 text-ink aria-invalid:border-danger aria-invalid:outline-danger disabled:bg-sheet-2 disabled:text-ink-3';

export const TextInput = ({ className, ...rest }: ComponentProps<'input'>) => (
  <input {...useControl()} className={clsx(CONTROL, 'h-11', className)} {...rest} />
);

export const Select = ({ className, ...rest }: ComponentProps<'select'>) => (
  <select {...useControl()} className={clsx(CONTROL, 'h-11', className)} {...rest} />
);

export const TextArea = ({ className, ...rest }: ComponentProps<'textarea'>) => (
  <textarea {...useControl()} className={clsx(CONTROL, 'min-h-24 py-2', className)} {...rest} />
);

/** A box to tick with its own label; the whole line is the target. */
export const Checkbox = ({
  label,
  className,
  ...rest
}: Omit<ComponentProps<'input'>, 'type'> & { label: ReactNode }) => (
  <label className={clsx('flex min-h-11 items-center gap-3 pointer-fine:min-h-9', className)}>
    <input type="checkbox" className="size-5 shrink-0 accent-act" {...rest} />
    <span className="min-w-0">{label}</span>
  </label>
);
