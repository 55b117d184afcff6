'use client';

import type { KnownNames } from '@/analytics/records/known-names-contract';
import { Checkbox } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { formatList } from '@/lib/format';
import { FIELD_LABELS, type RecordField, type RecordTexts } from '@/lib/recoveries/fields';

const NAME_FIELDS = ['technician', 'branch', 'site', 'appliance', 'cylinder'] as const satisfies readonly RecordField[];

const folded = (name: string): string => name.normalize('NFC').replace(/\s+/g, ' ').trim().toLowerCase();

/** Names in the texts that the company does not know; none while the known ones are not here. */
export const unknownNames = (texts: RecordTexts, names: KnownNames | undefined): RecordField[] => {
  if (!names) return [];
  const known: Record<(typeof NAME_FIELDS)[number], readonly string[]> = {
    technician: names.technicians,
    branch: names.branches,
    site: names.sites,
    appliance: names.appliances.map(({ name }) => name),
    cylinder: names.cylinders,
  };
  return NAME_FIELDS.filter(
    (field) => texts[field].trim() !== '' && !known[field].some((name) => folded(name) === folded(texts[field])),
  );
};

type NewNamesProps = {
  texts: RecordTexts;
  fields: readonly RecordField[];
  confirmed: boolean;
  onConfirm: (confirmed: boolean) => void;
};

/** Asks whether names that nobody has used before are meant: a slip would make a second site. */
export const NewNames = ({ texts, fields, confirmed, onConfirm }: NewNamesProps) =>
  fields.length ? (
    <Notice title="Not used before" className="mb-5">
      <p>
        {formatList(
          fields.map((field) => `“${texts[field].trim()}” (${FIELD_LABELS[field].toLowerCase()})`),
          5,
        )}
      </p>
      <Checkbox
        label={fields.length === 1 ? 'The name is right, add it' : 'The names are right, add them'}
        checked={confirmed}
        onChange={(event) => onConfirm(event.target.checked)}
      />
    </Notice>
  ) : null;
