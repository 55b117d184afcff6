'use client';

import { Button } from '@/components/ui/button';
import { DISPLAY_UNITS, type DisplayUnit } from '@/lib/vocabulary';
import { UNIT_NAMES } from '@/lib/wording';

type UnitEditorProps = { unit: DisplayUnit; onApply: (unit: DisplayUnit) => void; close: () => void };

/** The unit in which masses are read; records keep the unit they were written in. */
export const UnitEditor = ({ unit, onApply, close }: UnitEditorProps) => (
  <div className="flex flex-col gap-3">
    {DISPLAY_UNITS.map((choice) => (
      <Button
        key={choice}
        tone={choice === unit ? 'primary' : 'quiet'}
        aria-pressed={choice === unit}
        onClick={() => {
          onApply(choice);
          close();
        }}
      >
        {UNIT_NAMES[choice]}
      </Button>
    ))}
    <p className="text-sm text-ink-2">Only for reading: each record keeps the unit it was written in.</p>
  </div>
);
