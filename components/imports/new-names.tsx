import { Sheet } from '@/components/ui/sheet';
import { formatList, plural } from '@/lib/format';
import type { ImportSummary } from '@/lib/imports/contract';

const NOUNS = {
  technicians: ['technician', 'technicians'],
  sites: ['site', 'sites'],
  appliances: ['appliance', 'appliances'],
  branches: ['branch', 'branches'],
  cylinders: ['cylinder', 'cylinders'],
} as const;
const KINDS = Object.keys(NOUNS) as (keyof typeof NOUNS)[]; // Object.keys widens to string.
const SHOWN = 8;

/** Names the company does not know yet: made with the import, so a misspelling is best caught here. */
export const NewNames = ({ names, made }: { names: ImportSummary['newNames']; made: boolean }) => {
  const kinds = KINDS.filter((kind) => names[kind].count > 0);
  if (kinds.length === 0) return null;
  return (
    <Sheet title={made ? 'New names' : 'Names that would be new'} aside="Look for misspellings">
      <dl className="flex flex-col gap-3">
        {kinds.map((kind) => {
          const { count, examples } = names[kind];
          const [one, many] = NOUNS[kind];
          const more = count > examples.length || examples.length > SHOWN;
          return (
            <div key={kind} className="grid gap-x-6 sm:grid-cols-[10rem_minmax(0,1fr)]">
              <dt className="font-medium">{plural(count, one, many)}</dt>
              <dd className="break-words text-ink-2">
                {more ? `${examples.slice(0, SHOWN).join(', ')} and others` : formatList(examples, SHOWN)}
              </dd>
            </div>
          );
        })}
      </dl>
    </Sheet>
  );
};
