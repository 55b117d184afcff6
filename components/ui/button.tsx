import { clsx } from 'clsx';
import Link from 'next/link';
import type { ComponentProps } from 'react';

const TONES = {
  primary: 'border-act bg-act text-act-ink hover:border-act-strong hover:bg-act-strong',
  quiet: 'border-edge bg-sheet text-ink hover:border-ink hover:bg-sheet-2',
  danger: 'border-danger bg-sheet text-danger hover:bg-danger-weak',
} as const;
export type ButtonTone = keyof typeof TONES;

const look = (tone: ButtonTone, className?: string) =>
  clsx(
    'inline-flex min-h-11 items-center justify-center gap-2 border px-4 py-1.5 text-center leading-tight font-medium no-underline pointer-fine:min-h-10',
    'disabled:border-rule disabled:bg-sheet-2 disabled:text-ink-3',
    TONES[tone],
    className,
  );

type ButtonProps = ComponentProps<'button'> & { tone?: ButtonTone };

/** Does something here. Not a submit button unless it says so. */
export const Button = ({ tone = 'quiet', type = 'button', className, ...rest }: ButtonProps) => (
  <button type={type} className={look(tone, className)} {...rest} />
);

type LinkButtonProps = ComponentProps<typeof Link> & { tone?: ButtonTone };

/** Leads somewhere and looks like a button. */
export const LinkButton = ({ tone = 'quiet', className, ...rest }: LinkButtonProps) => (
  <Link className={look(tone, className)} {...rest} />
);

/** A verb inside a line of text or a table, drawn as a link. */
export const TextButton = ({ type = 'button', className, ...rest }: ComponentProps<'button'>) => (
  <button
    type={type}
    className={clsx('link pointer-coarse:min-h-11 disabled:text-ink-3 disabled:no-underline', className)}
    {...rest}
  />
);
