import 'server-only';
import { readCompany } from '@/db/client';
import { type AskingViewer, scopeOf } from '@/lib/auth/viewer';
import { type CompanySuspicion, companySuspicion } from './company';
import { getPulledRecords } from './query';

/** So many companies' suspicions are kept in one process; the ones unused for longest make room. */
const MOST_COMPANIES = 20;

const kept = new Map<string, { revision: number; suspicion: Promise<CompanySuspicion> }>();

/**
 * What is suspected in the viewer's company, computed once for each state of its records: every screen that shows a part
 * of it asks for the whole. The viewer's revision was read before, so what is given may be newer than it says, never older.
 */
export const keptSuspicion = (viewer: AskingViewer): Promise<CompanySuspicion> => {
  // A technician's transactions show his own records only.
  const key = `${viewer.companyId} ${scopeOf(viewer).technicianId ?? ''}`;
  const { revision } = viewer;
  const known = kept.get(key);
  if (known?.revision === revision) return known.suspicion;
  const suspicion = readCompany(scopeOf(viewer), getPulledRecords).then(companySuspicion);
  kept.delete(key);
  kept.set(key, { revision, suspicion });
  const [oldest] = kept.keys();
  if (kept.size > MOST_COMPANIES && oldest) kept.delete(oldest);
  // What failed is tried again by whoever asks next.
  suspicion.catch(() => kept.delete(key));
  return suspicion;
};
