'use client';

import { Checkbox, Field, Select } from '@/components/ui/field';
import type { Mapping, Reading } from '@/lib/imports/contract';
import { MASS_UNIT_NAMES, VACUUM_UNIT_NAMES } from '@/lib/imports/unit-names';
import { tellShape, tellUnit } from './tell';

const ENCODINGS = [
  ['utf-8', 'UTF-8'],
  ['utf-16le', 'UTF-16, low byte first'],
  ['utf-16be', 'UTF-16, high byte first'],
  ['windows-1252', 'Windows-1252'],
] as const;
const DELIMITERS = [
  [',', 'comma'],
  [';', 'semicolon'],
  ['\t', 'tab'],
] as const;

const optionsOf = (choices: Iterable<readonly [string, string]>) =>
  [...choices].map(([value, label]) => (
    <option key={value} value={value}>
      {label}
    </option>
  ));

type FileShapeProps = { reading: Reading; mapping: Mapping; onTell: (mapping: Mapping) => void };

/** How the file as a whole is read: letters, separator, units for rows that name none. */
export const FileShape = ({ reading, mapping, onTell }: FileShapeProps) => (
  <div className="flex flex-col gap-3">
    <div className="grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
      {reading.encoding ? (
        <Field label="Letters" hint={reading.encoding.evidence} className="justify-between">
          <Select
            value={mapping.encoding ?? reading.encoding.value}
            onChange={(event) => onTell(tellShape(mapping, 'encoding', event.target.value))}
          >
            {optionsOf(ENCODINGS)}
          </Select>
        </Field>
      ) : null}
      {reading.delimiter ? (
        <Field label="Between cells" hint={reading.delimiter.evidence} className="justify-between">
          <Select
            value={mapping.delimiter ?? reading.delimiter.value}
            onChange={(event) => onTell(tellShape(mapping, 'delimiter', event.target.value))}
          >
            {optionsOf(DELIMITERS)}
          </Select>
        </Field>
      ) : null}
      <Field label="Mass unit" hint="For rows that name none." className="justify-between">
        <Select
          value={mapping.massUnit ?? ''}
          onChange={(event) => onTell(tellUnit(mapping, 'massUnit', event.target.value))}
        >
          <option value="">refuse such rows</option>
          {optionsOf(Object.entries(MASS_UNIT_NAMES))}
        </Select>
      </Field>
      <Field label="Vacuum unit" hint="For rows that name none." className="justify-between">
        <Select
          value={mapping.vacuumUnit ?? ''}
          onChange={(event) => onTell(tellUnit(mapping, 'vacuumUnit', event.target.value))}
        >
          <option value="">refuse such rows</option>
          {optionsOf(Object.entries(VACUUM_UNIT_NAMES))}
        </Select>
      </Field>
    </div>
    <Checkbox
      label="Take the file’s word also for records that were corrected by hand"
      checked={mapping.overwriteCorrections ?? false}
      onChange={(event) => onTell({ ...mapping, overwriteCorrections: event.target.checked })}
    />
  </div>
);
