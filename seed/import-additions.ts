import { createHash } from 'node:crypto';
import Papa from 'papaparse';
import type { Viewer } from '@/lib/auth/viewer';
import type { AdditionImport } from '@/lib/charge-additions/file/contract';
import { ADDITION_FIELDS } from '@/lib/charge-additions/file/fields';
import { takeInAdditions } from '@/lib/charge-additions/file/take-in';
import type { DemoAddition } from './additions';
import type { DemoCompany } from './company';

/** The additions as the file that the office keeps of them. */
export const additionsFile = (additions: readonly DemoAddition[]): string =>
  Papa.unparse({
    fields: [...ADDITION_FIELDS],
    data: additions.map(({ addedOn, site, appliance, addedLb, reason, leaksVerifiedOn }, index) => {
      const ref = `C${addedOn.slice(2, 4)}-${String(index + 1).padStart(4, '0')}`;
      return [ref, addedOn, site, appliance, addedLb.toFixed(1), 'lb', reason, leaksVerifiedOn ?? '', ''];
    }),
  });

/** Hands the additions in as `viewer` would, through the import that everybody uses. */
export const importAdditions = (viewer: Viewer, { additions, plan }: DemoCompany): Promise<AdditionImport | null> => {
  if (additions.length === 0) return Promise.resolve(null);
  const bytes = Buffer.from(additionsFile(additions));
  const open = async function* () {
    yield bytes;
  };
  const fileName = `charge additions until ${plan.endMonth}.csv`;
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  return takeInAdditions(viewer, { open, fileName, sha256 }, { told: {}, dryRun: false });
};
