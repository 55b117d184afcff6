'use client';

import { clsx } from 'clsx';
import { DIMENSIONS, type Dimension } from '@/analytics/dimensions';
import { DIMENSION_WORDS } from '@/components/scope/wording';

type SplitSelectorProps = { by: Dimension; onChange: (by: Dimension) => void };

/** By what the months are split; a row of radio buttons drawn as words. */
export const SplitSelector = ({ by, onChange }: SplitSelectorProps) => (
  <fieldset className="flex flex-wrap items-baseline gap-x-1 text-sm print:hidden">
    <legend className="sr-only">Split by</legend>
    <span aria-hidden="true" className="mr-1 text-ink-2">
      Split by
    </span>
    {DIMENSIONS.map((dimension) => (
      <label
        key={dimension}
        className={clsx(
          'inline-flex min-h-9 cursor-pointer items-center border-b-2 px-1.5 pointer-coarse:min-h-11',
          'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-act',
          dimension === by ? 'border-ink font-semibold text-ink' : 'border-transparent text-act hover:border-act',
        )}
      >
        <input
          type="radio"
          name="split"
          className="sr-only"
          checked={dimension === by}
          onChange={() => onChange(dimension)}
        />
        {DIMENSION_WORDS[dimension].one}
      </label>
    ))}
  </fieldset>
);
