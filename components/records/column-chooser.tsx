'use client';

import { Button, TextButton } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/field';
import { Popover } from '@/components/ui/popover';
import { COLUMN_IDS, COLUMN_NAMES, type ColumnId } from './column-list';

type ColumnChooserProps = {
  columns: readonly ColumnId[];
  onChange: (columns: readonly ColumnId[] | null) => void;
};

/** Which columns stand in the table; the record's own column always does. */
export const ColumnChooser = ({ columns, onChange }: ColumnChooserProps) => {
  const toggle = (id: ColumnId) =>
    onChange(COLUMN_IDS.filter((one) => (one === id ? !columns.includes(id) : columns.includes(one))));
  return (
    <Popover trigger={<Button>Columns</Button>} label="Columns" align="end" className="w-64 p-4">
      <div className="min-h-0 overflow-y-auto">
        {COLUMN_IDS.filter((id) => id !== 'recordRef').map((id) => (
          <Checkbox key={id} label={COLUMN_NAMES[id]} checked={columns.includes(id)} onChange={() => toggle(id)} />
        ))}
      </div>
      <div className="mt-2 border-t border-rule-2 pt-2 text-sm">
        <TextButton onClick={() => onChange(null)}>As usual</TextButton>
      </div>
    </Popover>
  );
};
