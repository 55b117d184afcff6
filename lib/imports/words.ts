import type { ApplianceCategory, CertificationType, Disposition, JobType } from '@/lib/vocabulary';
import { cleanText } from './text';

const words = <Word extends string>(synonyms: Record<Word, readonly string[]>) => {
  // Object.entries widens the keys to string; the record's own type names them.
  const entries = Object.entries(synonyms) as [Word, readonly string[]][];
  const known = new Map(entries.flatMap(([word, others]) => [word, ...others].map((w) => [fold(w), word] as const)));
  return (text: string): Word | null => known.get(fold(text)) ?? null;
};

const fold = (text: string): string =>
  cleanText(text)
    .toLowerCase()
    .replace(/[\s_/-]+/g, ' ');

/** The job type a cell names, or null. */
export const jobTypeOf = words<JobType>({
  service: ['servicing'],
  repair: ['repairs', 'leak repair'],
  conversion: [],
  disposal: [],
});

/** The category of appliance a cell names, or null. */
export const categoryOf = words<ApplianceCategory>({
  comfort_cooling: ['comfort'],
  commercial_refrigeration: ['commercial'],
  industrial_process: ['industrial', 'industrial process refrigeration'],
  small_appliance: ['small appliances'],
  other: [],
});

/** What became of the refrigerant, as a cell names it, or null. */
export const dispositionOf = words<Disposition>({
  in_cylinder: ['cylinder'],
  returned_to_system: ['returned', 'back to system', 'returned to the system'],
  to_reclaimer: ['reclaimer', 'sent to reclaimer'],
  destroyed: ['destruction', 'sent for destruction'],
});

/** The type of a technician's certification, or null: `II`, `Type 2`, `universal`. */
export const certificationOf = words<CertificationType>({
  I: ['1', 'type i', 'type 1'],
  II: ['2', 'type ii', 'type 2'],
  III: ['3', 'type iii', 'type 3'],
  universal: ['type universal'],
});
