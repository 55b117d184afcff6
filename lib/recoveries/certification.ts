import 'server-only';
import type { Tx } from '@/db/client';
import { technicianCertifications } from '@/db/schema/places';
import type { CertificationType } from '@/lib/vocabulary';

/** Keeps a certification that a record states with its technician, as an import does; a known one stays as it is. */
export const keepCertification = async (
  tx: Tx,
  companyId: string,
  technicianId: string,
  type: CertificationType | null,
): Promise<void> => {
  if (type) await tx.insert(technicianCertifications).values({ companyId, technicianId, type }).onConflictDoNothing();
};
