'use client';

import { Sheet } from '@/components/ui/sheet';
import { plural } from '@/lib/format';
import type { Mapping, Reading } from '@/lib/imports/contract';
import { ColumnRow } from './column-row';
import { FileShape } from './file-shape';

type ReadingSheetProps = { reading: Reading; mapping: Mapping; onTell: (mapping: Mapping) => void };

/** How the file is read, with the evidence for each decision. */
export const ReadingSheet = ({ reading, mapping, onTell }: ReadingSheetProps) => (
  <Sheet
    title="How the file is read"
    aside={
      reading.headerLine > 1
        ? `${plural(reading.columns.length, 'column', 'columns')}, named on line ${reading.headerLine}`
        : plural(reading.columns.length, 'column', 'columns')
    }
  >
    <FileShape reading={reading} mapping={mapping} onTell={onTell} />
    <ul className="mt-4 border-t-2 border-ink">
      {reading.columns.map((column) => (
        <ColumnRow key={column.header} column={column} reading={reading} mapping={mapping} onTell={onTell} />
      ))}
    </ul>
  </Sheet>
);
